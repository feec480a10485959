import { Delivery } from '@/models/delivery';
import { ScoreReport } from '@/models/score-report';
import { User } from '@/models/user';
import { inTransaction } from '@/lib/db/transaction';
import type { HandOff } from '@/lib/mail/transport';
import type { ScoreReportContent } from '@/lib/presenters/score-report';

/** A report that is this moment's to hand over. */
export type ClaimedDelivery = {
  messageId: string;
  revision: number;
  reason: string;
  problemSetId: string;
  content: ScoreReportContent;
  name: string;
  email: string;
};

/**
 * Marks a waiting delivery as sending and commits that, so that no second hand-off begins whatever happens now. One that
 * is found sending was cut short in an earlier run of the job: it becomes `unconfirmed`, and null is returned, as for
 * one that is done.
 */
export async function claimDelivery(deliveryId: string, now: Date): Promise<ClaimedDelivery | null> {
  return inTransaction(async (transaction) => {
    const delivery = await Delivery.findByPk(deliveryId, { transaction, lock: transaction.LOCK.UPDATE });
    if (!delivery) return null;
    if (delivery.state === 'sending') {
      await delivery.update(
        { state: 'unconfirmed', lastError: 'the hand-over was cut short; the mail may or may not have gone out' },
        { transaction },
      );
      return null;
    }
    if (delivery.state !== 'waiting') return null;
    const report = await ScoreReport.findByPk(delivery.scoreReportId, { transaction, rejectOnEmpty: true });
    const student = await User.findByPk(report.userId, { transaction, rejectOnEmpty: true });
    await delivery.update({ state: 'sending', sendingAt: now, attempts: delivery.attempts + 1 }, { transaction });
    return {
      messageId: delivery.messageId,
      revision: report.revision,
      reason: report.reason,
      problemSetId: report.problemSetId,
      content: report.content as ScoreReportContent,
      name: student.name,
      email: student.email,
    };
  });
}

/** Records what became of a hand-over; one refused for now waits again while the job may be retried, else it failed. */
export async function settleDelivery(
  deliveryId: string,
  result: HandOff,
  now: Date,
  { mayRetry }: { mayRetry: boolean },
): Promise<void> {
  await inTransaction(async (transaction) => {
    const delivery = await Delivery.findByPk(deliveryId, { transaction, lock: transaction.LOCK.UPDATE });
    if (delivery?.state !== 'sending') return;
    switch (result.outcome) {
      case 'accepted':
        await delivery.update({ state: 'sent', sentAt: now, lastError: null }, { transaction });
        return;
      case 'unconfirmed':
        await delivery.update({ state: 'unconfirmed', lastError: result.reason }, { transaction });
        return;
      case 'refused': {
        const state = result.forNow && mayRetry ? 'waiting' : 'failed';
        await delivery.update({ state, lastError: result.reason }, { transaction });
        return;
      }
    }
  });
}
