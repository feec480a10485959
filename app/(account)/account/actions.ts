'use server';

import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { type ActionResult } from '@/app/_server/action-result';
import { currentSession } from '@/app/_server/current-actor';
import { runAction } from '@/app/_server/run-action';
import { paths } from '@/lib/paths';
import { changeOwnName, changeOwnNameSchema } from '@/lib/services/change-own-name';
import { changeOwnPassword, changeOwnPasswordSchema } from '@/lib/services/change-own-password';
import { endOwnOtherSessions, endOwnSession, endOwnSessionSchema } from '@/lib/services/end-own-session';

/** Changes one's own name. */
export async function saveName(form: FormData): Promise<ActionResult<void>> {
  const result = await runAction(changeOwnNameSchema, form, changeOwnName);
  if (result.ok) revalidatePath(paths.account());
  return result;
}

/** Changes one's own password; every other browser of theirs is signed out. */
export async function savePassword(form: FormData): Promise<ActionResult<{ endedSessions: number }>> {
  const sessionId = (await currentSession())?.id ?? '';
  const result = await runAction(changeOwnPasswordSchema, form, (context, input) =>
    changeOwnPassword(context, { ...input, sessionId }),
  );
  if (result.ok) revalidatePath(paths.account());
  return result;
}

/** Signs one of one's own browsers out. */
export async function endSession(form: FormData): Promise<ActionResult<void>> {
  const result = await runAction(endOwnSessionSchema, form, endOwnSession);
  if (result.ok) revalidatePath(paths.account());
  return result;
}

/** Signs every other browser of one's own out. */
export async function endOtherSessions(): Promise<ActionResult<number>> {
  const sessionId = (await currentSession())?.id ?? '';
  const result = await runAction(z.object({}), {}, (context) => endOwnOtherSessions(context, { sessionId }));
  if (result.ok) revalidatePath(paths.account());
  return result;
}
