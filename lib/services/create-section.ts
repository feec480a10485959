import { z } from 'zod';
import { isConstraintViolation } from '@/lib/db/constraints';
import { HalfmarkError } from '@/lib/errors';
import { decide, requireAllowed } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { Section } from '@/models/section';
import { type ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';

export const createSectionSchema = z.object({
  courseId: z.uuid(),
  name: z.string().trim().min(1, 'Write a name.').max(60, 'At most 60 characters.'),
});

/**
 * Makes a section of a course.
 *
 * @throws HalfmarkError `not-found`, `forbidden`; `conflict` where there is one of that name
 */
export async function createSection(
  context: ServiceContext,
  input: z.output<typeof createSectionSchema>,
): Promise<{ sectionId: string }> {
  const { transaction, actor, now } = context;
  const course = await courseForActor(actor, input.courseId, transaction);
  requireAllowed(decide(actor, 'change-roster', course));
  try {
    const section = await Section.create({ ...input, createdAt: now }, { transaction });
    await recordAuditEvent(context, {
      action: 'create-section',
      courseId: course.id,
      subject: { kind: 'section', id: section.id },
      details: { name: section.name },
    });
    return { sectionId: section.id };
  } catch (error) {
    if (!isConstraintViolation(error, 'sections_name_unique')) throw error;
    const message = 'This course has a section of that name already.';
    throw new HalfmarkError('conflict', message, { fields: { name: message } });
  }
}
