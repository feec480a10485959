import { environment } from '@/lib/env';
import { scoreReportMail } from '@/lib/mail/score-report';
import { handOff, type HandOffMail } from '@/lib/mail/transport';
import { absolute, paths } from '@/lib/paths';
import { claimDelivery, settleDelivery } from '@/lib/services/hand-over-delivery';
import type { JobHandler, JobRun } from './job-handler';

/**
 * Mails one score report, at most once. It is marked as sending, in a transaction of its own, before it is handed to the
 * mail server; a hand-off that was cut short is `unconfirmed`, is not sent again by itself and is listed for a person.
 */
export const sendScoreReport: JobHandler<'send-score-report'> = (payload, run) =>
  sendScoreReportBy(handOff, payload, run);

/** The same with a mail server of the caller's. */
export async function sendScoreReportBy(
  send: HandOffMail,
  { deliveryId }: { deliveryId: string },
  run: Pick<JobRun, 'isLastAttempt'>,
): Promise<void> {
  const claimed = await claimDelivery(deliveryId, new Date());
  if (claimed === null) return;
  const { appUrl } = environment();
  const result = await send({
    ...scoreReportMail({
      content: claimed.content,
      revision: claimed.revision,
      reason: claimed.reason,
      link: absolute(appUrl, paths.workReport(claimed.problemSetId)),
    }),
    to: { name: claimed.name, address: claimed.email },
    messageId: claimed.messageId,
  });
  await settleDelivery(deliveryId, result, new Date(), { mayRetry: !run.isLastAttempt });
  if (result.outcome === 'refused' && result.forNow && !run.isLastAttempt) {
    throw new Error(`The mail server would not take a report for now: ${result.reason}.`);
  }
}
