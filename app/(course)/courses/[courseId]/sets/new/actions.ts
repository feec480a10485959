'use server';

import { redirect } from 'next/navigation';
import { type ActionResult } from '@/app/_server/action-result';
import { runAction } from '@/app/_server/run-action';
import { paths } from '@/lib/paths';
import { createProblemSet, createProblemSetInput } from '@/lib/services/create-problem-set';

/** Makes a draft set and goes to its page. */
export async function makeSet(form: FormData): Promise<ActionResult<unknown>> {
  const result = await runAction(createProblemSetInput, form, async (context, input) => ({
    ...(await createProblemSet(context, input)),
    courseId: input.courseId,
  }));
  if (result.ok) redirect(paths.set(result.value.courseId, result.value.problemSetId));
  return result;
}
