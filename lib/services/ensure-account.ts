import { HalfmarkError } from '@/lib/errors';
import { User } from '@/models/user';
import { type ServiceContext } from './context';
import { issueLink } from './issue-link';

/**
 * The account with an e-mail address, made when there is none. A person who never set a password is mailed an
 * invitation; the name given counts only for a new account, since the other belongs to its holder. For other services;
 * it authorises nothing.
 *
 * @throws HalfmarkError `wrong-state` for a deactivated account
 */
export async function ensureAccount(
  context: ServiceContext,
  person: { email: string; name: string },
): Promise<{ user: User; isNew: boolean; invited: boolean }> {
  const { transaction, now } = context;
  const [user, isNew] = await User.findOrCreate({
    where: { email: person.email },
    defaults: {
      email: person.email,
      name: person.name,
      passwordHash: null,
      passwordChangedAt: null,
      deactivatedAt: null,
      erasedAt: null,
      createdAt: now,
    },
    transaction,
  });
  if (user.deactivatedAt !== null) {
    const message = 'The account with this address is deactivated. An administrator can open it again.';
    throw new HalfmarkError('wrong-state', message, { fields: { email: message } });
  }
  const invited = user.passwordHash === null;
  if (invited) await issueLink(context, user.id, 'invitation');
  return { user, isNew, invited };
}
