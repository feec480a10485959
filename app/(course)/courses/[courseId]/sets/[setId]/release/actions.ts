'use server';

import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { type ActionResult } from '@/app/_server/action-result';
import { runAction } from '@/app/_server/run-action';
import { paths } from '@/lib/paths';
import { releaseScores, type ReleaseResult } from '@/lib/services/release-scores';

const form = z.object({
  courseId: z.uuid(),
  problemSetId: z.uuid(),
  /** A box that is ticked, or none. */
  reportWaitingParts: z
    .literal('yes')
    .optional()
    .transform((ticked) => ticked === 'yes'),
});

/** Releases the scores of everyone who is not held back. */
export async function releaseNow(data: FormData): Promise<ActionResult<ReleaseResult & { courseId: string }>> {
  const result = await runAction(form, data, async (context, { courseId, problemSetId, reportWaitingParts }) => ({
    ...(await releaseScores(context, { problemSetId, reportWaitingParts })),
    courseId,
    problemSetId,
  }));
  if (result.ok) revalidatePath(paths.release(result.value.courseId, result.value.problemSetId));
  return result;
}
