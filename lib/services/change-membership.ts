import { z } from 'zod';
import { courseRoles } from '@/lib/domain/roles';
import { HalfmarkError } from '@/lib/errors';
import { canChangeMembership } from '@/lib/policies/can-change-membership';
import { requireAllowed } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { Membership } from '@/models/membership';
import { Section } from '@/models/section';
import { SectionGrader } from '@/models/section-grader';
import { type ServiceContext } from './context';
import { placeInSections } from './place-in-sections';
import { recordAuditEvent } from './record-audit-event';

export const changeMembershipSchema = z.object({
  courseId: z.uuid(),
  membershipId: z.uuid(),
  role: z.enum(courseRoles),
  sectionIds: z.array(z.uuid()).max(200).default([]),
});

/**
 * Changes what somebody is in a course, and their sections. It counts from their next request on.
 *
 * @throws HalfmarkError `not-found`, `forbidden`, `invalid`
 */
export async function changeMembership(
  context: ServiceContext,
  input: z.output<typeof changeMembershipSchema>,
): Promise<void> {
  const { transaction, actor } = context;
  const course = await courseForActor(actor, input.courseId, transaction);
  const membership = await presentMembership(context, input);
  const before = { role: membership.role, sections: await sectionNamesOf(context, membership) };
  const change = { userId: membership.userId, from: before.role, to: input.role };
  requireAllowed(canChangeMembership(actor, course, change));
  await placeInSections(context, membership, input);
  await recordAuditEvent(context, {
    action: 'change-membership',
    courseId: course.id,
    subject: { kind: 'user', id: membership.userId },
    details: {
      role: { from: before.role, to: input.role },
      sections: { from: before.sections, to: await sectionNamesOf(context, membership) },
    },
  });
}

/** The membership of somebody who is in the course now, locked; `not-found` for another course's or a past one. */
export async function presentMembership(
  { transaction }: ServiceContext,
  { courseId, membershipId }: { courseId: string; membershipId: string },
): Promise<Membership> {
  const membership = await Membership.findOne({
    where: { id: membershipId, courseId, leftAt: null },
    lock: transaction.LOCK.UPDATE,
    transaction,
  });
  if (membership === null) throw new HalfmarkError('not-found', 'This person is not in the course any more.');
  return membership;
}

/** The sections of a membership by name, as the log keeps them. */
async function sectionNamesOf({ transaction }: ServiceContext, membership: Membership): Promise<string[]> {
  const graded = await SectionGrader.findAll({ where: { membershipId: membership.id }, transaction });
  const ids = [membership.sectionId, ...graded.map((row) => row.sectionId)].filter((id) => id !== null);
  const sections = await Section.findAll({ where: { id: ids }, order: [['name', 'ASC']], transaction });
  return sections.map((section) => section.name);
}
