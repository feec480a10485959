import { z } from 'zod';
import { endSessionsOf } from '@/lib/auth/session-store';
import { HalfmarkError } from '@/lib/errors';
import { canAdminister } from '@/lib/policies/can-administer';
import { requireAllowed, requirePerson } from '@/lib/policies/decide';
import { User } from '@/models/user';
import { type ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';

export const accountChanges = ['deactivate', 'reactivate', 'make-administrator', 'unmake-administrator'] as const;

export type AccountChange = (typeof accountChanges)[number];

export const changeAccountSchema = z.object({ userId: z.uuid(), change: z.enum(accountChanges) });

/**
 * Closes or opens an account, or makes its holder an administrator or no longer one. Closing ends its sessions at once.
 * Administrators change others only, so that at least the one who acts remains.
 *
 * @throws HalfmarkError `forbidden`, `not-found`
 */
export async function changeAccount(
  context: ServiceContext,
  input: z.output<typeof changeAccountSchema>,
): Promise<void> {
  requireAllowed(canAdminister(context.actor, 'manage-accounts'));
  const { transaction, now } = context;
  if (requirePerson(context.actor).userId === input.userId) {
    throw new HalfmarkError('forbidden', 'Your own account is for another administrator to change.');
  }
  const user = await User.findOne({
    where: { id: input.userId, erasedAt: null },
    lock: transaction.LOCK.UPDATE,
    transaction,
  });
  if (user === null) throw new HalfmarkError('not-found');
  await user.update(effectOf(input.change, now), { transaction });
  if (input.change === 'deactivate') await endSessionsOf(user.id, { transaction });
  await recordAuditEvent(context, { action: actionOf[input.change], subject: { kind: 'user', id: user.id } });
}

const actionOf: Record<AccountChange, string> = {
  deactivate: 'deactivate-account',
  reactivate: 'reactivate-account',
  'make-administrator': 'make-administrator',
  'unmake-administrator': 'unmake-administrator',
};

function effectOf(change: AccountChange, now: Date): { deactivatedAt?: Date | null; isAdministrator?: boolean } {
  switch (change) {
    case 'deactivate':
      return { deactivatedAt: now };
    case 'reactivate':
      return { deactivatedAt: null };
    case 'make-administrator':
      return { isAdministrator: true };
    case 'unmake-administrator':
      return { isAdministrator: false };
  }
}
