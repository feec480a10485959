'use server';

import { revalidatePath } from 'next/cache';
import { type ActionResult } from '@/app/_server/action-result';
import { runAction } from '@/app/_server/run-action';
import { paths } from '@/lib/paths';
import { retryJob, retryJobSchema } from '@/lib/services/retry-job';

/** Gives a failed job all its tries again. */
export async function tryJobAgain(form: FormData): Promise<ActionResult<void>> {
  const result = await runAction(retryJobSchema, form, retryJob);
  if (result.ok) revalidatePath(paths.adminMail());
  return result;
}
