import { z } from 'zod';
import { HalfmarkError } from '@/lib/errors';
import { type ServiceContext } from './context';
import { ensureAccount } from './ensure-account';
import { emailField, nameField } from './person-fields';
import { recordAuditEvent } from './record-audit-event';

export const appointAdministratorSchema = z.object({ email: emailField, name: nameField });

/**
 * Makes somebody an administrator from outside the pages: how the first one comes to be, and the way back in when none
 * is left. Only who can run programs on the server can do this, so the actor is the system.
 *
 * @throws HalfmarkError `forbidden` for any other actor; `wrong-state` for a deactivated account
 */
export async function appointAdministrator(
  context: ServiceContext,
  input: z.output<typeof appointAdministratorSchema>,
): Promise<{ userId: string; invited: boolean }> {
  if (context.actor.kind !== 'system') throw new HalfmarkError('forbidden');
  const { user, invited } = await ensureAccount(context, input);
  await user.update({ isAdministrator: true }, { transaction: context.transaction });
  await recordAuditEvent(context, { action: 'make-administrator', subject: { kind: 'user', id: user.id } });
  return { userId: user.id, invited };
}
