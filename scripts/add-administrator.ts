import { signLink } from '@/lib/auth/link-token';
import { closeDatabase } from '@/lib/db/connection';
import { inTransaction } from '@/lib/db/transaction';
import { environment } from '@/lib/env';
import { isHalfmarkError } from '@/lib/errors';
import { absolute, paths } from '@/lib/paths';
import { appointAdministrator, appointAdministratorSchema } from '@/lib/services/appoint-administrator';
import { LinkToken } from '@/models/link-token';

/*
 * Makes somebody an administrator: ADDRESS NAME. Called by scripts/add-administrator.mjs, which provides the environment.
 */

async function main(): Promise<void> {
  const [email, ...words] = process.argv.slice(2);
  const input = appointAdministratorSchema.safeParse({ email, name: words.join(' ') });
  if (!input.success)
    throw new Error('Give an e-mail address and a name: npm run add-administrator -- a@b.edu "Her Name"');
  const { sessionSecret, appUrl } = environment();
  const link = await inTransaction(async (transaction) => {
    const actor = { kind: 'system', name: 'add-administrator' } as const;
    const { userId, invited } = await appointAdministrator({ actor, transaction, now: new Date() }, input.data);
    return invited ? LinkToken.findOne({ where: { userId, purpose: 'invitation', usedAt: null }, transaction }) : null;
  });
  console.log(`${input.data.email} is an administrator now.`);
  if (link) {
    const path = paths.invitation(signLink('invitation', link.id, sessionSecret));
    console.log(`This link, which is mailed too, sets the password: ${absolute(appUrl, path)}`);
  }
}

main()
  .finally(closeDatabase)
  .catch((error: unknown) => {
    console.error(isHalfmarkError(error) || error instanceof Error ? error.message : error);
    process.exitCode = 1;
  });
