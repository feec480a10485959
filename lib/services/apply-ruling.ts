import { Ruling, type RulingKind } from '@/models/ruling';
import type { QueueItem } from '@/models/queue-item';
import type { Thousandths } from '@/lib/domain/credit';
import { mayPassTo, type QueueItemState } from '@/lib/domain/queue-item-state';
import type { CreditSource } from '@/models/credit-entry';
import { HalfmarkError } from '@/lib/errors';
import { requirePerson } from '@/lib/policies/decide';
import type { ServiceContext } from './context';
import { giveCredit } from './give-credit';
import { recordAuditEvent } from './record-audit-event';

/** A person's decision on one queue item. */
export type RulingInput = {
  item: QueueItem;
  courseId: string;
  kind: RulingKind;
  credit: Thousandths;
  outOf: Thousandths;
  comment: string;
  millisecondsSpent: number | null;
};

const sourceOf: Record<RulingKind, CreditSource> = {
  single: 'ruling',
  kin: 'kin-ruling',
  settlement: 'settlement',
  appeal: 'appeal',
};

/**
 * Writes a ruling, the credit it gives and the item's new state. A ruling is never changed afterwards: another one
 * follows it. Callers have authorised and hold the item's row.
 */
export async function applyRuling(context: ServiceContext, input: RulingInput): Promise<Ruling> {
  const { transaction, now } = context;
  const grader = requirePerson(context.actor);
  const { item, kind, credit, outOf, comment } = input;
  if (!Number.isInteger(credit) || credit < 0 || credit > outOf) {
    throw new HalfmarkError('invalid', undefined, {
      fields: { credit: 'Give a credit between zero and the full credit.' },
    });
  }
  const state: QueueItemState = kind === 'settlement' ? 'settled' : 'ruled';
  if (!mayPassTo(item.state, state)) throw new HalfmarkError('wrong-state');
  const sequence = 1 + (await Ruling.count({ where: { queueItemId: item.id }, transaction }));
  const ruling = await Ruling.create(
    {
      queueItemId: item.id,
      answerId: item.answerId,
      sequence,
      graderId: grader.userId,
      kind,
      credit,
      outOf,
      comment,
      coveringRulingId: null,
      millisecondsSpent: input.millisecondsSpent,
      createdAt: now,
    },
    { transaction },
  );
  await giveCredit(context, {
    answerId: item.answerId,
    credit,
    outOf,
    source: sourceOf[kind],
    rulingId: ruling.id,
    reason: comment.slice(0, 4000),
  });
  await item.update({ state, heldBy: null, heldUntil: null }, { transaction });
  await recordAuditEvent(context, {
    action: kind === 'settlement' ? 'settle-disagreement' : kind === 'appeal' ? 'answer-appeal' : 'rule-on-answer',
    courseId: input.courseId,
    subject: { kind: 'answer', id: item.answerId },
    details: { credit, outOf },
  });
  return ruling;
}
