import { isDeepStrictEqual } from 'node:util';
import { Delivery } from '@/models/delivery';
import { ScoreReport } from '@/models/score-report';
import { SetRelease } from '@/models/set-release';
import { changesSince, type ScoreReportContent } from '@/lib/presenters/score-report';
import { reportContent } from '@/lib/queries/report-content';
import { enqueue } from '@/lib/queue/enqueue';
import type { ServiceContext } from './context';
import { messageIdOf } from './message-id';

/** Whose report, on what, and why it is sent now (in words for the student; shown where it is not the first). */
export type ReportInput = { problemSetId: string; userId: string; reason: string };

/**
 * Writes the next revision of a student's score report, with one delivery to be mailed by the worker. Callers have
 * authorised and have released the student's scores.
 */
export async function composeScoreReport(context: ServiceContext, input: ReportInput): Promise<ScoreReport> {
  const { transaction, now } = context;
  const before = await ScoreReport.findOne({
    where: { problemSetId: input.problemSetId, userId: input.userId },
    order: [['revision', 'DESC']],
    transaction,
  });
  const content = await reportContent(input, context.transaction);
  const earlier = before?.content as ScoreReportContent | undefined;
  const report = await ScoreReport.create(
    {
      problemSetId: input.problemSetId,
      userId: input.userId,
      revision: (before?.revision ?? 0) + 1,
      content: { ...content, changes: earlier ? changesSince(earlier.items, content.items) : [] },
      reason: input.reason,
      createdAt: now,
    },
    { transaction },
  );
  const delivery = await Delivery.create(
    {
      scoreReportId: report.id,
      messageId: messageIdOf(report.id),
      lastError: null,
      sendingAt: null,
      sentAt: null,
      createdAt: now,
    },
    { transaction },
  );
  await enqueue('send-score-report', { deliveryId: delivery.id }, { transaction, priority: 5 });
  return report;
}

/** Sends a corrected report where the student's scores are out and it would say something else than the last one. */
export async function reissueIfReleased(context: ServiceContext, input: ReportInput): Promise<void> {
  const { transaction } = context;
  const { problemSetId, userId } = input;
  const released = await SetRelease.findOne({
    where: { problemSetId, userId },
    transaction,
    lock: transaction.LOCK.UPDATE,
  });
  if (!released) return;
  const last = await ScoreReport.findOne({
    where: { problemSetId, userId },
    order: [['revision', 'DESC']],
    transaction,
  });
  const content = await reportContent(input, transaction);
  if (last && saysTheSame(last.content as ScoreReportContent, content)) return;
  await composeScoreReport(context, input);
}

/** Whether two reports say the same of every part; what is said of the course and set around them is no reason to write. */
function saysTheSame(before: ScoreReportContent, after: ScoreReportContent): boolean {
  return isDeepStrictEqual(before.items, JSON.parse(JSON.stringify(after.items)));
}
