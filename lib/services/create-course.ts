import { z } from 'zod';
import { isConstraintViolation } from '@/lib/db/constraints';
import { HalfmarkError } from '@/lib/errors';
import { canAdminister } from '@/lib/policies/can-administer';
import { requireAllowed } from '@/lib/policies/decide';
import { Course } from '@/models/course';
import { Department } from '@/models/department';
import { type ServiceContext } from './context';
import { courseFields } from './course-fields';
import { recordAuditEvent } from './record-audit-event';

export const createCourseSchema = z.object({
  ...courseFields,
  department: z.string().trim().min(1, 'Write the department.').max(200, 'At most 200 characters.'),
});

/**
 * Makes a course, and its department when there is none of that name yet.
 *
 * @throws HalfmarkError `forbidden`; `conflict` where the department has that code in that term already
 */
export async function createCourse(
  context: ServiceContext,
  input: z.output<typeof createCourseSchema>,
): Promise<{ courseId: string }> {
  requireAllowed(canAdminister(context.actor, 'manage-courses'));
  const { transaction, now } = context;
  const { department: name, ...fields } = input;
  const [department] = await Department.findOrCreate({
    where: { name },
    defaults: { name, createdAt: now },
    transaction,
  });
  const course = await Course.create({ ...fields, departmentId: department.id, createdAt: now }, { transaction }).catch(
    asTakenCode,
  );
  await recordAuditEvent(context, {
    action: 'create-course',
    courseId: course.id,
    subject: { kind: 'course', id: course.id },
    details: { code: course.code, term: course.term },
  });
  return { courseId: course.id };
}

/** Turns the database's refusal of a second course of one code and term into a sentence at its field; throws always. */
export function asTakenCode(error: unknown): never {
  if (!isConstraintViolation(error, 'courses_code_term_unique')) throw error;
  const message = 'This department has a course of that code in that term already.';
  throw new HalfmarkError('conflict', message, { fields: { code: message } });
}
