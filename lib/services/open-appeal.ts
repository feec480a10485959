import { Op } from 'sequelize';
import { z } from 'zod';
import { Answer } from '@/models/answer';
import { AnswerCheck } from '@/models/answer-check';
import { Appeal } from '@/models/appeal';
import { Draw } from '@/models/draw';
import { ProblemSet } from '@/models/problem-set';
import { ProblemSetItem } from '@/models/problem-set-item';
import { QueueItem } from '@/models/queue-item';
import { SetRelease } from '@/models/set-release';
import { isConstraintViolation } from '@/lib/db/constraints';
import { liveQueueItemStates } from '@/lib/domain/queue-item-state';
import { HalfmarkError } from '@/lib/errors';
import { decide, requireAllowed, requirePerson } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import type { ServiceContext } from './context';
import { openQueueItem } from './open-queue-item';
import { recordAuditEvent } from './record-audit-event';

export const openAppealInput = z.object({
  answerId: z.uuid(),
  reason: z.string().trim().min(1, 'Say why this part should be looked at again.').max(4000),
});

/**
 * A student's appeal of one part of their own answers: after release, until the set's appeal date, once per part and
 * release. It makes a new item in the review queue.
 */
export async function openAppeal(
  context: ServiceContext,
  input: z.output<typeof openAppealInput>,
): Promise<{ appealId: string }> {
  const { actor, transaction, now } = context;
  const student = requirePerson(actor);
  const answer = await Answer.findByPk(input.answerId, { transaction, lock: transaction.LOCK.UPDATE });
  const draw = answer ? await Draw.findByPk(answer.drawId, { transaction }) : null;
  if (!answer || !draw || draw.userId !== student.userId) throw new HalfmarkError('not-found');
  const item = await ProblemSetItem.findByPk(draw.itemId, { transaction, rejectOnEmpty: true });
  const set = await ProblemSet.findByPk(item.problemSetId, { transaction, rejectOnEmpty: true });
  const course = await courseForActor(actor, set.courseId, transaction);
  requireAllowed(decide(actor, 'appeal-own-part', course));
  const release = await SetRelease.findOne({ where: { problemSetId: set.id, userId: student.userId }, transaction });
  if (!release) throw new HalfmarkError('wrong-state', 'Your scores are not out yet, so there is nothing to appeal.');
  if (await isStillMarked(context, answer)) {
    throw new HalfmarkError('wrong-state', 'This part is still being marked, so there is nothing to appeal yet.');
  }
  if (set.appealsUntil !== null && now >= set.appealsUntil) {
    throw new HalfmarkError('wrong-state', 'The time for appeals is over. Speak to your instructor.');
  }
  const appeal = await createOnce(context, {
    setReleaseId: release.id,
    problemSetId: set.id,
    answerId: answer.id,
    drawId: draw.id,
    partKey: answer.partKey,
    userId: student.userId,
    reason: input.reason,
  });
  const check = answer.currentCheckId ? await AnswerCheck.findByPk(answer.currentCheckId, { transaction }) : null;
  await openQueueItem(context, {
    problemSetId: set.id,
    itemId: item.id,
    answerId: answer.id,
    partKey: answer.partKey,
    kind: 'appeal',
    reasons: ['appeal'],
    kinKey: check?.kinKey ?? null,
    suggestedCredit: null,
    suggestedRule: null,
    appealId: appeal.id,
  });
  await recordAuditEvent(context, {
    action: 'open-appeal',
    courseId: course.id,
    subject: { kind: 'appeal', id: appeal.id },
  });
  return { appealId: appeal.id };
}

/** Whether the part waits for the checker or a person, also again after a ruling was taken back. */
async function isStillMarked({ transaction }: ServiceContext, answer: Answer): Promise<boolean> {
  if (answer.supersededAt !== null || answer.currentCreditEntryId === null) return true;
  const waiting = await QueueItem.count({
    where: { answerId: answer.id, kind: 'review', state: { [Op.in]: [...liveQueueItemStates, 'to-settle'] } },
    transaction,
  });
  return waiting > 0;
}

async function createOnce(
  { transaction, now }: ServiceContext,
  values: Pick<Appeal, 'setReleaseId' | 'problemSetId' | 'answerId' | 'drawId' | 'partKey' | 'userId' | 'reason'>,
): Promise<Appeal> {
  try {
    return await Appeal.create(
      { ...values, outcome: null, reply: null, answeredBy: null, answeredAt: null, rulingId: null, createdAt: now },
      { transaction },
    );
  } catch (error) {
    if (isConstraintViolation(error, 'appeals_part_unique')) {
      throw new HalfmarkError('conflict', 'You have appealed this part already.');
    }
    throw error;
  }
}
