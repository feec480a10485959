import { Op } from 'sequelize';
import { Delivery } from '@/models/delivery';
import { ScoreReport } from '@/models/score-report';
import { User } from '@/models/user';
import { inTransaction } from '@/lib/db/transaction';
import type { HandOff } from '@/lib/mail/transport';
import type { ScoreReportContent } from '@/lib/presenters/score-report';
import type { ServiceContext } from './context';

/** Minutes after which a hand-over has certainly ended: the patience with a mail server is below one. */
const LONGEST_HAND_OVER = 15;

const cutShort = 'the hand-over was cut short; the mail may or may not have gone out';

/** A report that is this moment's to hand over. */
export type ClaimedDelivery = {
  /** Which hand-over this is, counted from 1; what becomes of it is told with it. */
  attempt: number;
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
      await delivery.update({ state: 'unconfirmed', lastError: cutShort }, { transaction });
      return null;
    }
    if (delivery.state !== 'waiting') return null;
    const report = await ScoreReport.findByPk(delivery.scoreReportId, { transaction, rejectOnEmpty: true });
    const student = await User.findByPk(report.userId, { transaction, rejectOnEmpty: true });
    await delivery.update({ state: 'sending', sendingAt: now, attempts: delivery.attempts + 1 }, { transaction });
    return {
      attempt: delivery.attempts,
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

/**
 * The deliveries that have been `sending` for longer than a hand-over lasts become `unconfirmed`: their worker has died
 * and no further run of the job may come to find them.
 *
 * @returns how many they were
 */
export async function doubtStaleDeliveries({ transaction, now }: ServiceContext): Promise<number> {
  const [count] = await Delivery.update(
    { state: 'unconfirmed', lastError: cutShort },
    {
      where: { state: 'sending', sendingAt: { [Op.lte]: new Date(now.getTime() - LONGEST_HAND_OVER * 60_000) } },
      transaction,
    },
  );
  return count;
}

/**
 * Records what became of a hand-over; one refused for now waits again while the job may be retried, else it failed. Word
 * of a hand-over that was taken for cut short still counts, unless a person has sent the report again since.
 */
export async function settleDelivery(
  deliveryId: string,
  attempt: number,
  result: HandOff,
  now: Date,
  { mayRetry }: { mayRetry: boolean },
): Promise<void> {
  await inTransaction(async (transaction) => {
    const delivery = await Delivery.findByPk(deliveryId, { transaction, lock: transaction.LOCK.UPDATE });
    if (delivery?.attempts !== attempt) return;
    if (delivery.state !== 'sending' && delivery.state !== 'unconfirmed') return;
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
