import { z } from 'zod';
import { courseRoles } from '@/lib/domain/roles';
import { HalfmarkError } from '@/lib/errors';
import { canChangeMembership } from '@/lib/policies/can-change-membership';
import { requireAllowed } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { Membership } from '@/models/membership';
import { User } from '@/models/user';
import { type ServiceContext } from './context';
import { ensureAccount } from './ensure-account';
import { emailField, nameField } from './person-fields';
import { placeInSections } from './place-in-sections';
import { recordAuditEvent } from './record-audit-event';

export const inviteToCourseSchema = z.object({
  courseId: z.uuid(),
  email: emailField,
  name: nameField,
  role: z.enum(courseRoles),
  sectionIds: z.array(z.uuid()).max(200).default([]),
});

/**
 * Brings one person into a course, with an account by invitation if they have none. Somebody who had left comes back to
 * the work they had.
 *
 * @throws HalfmarkError `not-found`, `forbidden`, `invalid`; `conflict` for somebody who is in the course already
 */
export async function inviteToCourse(
  context: ServiceContext,
  input: z.output<typeof inviteToCourseSchema>,
): Promise<{ membershipId: string; invited: boolean }> {
  const { transaction, now, actor } = context;
  const course = await courseForActor(actor, input.courseId, transaction);
  const known = await User.findOne({ where: { email: input.email }, transaction });
  const before = known && (await Membership.findOne({ where: { courseId: course.id, userId: known.id }, transaction }));
  const change = { userId: known?.id ?? null, from: before?.role ?? null, to: input.role };
  requireAllowed(canChangeMembership(actor, course, change));
  if (before !== null && before.leftAt === null) {
    const message = 'This person is in the course already. Change their place in the list instead.';
    throw new HalfmarkError('conflict', message, { fields: { email: message } });
  }
  const { user, invited } = await ensureAccount(context, input);
  const membership =
    before ??
    (await Membership.create(
      { courseId: course.id, userId: user.id, role: input.role, sectionId: null, leftAt: null, createdAt: now },
      { transaction },
    ));
  await membership.update({ leftAt: null, sectionId: null }, { transaction });
  await placeInSections(context, membership, input);
  await recordAuditEvent(context, {
    action: before === null ? 'join-course' : 'return-to-course',
    courseId: course.id,
    subject: { kind: 'user', id: user.id },
    details: { role: input.role, invited },
  });
  return { membershipId: membership.id, invited };
}
