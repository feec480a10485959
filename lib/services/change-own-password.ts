import { z } from 'zod';
import { countAttempt } from '@/lib/auth/attempt-limits';
import { hashPassword, newPasswordSchema, verifyPassword } from '@/lib/auth/password';
import { endSessionsOf } from '@/lib/auth/session-store';
import { HalfmarkError } from '@/lib/errors';
import { requirePerson } from '@/lib/policies/decide';
import { User } from '@/models/user';
import { type ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';

export const changeOwnPasswordSchema = z.object({
  currentPassword: z.string().min(1, 'Write your present password.').max(1000),
  newPassword: newPasswordSchema,
});

/**
 * Changes one's own password and ends one's other sessions. A wrong present password counts as a failed sign-in.
 *
 * @param input `sessionId` is the session that asks, which stays
 * @throws HalfmarkError `invalid`, `too-many`
 */
export async function changeOwnPassword(
  context: ServiceContext,
  input: z.output<typeof changeOwnPasswordSchema> & { sessionId: string },
): Promise<{ endedSessions: number }> {
  const { transaction, now } = context;
  const { userId } = requirePerson(context.actor);
  const user = await User.findByPk(userId, { transaction, rejectOnEmpty: true });
  const attempt = await countAttempt('sign-in-account', user.email);
  if (!attempt.allowed) throw new HalfmarkError('too-many');
  if (!(await verifyPassword(user.passwordHash, input.currentPassword))) {
    const message = 'This is not your present password.';
    throw new HalfmarkError('invalid', message, { fields: { currentPassword: message } });
  }
  await attempt.forgive();
  await user.update({ passwordHash: await hashPassword(input.newPassword), passwordChangedAt: now }, { transaction });
  const endedSessions = await endSessionsOf(userId, { except: input.sessionId, transaction });
  await recordAuditEvent(context, { action: 'change-password', subject: { kind: 'user', id: userId } });
  return { endedSessions };
}
