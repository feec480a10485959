import { z } from 'zod';
import { forgetAttempts } from '@/lib/auth/attempt-limits';
import { readLink } from '@/lib/auth/link-token';
import { hashPassword, newPasswordSchema } from '@/lib/auth/password';
import { endSessionsOf } from '@/lib/auth/session-store';
import { environment } from '@/lib/env';
import { HalfmarkError } from '@/lib/errors';
import { LinkToken } from '@/models/link-token';
import { User } from '@/models/user';
import { type ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';

export const setPasswordByLinkSchema = z.object({
  purpose: z.enum(['invitation', 'reset']),
  token: z.string().max(200),
  password: newPasswordSchema,
});

/**
 * Sets the password of the person whom a mailed link was sent to. Every open link of theirs is used up and every session
 * ended; failed sign-ins so far are forgotten.
 *
 * @throws HalfmarkError `wrong-state` where the link is not ours, was used, has run out, or its account is deactivated
 */
export async function setPasswordByLink(
  context: ServiceContext,
  input: z.output<typeof setPasswordByLinkSchema>,
): Promise<{ email: string }> {
  const { transaction, now } = context;
  const id = readLink(input.purpose, input.token, environment().sessionSecret);
  const link =
    id === null
      ? null
      : await LinkToken.findOne({ where: { id, purpose: input.purpose }, lock: transaction.LOCK.UPDATE, transaction });
  if (link === null || link.usedAt !== null || link.expiresAt <= now) throw spentLink();
  const user = await User.findOne({ where: { id: link.userId, deactivatedAt: null }, transaction });
  if (user === null) throw spentLink();
  await user.update({ passwordHash: await hashPassword(input.password), passwordChangedAt: now }, { transaction });
  await LinkToken.update({ usedAt: now }, { where: { userId: user.id, usedAt: null }, transaction });
  await endSessionsOf(user.id, { transaction });
  await forgetAttempts('sign-in-account', user.email);
  await recordAuditEvent(
    { ...context, actor: { kind: 'system', name: `${input.purpose} link` } },
    { action: 'set-password', subject: { kind: 'user', id: user.id } },
  );
  return { email: user.email };
}

function spentLink(): HalfmarkError {
  return new HalfmarkError(
    'wrong-state',
    'This link was used already or has run out. Ask for a new one with “Forgotten your password?”.',
  );
}
