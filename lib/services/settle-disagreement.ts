import { z } from 'zod';
import { Answer } from '@/models/answer';
import { ProblemSet } from '@/models/problem-set';
import { QueueItem } from '@/models/queue-item';
import { Ruling } from '@/models/ruling';
import { SecondMarking } from '@/models/second-marking';
import { Submission } from '@/models/submission';
import { HalfmarkError } from '@/lib/errors';
import { decide, requireAllowed, requirePerson } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { applyRuling } from './apply-ruling';
import { reissueIfReleased } from './compose-score-report';
import type { ServiceContext } from './context';

export const settleDisagreementInput = z.object({
  secondMarkingId: z.uuid(),
  /** In thousandths of a mark. */
  credit: z.int().min(0),
  comment: z.string().trim().max(8000).default(''),
});

/** The head TA's decision where two markings differ; the settled credit stands, both markings stay on record. */
export async function settleDisagreement(
  context: ServiceContext,
  input: z.output<typeof settleDisagreementInput>,
): Promise<{ rulingId: string }> {
  const { actor, transaction, now } = context;
  const settler = requirePerson(actor);
  const marking = await SecondMarking.findByPk(input.secondMarkingId, { transaction, lock: transaction.LOCK.UPDATE });
  if (!marking) throw new HalfmarkError('not-found');
  const set = await ProblemSet.findByPk(marking.problemSetId, { transaction, rejectOnEmpty: true });
  const course = await courseForActor(actor, set.courseId, transaction);
  requireAllowed(decide(actor, 'settle-disagreements', course));
  if (marking.state !== 'to-settle')
    throw new HalfmarkError('wrong-state', 'There is nothing to settle here any more.');
  const first = await Ruling.findByPk(marking.rulingId, { transaction, rejectOnEmpty: true });
  const item = await QueueItem.findByPk(first.queueItemId, {
    transaction,
    lock: transaction.LOCK.UPDATE,
    rejectOnEmpty: true,
  });
  const ruling = await applyRuling(context, {
    item,
    courseId: course.id,
    kind: 'settlement',
    credit: input.credit,
    outOf: first.outOf,
    comment: input.comment,
    millisecondsSpent: null,
  });
  await marking.update(
    { state: 'settled', settledBy: settler.userId, settledCredit: input.credit, settledAt: now },
    { transaction },
  );
  const answer = await Answer.findByPk(first.answerId, { transaction, rejectOnEmpty: true });
  const submission = await Submission.findByPk(answer.submissionId, { transaction, rejectOnEmpty: true });
  await reissueIfReleased(context, {
    problemSetId: set.id,
    userId: submission.userId,
    reason: 'A part has been settled after second marking.',
  });
  return { rulingId: ruling.id };
}
