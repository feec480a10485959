import { z } from 'zod';
import { Appeal, type AppealOutcome } from '@/models/appeal';
import { CreditEntry } from '@/models/credit-entry';
import { Ruling } from '@/models/ruling';
import { setPolicySchema } from '@/lib/domain/set-policy';
import { HalfmarkError } from '@/lib/errors';
import { applyRuling } from './apply-ruling';
import { reissueIfReleased } from './compose-score-report';
import type { ServiceContext } from './context';
import { assertHeldBy, loadItemForGrading } from './load-item-for-grading';

export const answerAppealInput = z.object({
  queueItemId: z.uuid(),
  /** In thousandths of a mark. */
  credit: z.int().min(0),
  reply: z.string().trim().min(1, 'Give the student a reply.').max(8000),
  millisecondsSpent: z.int().min(0).max(86_400_000).nullable().default(null),
});

/**
 * Answers an appeal that the acting grader holds: a credit, which may fall only where the set's policy says so, and a
 * reply. The report is sent again with what changed. Whoever could take the item is not the first marker, or the course
 * has no other grader, which is then noted.
 */
export async function answerAppeal(
  context: ServiceContext,
  input: z.output<typeof answerAppealInput>,
): Promise<{ outcome: AppealOutcome }> {
  const { transaction, now } = context;
  const { item, grader, course, set, answer, draw, outOf } = await loadItemForGrading(context, input.queueItemId);
  assertHeldBy(item, grader.userId, now);
  if (item.kind !== 'appeal' || item.appealId === null)
    throw new HalfmarkError('wrong-state', 'This is not an appeal.');
  const appeal = await Appeal.findByPk(item.appealId, {
    transaction,
    lock: transaction.LOCK.UPDATE,
    rejectOnEmpty: true,
  });
  const current = await CreditEntry.findByPk(answer.currentCreditEntryId ?? '', { transaction });
  const before = current?.credit ?? 0;
  if (input.credit < before && !setPolicySchema.parse(set.policy).appealMayLower) {
    throw new HalfmarkError('invalid', undefined, {
      fields: { credit: 'By this set’s policy an appeal does not lower a credit.' },
    });
  }
  const earlier = await Ruling.findAll({ where: { answerId: answer.id }, attributes: ['graderId'], transaction });
  const ruling = await applyRuling(context, {
    item,
    courseId: course.id,
    kind: 'appeal',
    credit: input.credit,
    outOf,
    comment: input.reply,
    millisecondsSpent: input.millisecondsSpent,
  });
  const outcome: AppealOutcome = input.credit > before ? 'upheld' : input.credit < before ? 'lowered' : 'kept';
  await appeal.update(
    {
      state: 'answered',
      outcome,
      reply: input.reply,
      answeredBy: grader.userId,
      answeredAt: now,
      rulingId: ruling.id,
      sameGraderNoted: earlier.some(({ graderId }) => graderId === grader.userId),
    },
    { transaction },
  );
  await reissueIfReleased(context, {
    problemSetId: set.id,
    userId: draw.userId,
    reason: 'Your appeal has been answered.',
  });
  return { outcome };
}
