import { z } from 'zod';
import { canAdminister } from '@/lib/policies/can-administer';
import { requireAllowed } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { Course } from '@/models/course';
import { type ServiceContext } from './context';
import { courseFields } from './course-fields';
import { asTakenCode } from './create-course';
import { recordAuditEvent } from './record-audit-event';

export const editCourseSchema = z.object({
  courseId: z.uuid(),
  ...courseFields,
  retentionMonths: z.coerce.number('Write a number of months.').int().min(1).max(1200),
});

/**
 * Changes what a course is called and how it runs. The audit log names what changed, with old and new values.
 *
 * @throws HalfmarkError `forbidden`, `not-found`, `conflict`
 */
export async function editCourse(context: ServiceContext, input: z.output<typeof editCourseSchema>): Promise<void> {
  requireAllowed(canAdminister(context.actor, 'manage-courses'));
  const { transaction } = context;
  const { courseId, ...fields } = input;
  const before = await courseForActor(context.actor, courseId, transaction);
  await Course.update(fields, { where: { id: courseId }, transaction }).catch(asTakenCode);
  const changed = (Object.keys(fields) as (keyof typeof fields)[]).filter((name) => before[name] !== fields[name]);
  if (changed.length === 0) return;
  await recordAuditEvent(context, {
    action: 'edit-course',
    courseId,
    subject: { kind: 'course', id: courseId },
    details: Object.fromEntries(changed.map((name) => [name, { from: before[name], to: fields[name] }])),
  });
}
