import { type SendMailOptions } from 'nodemailer';
import { environment } from '@/lib/env';
import { scoreReportMail } from '@/lib/mail/score-report';
import { handOff, type HandOff, type HandOffMail } from '@/lib/mail/transport';
import { absolute, paths } from '@/lib/paths';
import { claimDelivery, settleDelivery, type ClaimedDelivery } from '@/lib/services/hand-over-delivery';
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
  const settle = (result: HandOff, mayRetry: boolean) =>
    settleDelivery(deliveryId, claimed.attempt, result, new Date(), { mayRetry });
  let message: SendMailOptions;
  try {
    message = messageOf(claimed);
  } catch (error) {
    await settle({ outcome: 'refused', forNow: false, reason: 'the letter could not be written' }, false);
    throw error;
  }
  const result = await send(message);
  await settle(result, !run.isLastAttempt);
  if (result.outcome === 'refused' && result.forNow && !run.isLastAttempt) {
    throw new Error(`The mail server would not take a report for now: ${result.reason}.`);
  }
}

function messageOf({ content, revision, reason, problemSetId, ...claimed }: ClaimedDelivery): SendMailOptions {
  const link = absolute(environment().appUrl, paths.workReport(problemSetId));
  return {
    ...scoreReportMail({ content, revision, reason, link }),
    to: { name: claimed.name, address: claimed.email },
    messageId: claimed.messageId,
  };
}
