import { z } from 'zod';
import { requirePerson } from '@/lib/policies/decide';
import { User } from '@/models/user';
import { type ServiceContext } from './context';
import { nameField } from './person-fields';
import { recordAuditEvent } from './record-audit-event';

export const changeOwnNameSchema = z.object({ name: nameField });

/** Changes the name under which one is shown. */
export async function changeOwnName(
  context: ServiceContext,
  input: z.output<typeof changeOwnNameSchema>,
): Promise<void> {
  const { userId } = requirePerson(context.actor);
  await User.update({ name: input.name }, { where: { id: userId }, transaction: context.transaction });
  await recordAuditEvent(context, { action: 'change-name', subject: { kind: 'user', id: userId } });
}
