'use server';

import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { type ActionResult } from '@/app/_server/action-result';
import { runAction } from '@/app/_server/run-action';
import { paths } from '@/lib/paths';
import { openAppeal, openAppealInput } from '@/lib/services/open-appeal';

const form = openAppealInput.extend({ problemSetId: z.uuid() });

/** Asks that a person look at one part again. */
export async function appealPart(data: FormData): Promise<ActionResult<{ problemSetId: string }>> {
  const result = await runAction(form, data, async (context, { problemSetId, ...input }) => {
    await openAppeal(context, input);
    return { problemSetId };
  });
  if (result.ok) revalidatePath(paths.workReport(result.value.problemSetId));
  return result;
}
