import { Op } from 'sequelize';
import { QueueItem, type QueueItemKind } from '@/models/queue-item';
import type { Thousandths } from '@/lib/domain/credit';
import type { FlagReason } from '@/lib/domain/flag-reasons';
import { liveQueueItemStates } from '@/lib/domain/queue-item-state';
import type { ServiceContext } from './context';

/** An answer that needs a person, and why. */
export type QueueItemInput = {
  problemSetId: string;
  itemId: string;
  answerId: string;
  partKey: string;
  kind: QueueItemKind;
  reasons: readonly FlagReason[];
  kinKey: string | null;
  suggestedCredit: Thousandths | null;
  suggestedRule: string | null;
  appealId?: string;
};

/**
 * Puts an answer into the review queue, or adds the reasons to the item by which it waits there already: an answer waits
 * for one person at a time. Callers have authorised and hold the answer's row.
 */
export async function openQueueItem({ transaction, now }: ServiceContext, input: QueueItemInput): Promise<QueueItem> {
  const live = await QueueItem.findOne({
    where: { answerId: input.answerId, state: { [Op.in]: [...liveQueueItemStates] } },
    transaction,
    lock: transaction.LOCK.UPDATE,
  });
  if (live && input.kind === live.kind) {
    const reasons = [...new Set([...live.reasons, ...input.reasons])];
    return live.update(
      { reasons, kinKey: input.kinKey, suggestedCredit: input.suggestedCredit, suggestedRule: input.suggestedRule },
      { transaction },
    );
  }
  return QueueItem.create(
    {
      ...input,
      reasons: [...input.reasons],
      heldBy: null,
      heldUntil: null,
      question: null,
      appealId: input.appealId ?? null,
      createdAt: now,
    },
    { transaction },
  );
}
