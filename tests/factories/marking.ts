import { type CreationAttributes } from 'sequelize';
import { type Answer } from '@/models/answer';
import { Draw } from '@/models/draw';
import { ProblemSetItem } from '@/models/problem-set-item';
import { QueueItem } from '@/models/queue-item';
import { Ruling } from '@/models/ruling';
import { SecondMarking } from '@/models/second-marking';
import { type User } from '@/models/user';

/** A waiting queue item for an answer. */
export async function buildQueueItem(
  answer: Answer,
  overrides: Partial<CreationAttributes<QueueItem>> = {},
): Promise<QueueItem> {
  const draw = await Draw.findByPk(answer.drawId, { rejectOnEmpty: true });
  const item = await ProblemSetItem.findByPk(draw.itemId, { rejectOnEmpty: true });
  return QueueItem.create({
    answerId: answer.id,
    problemSetId: item.problemSetId,
    itemId: item.id,
    partKey: answer.partKey,
    kind: 'review',
    reasons: ['no-credited-slip'],
    ...overrides,
  });
}

/** A single ruling on a queue item, which becomes ruled. Credits are thousandths. */
export async function buildRuling(
  queueItem: QueueItem,
  grader: User,
  overrides: Partial<CreationAttributes<Ruling>> = {},
): Promise<Ruling> {
  const ruling = await Ruling.create({
    queueItemId: queueItem.id,
    answerId: queueItem.answerId,
    sequence: (await Ruling.count({ where: { queueItemId: queueItem.id } })) + 1,
    graderId: grader.id,
    kind: 'single',
    credit: 1500,
    outOf: 3000,
    comment: 'The sign is lost.',
    reasons: ['sign'],
    millisecondsSpent: 20_000,
    ...overrides,
  });
  await queueItem.update({ state: 'ruled', heldBy: null, heldUntil: null });
  return ruling;
}

/** A second marking of a ruling, assigned to another grader. */
export async function buildSecondMarking(
  ruling: Ruling,
  grader: User,
  overrides: Partial<CreationAttributes<SecondMarking>> = {},
): Promise<SecondMarking> {
  const queueItem = await QueueItem.findByPk(ruling.queueItemId, { rejectOnEmpty: true });
  return SecondMarking.create({
    rulingId: ruling.id,
    firstGraderId: ruling.graderId,
    problemSetId: queueItem.problemSetId,
    answerId: ruling.answerId,
    graderId: grader.id,
    ...overrides,
  });
}
