import { User } from '@/models/user';
import { countAttempt } from './attempt-limits';
import { verifyPassword } from './password';

/** What came of a sign-in: the person, a refusal that says nothing of which half was wrong, or a wait. */
export type SignInOutcome =
  | { kind: 'welcome'; userId: string; name: string }
  | { kind: 'refused' }
  | { kind: 'too-many'; retryAfterSeconds: number };

/** An e-mail address as accounts are stored under: lower case, without blanks around it. */
export function normaliseEmail(email: string): string {
  return email.trim().toLowerCase();
}

/**
 * Decides a sign-in by e-mail and password. An unknown e-mail, a wrong password, an account without a password and a
 * deactivated one get the same answer after the same work. Failures are limited per account and per address; a success
 * is not counted, and neither is a try on an account that is already refused.
 */
export async function signInWithPassword(email: string, password: string, address: string): Promise<SignInOutcome> {
  const account = normaliseEmail(email);
  const byAddress = await countAttempt('sign-in-address', address);
  if (!byAddress.allowed) return { kind: 'too-many', retryAfterSeconds: byAddress.retryAfterSeconds };
  const byAccount = await countAttempt('sign-in-account', account);
  if (!byAccount.allowed) {
    await byAddress.forgive();
    return { kind: 'too-many', retryAfterSeconds: byAccount.retryAfterSeconds };
  }
  const user = await User.findOne({ where: { email: account, deactivatedAt: null } });
  const right = await verifyPassword(user?.passwordHash ?? null, password);
  if (user === null || !right) return { kind: 'refused' };
  await Promise.all([byAddress.forgive(), byAccount.forgive()]);
  return { kind: 'welcome', userId: user.id, name: user.name };
}
