import { canChangeMembership } from '@/lib/policies/can-change-membership';
import { requireAllowed } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { SectionGrader } from '@/models/section-grader';
import { changeMembershipSchema, presentMembership } from './change-membership';
import { type ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';

export const endMembershipSchema = changeMembershipSchema.pick({ courseId: true, membershipId: true });

/**
 * Lets a person leave a course. What they answered, ruled and were credited stays as it is, and is theirs again if they
 * come back.
 *
 * @throws HalfmarkError `not-found`, `forbidden`
 */
export async function endMembership(
  context: ServiceContext,
  input: { courseId: string; membershipId: string },
): Promise<void> {
  const { transaction, actor, now } = context;
  const course = await courseForActor(actor, input.courseId, transaction);
  const membership = await presentMembership(context, input);
  const change = { userId: membership.userId, from: membership.role, to: null };
  requireAllowed(canChangeMembership(actor, course, change));
  await membership.update({ leftAt: now }, { transaction });
  await SectionGrader.destroy({ where: { membershipId: membership.id }, transaction });
  await recordAuditEvent(context, {
    action: 'leave-course',
    courseId: course.id,
    subject: { kind: 'user', id: membership.userId },
    details: { role: membership.role },
  });
}
