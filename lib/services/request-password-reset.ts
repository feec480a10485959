import { z } from 'zod';
import { countAttempt } from '@/lib/auth/attempt-limits';
import { HalfmarkError } from '@/lib/errors';
import { User } from '@/models/user';
import { type ServiceContext } from './context';
import { issueLink } from './issue-link';
import { emailField } from './person-fields';

export const requestPasswordResetSchema = z.object({ email: emailField });

/**
 * Mails a link for a new password to the account with an address, if there is one. Whoever asks learns nothing of that:
 * the outcome is the same for an unknown address, a deactivated account, and one that was mailed often enough just now.
 *
 * @param input `address` is the network address that asks, of which only so many requests are taken
 * @throws HalfmarkError `too-many`
 */
export async function requestPasswordReset(
  context: ServiceContext,
  input: z.output<typeof requestPasswordResetSchema> & { address: string },
): Promise<void> {
  if (!(await countAttempt('reset-address', input.address)).allowed) throw new HalfmarkError('too-many');
  const mayMail = (await countAttempt('reset-account', input.email)).allowed;
  const user = await User.findOne({
    where: { email: input.email, deactivatedAt: null },
    transaction: context.transaction,
  });
  if (user !== null && mayMail) await issueLink(context, user.id, 'reset');
}
