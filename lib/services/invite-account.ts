import { z } from 'zod';
import { HalfmarkError } from '@/lib/errors';
import { canAdminister } from '@/lib/policies/can-administer';
import { requireAllowed } from '@/lib/policies/decide';
import { type ServiceContext } from './context';
import { ensureAccount } from './ensure-account';
import { emailField, nameField } from './person-fields';
import { recordAuditEvent } from './record-audit-event';

export const inviteAccountSchema = z.object({ email: emailField, name: nameField });

/**
 * Makes an account outside any course, or mails its invitation again while it has no password.
 *
 * @throws HalfmarkError `forbidden`; `conflict` for an account that has a password
 */
export async function inviteAccount(
  context: ServiceContext,
  input: z.output<typeof inviteAccountSchema>,
): Promise<{ userId: string }> {
  requireAllowed(canAdminister(context.actor, 'manage-accounts'));
  const { user, invited } = await ensureAccount(context, input);
  if (!invited) {
    const message = 'There is an account with this address already.';
    throw new HalfmarkError('conflict', message, { fields: { email: message } });
  }
  await recordAuditEvent(context, { action: 'invite-person', subject: { kind: 'user', id: user.id } });
  return { userId: user.id };
}
