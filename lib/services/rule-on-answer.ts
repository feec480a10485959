import { z } from 'zod';
import { setPolicySchema } from '@/lib/domain/set-policy';
import { HalfmarkError } from '@/lib/errors';
import { applyRuling } from './apply-ruling';
import { reissueIfReleased } from './compose-score-report';
import type { ServiceContext } from './context';
import { drawSecondMarking } from './draw-second-marking';
import { assertHeldBy, loadItemForGrading } from './load-item-for-grading';

export const ruleOnAnswerInput = z.object({
  queueItemId: z.uuid(),
  /** In thousandths of a mark. */
  credit: z.int().min(0),
  comment: z.string().trim().max(8000).default(''),
  /** How long the grader looked at it, for the audit. */
  millisecondsSpent: z.int().min(0).max(86_400_000).nullable().default(null),
});

/**
 * A grader's ruling on an answer they hold: credit and comment. Some rulings, at the set's rate, are drawn for blind
 * second marking. `lease-lost` where the hold has run out; an appeal is answered by its own service.
 */
export async function ruleOnAnswer(
  context: ServiceContext,
  input: z.output<typeof ruleOnAnswerInput>,
): Promise<{ rulingId: string; secondMarking: boolean }> {
  const loaded = await loadItemForGrading(context, input.queueItemId);
  const { item, course, set, outOf, draw, grader } = loaded;
  assertHeldBy(item, grader.userId, context.now);
  if (item.kind === 'appeal')
    throw new HalfmarkError('wrong-state', 'An appeal is answered with a reply to the student.');
  const ruling = await applyRuling(context, {
    item,
    courseId: course.id,
    kind: 'single',
    credit: input.credit,
    outOf,
    comment: input.comment,
    millisecondsSpent: input.millisecondsSpent,
  });
  await reissueIfReleased(context, {
    problemSetId: set.id,
    userId: draw.userId,
    reason: 'A part that was still being marked has been marked.',
  });
  const secondMarking = await drawSecondMarking(context, {
    ruling,
    courseId: course.id,
    problemSetId: set.id,
    studentId: draw.userId,
    rate: setPolicySchema.parse(set.policy).secondMarkingRate,
  });
  return { rulingId: ruling.id, secondMarking };
}
