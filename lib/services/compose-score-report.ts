import { Course } from '@/models/course';
import { Delivery } from '@/models/delivery';
import { ProblemSet } from '@/models/problem-set';
import { ScoreReport } from '@/models/score-report';
import { SetRelease } from '@/models/set-release';
import { User } from '@/models/user';
import { sentenceOf } from '@/lib/checker/slips/sentences';
import { dividePoints, sumCredits } from '@/lib/domain/credit';
import { setPolicySchema } from '@/lib/domain/set-policy';
import {
  changesSince,
  totalOf,
  type ReportedItem,
  type ReportedPart,
  type ScoreReportContent,
} from '@/lib/presenters/score-report';
import { reportAnswers, reportItems, type ReportAnswerRow, type ReportItemRow } from '@/lib/queries/report-material';
import { enqueue } from '@/lib/queue/enqueue';
import type { Part } from '@/lib/templates/content';
import { interpolate } from '@/lib/templates/interpolate';
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
  const content = await reportContent(context, input);
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
  const released = await SetRelease.findOne({
    where: { problemSetId: input.problemSetId, userId: input.userId },
    transaction,
    lock: transaction.LOCK.UPDATE,
  });
  if (released) await composeScoreReport(context, input);
}

/** A student's report as it would be now; also for the preview before release. */
export async function reportContent(
  { transaction }: Pick<ServiceContext, 'transaction'>,
  { problemSetId, userId }: { problemSetId: string; userId: string },
): Promise<ScoreReportContent> {
  const set = await ProblemSet.findByPk(problemSetId, { transaction, rejectOnEmpty: true });
  const course = await Course.findByPk(set.courseId, { transaction, rejectOnEmpty: true });
  const student = await User.findByPk(userId, { transaction, rejectOnEmpty: true });
  const answers = await reportAnswers(problemSetId, userId, transaction);
  const items = (await reportItems(problemSetId, userId, transaction)).map((row) => presentItem(row, answers));
  const policy = setPolicySchema.parse(set.policy);
  return {
    course: { code: course.code, title: course.title, timeZone: course.timeZone, notice: course.notice },
    set: { number: set.number, title: set.title },
    student: student.name,
    items,
    total: policy.reportShowsTotal ? totalOf(items) : null,
    appeals: { until: set.appealsUntil?.toISOString() ?? null, mayLower: policy.appealMayLower },
    changes: [],
  };
}

function presentItem(row: ReportItemRow, answers: readonly ReportAnswerRow[]): ReportedItem {
  const { content, values } = row;
  const shares = dividePoints(
    row.points,
    content.parts.map((part) => part.weight),
  );
  const setIn = (text: string) => (values === null ? '' : interpolate(text, values, content));
  const parts = content.parts.map((part, index) =>
    presentPart(
      part,
      setIn(part.prompt),
      shares[index] ?? 0,
      answers.find((answer) => answer.drawId === row.drawId && answer.partKey === part.key),
    ),
  );
  return {
    position: row.position,
    title: content.title,
    prompt: setIn(content.prompt),
    credit: sumCredits(parts.map((part) => part.credit)),
    outOf: row.points,
    parts,
  };
}

function presentPart(part: Part, prompt: string, outOf: number, answer: ReportAnswerRow | undefined): ReportedPart {
  const { key } = part;
  if (!answer) {
    return { ...blank, key, prompt, outOf, state: 'no-answer' };
  }
  const typed = {
    answer: answer.text,
    answerId: answer.answerId,
    readingLatex: answer.readingLatex ?? '',
    readingPlain: answer.readingPlain ?? '',
  };
  if (answer.waits) return { ...blank, ...typed, key, prompt, outOf, state: 'waiting' };
  return {
    ...blank,
    ...typed,
    key,
    prompt,
    outOf,
    state: 'marked',
    verdict: answer.verdict,
    slip: answer.slip === null ? null : slipInWords(part, answer.slip),
    credit: answer.credit ?? 0,
    comment: answer.comment ?? '',
    markedBy: answer.creditSource === 'automatic' || answer.creditSource === 'rule' ? 'checker' : 'person',
  };
}

const blank = {
  answer: null,
  answerId: null,
  readingLatex: '',
  readingPlain: '',
  verdict: null,
  slip: null,
  credit: 0,
  comment: '',
  markedBy: null,
  followThrough: false,
} satisfies Partial<ReportedPart>;

function slipInWords(part: Part, slip: string): string {
  return part.expected.find(({ id }) => id === slip)?.sentence ?? sentenceOf(slip);
}
