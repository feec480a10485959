'use server';

import { headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { type ActionResult } from '@/app/_server/action-result';
import { runPublicAction } from '@/app/_server/run-action';
import { clientAddress } from '@/lib/auth/client-address';
import { requestPasswordReset, requestPasswordResetSchema } from '@/lib/services/request-password-reset';
import { setPasswordByLink, setPasswordByLinkSchema } from '@/lib/services/set-password-by-link';

/** The answer to a request for a reset mail takes this long in any case, so that its time tells nothing. */
const resetAnswerMs = 400;

/** Asks for a mail with which to set a new password; the answer is the same whether there is such an account or not. */
export async function askForNewPassword(form: FormData): Promise<ActionResult<void>> {
  const address = clientAddress(await headers());
  const [result] = await Promise.all([
    runPublicAction('password reset', requestPasswordResetSchema, form, (context, input) =>
      requestPasswordReset(context, { ...input, address }),
    ),
    new Promise((resolve) => setTimeout(resolve, resetAnswerMs)),
  ]);
  return result;
}

/** Sets a password by a mailed link and leads to signing in with it. */
export async function setPassword(form: FormData): Promise<ActionResult<{ email: string }>> {
  const result = await runPublicAction('mailed link', setPasswordByLinkSchema, form, setPasswordByLink);
  if (result.ok) redirect('/sign-in?set=yes');
  return result;
}
