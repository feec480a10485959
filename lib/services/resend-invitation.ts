import { HalfmarkError } from '@/lib/errors';
import { canChangeMembership } from '@/lib/policies/can-change-membership';
import { requireAllowed } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { User } from '@/models/user';
import { presentMembership } from './change-membership';
import { type ServiceContext } from './context';
import { issueLink } from './issue-link';
import { recordAuditEvent } from './record-audit-event';

/**
 * Mails a new invitation to somebody of a course who has not set a password yet; the earlier link stops working.
 *
 * @throws HalfmarkError `not-found`, `forbidden`; `wrong-state` for somebody who has a password
 */
export async function resendInvitation(
  context: ServiceContext,
  input: { courseId: string; membershipId: string },
): Promise<void> {
  const { transaction, actor } = context;
  const course = await courseForActor(actor, input.courseId, transaction);
  const membership = await presentMembership(context, input);
  const change = { userId: membership.userId, from: membership.role, to: membership.role };
  requireAllowed(canChangeMembership(actor, course, change));
  const user = await User.findByPk(membership.userId, { transaction, rejectOnEmpty: true });
  if (user.passwordHash !== null) {
    throw new HalfmarkError('wrong-state', 'This person has a password already and needs no invitation.');
  }
  await issueLink(context, user.id, 'invitation');
  await recordAuditEvent(context, {
    action: 'invite-person',
    courseId: course.id,
    subject: { kind: 'user', id: user.id },
  });
}
