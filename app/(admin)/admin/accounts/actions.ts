'use server';

import { revalidatePath } from 'next/cache';
import { type ActionResult } from '@/app/_server/action-result';
import { runAction } from '@/app/_server/run-action';
import { changeAccount, changeAccountSchema } from '@/lib/services/change-account';
import { inviteAccount, inviteAccountSchema } from '@/lib/services/invite-account';

/** Makes an account and mails its invitation. */
export async function makeAccount(form: FormData): Promise<ActionResult<{ userId: string }>> {
  const result = await runAction(inviteAccountSchema, form, inviteAccount);
  if (result.ok) revalidatePath('/admin/accounts', 'layout');
  return result;
}

/** Closes or opens an account, or changes whether it administers. */
export async function saveAccount(form: FormData): Promise<ActionResult<void>> {
  const result = await runAction(changeAccountSchema, form, changeAccount);
  if (result.ok) revalidatePath('/admin/accounts', 'layout');
  return result;
}
