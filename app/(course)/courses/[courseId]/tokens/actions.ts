'use server';

import { revalidatePath } from 'next/cache';
import { type ActionResult } from '@/app/_server/action-result';
import { runAction } from '@/app/_server/run-action';
import { createApiToken, createApiTokenSchema } from '@/lib/services/create-api-token';
import { revokeApiToken, revokeApiTokenSchema } from '@/lib/services/revoke-api-token';

/** Makes a token; the answer is the only place where it is ever shown. */
export async function makeToken(form: FormData): Promise<ActionResult<{ token: string }>> {
  const result = await runAction(createApiTokenSchema, form, createApiToken);
  if (result.ok) revalidatePath('/courses/[courseId]/tokens', 'page');
  return result;
}

/** Ends a token at once. */
export async function revokeToken(form: FormData): Promise<ActionResult<void>> {
  const result = await runAction(revokeApiTokenSchema, form, revokeApiToken);
  if (result.ok) revalidatePath('/courses/[courseId]/tokens', 'page');
  return result;
}
