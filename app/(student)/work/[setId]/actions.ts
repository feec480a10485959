'use server';

import { type ActionResult } from '@/app/_server/action-result';
import { runAction } from '@/app/_server/run-action';
import { handInAnswers, handInAnswersInput, type HandInResult } from '@/lib/services/hand-in-answers';
import { saveAnswer, saveAnswerInput } from '@/lib/services/save-answer';
import { readHandInForm } from './_components/hand-in-form';

/** Hands in answers from the page. */
export async function handIn(input: unknown): Promise<ActionResult<HandInResult>> {
  return runAction(handInAnswersInput, input, handInAnswers);
}

/**
 * The same from the bare form, for a browser in which our scripts do not run. Everything typed is saved first, so that
 * the page that comes back shows it whatever becomes of the hand-in.
 */
export async function handInForm(
  _before: ActionResult<HandInResult> | null,
  form: FormData | undefined,
): Promise<ActionResult<HandInResult>> {
  // Whatever calls an action, its arguments are only what was sent.
  const { drafts, handIn: input } = readHandInForm(form instanceof FormData ? form : new FormData());
  for (const draft of drafts) await runAction(saveAnswerInput, draft, saveAnswer);
  return runAction(handInAnswersInput, input, handInAnswers);
}
