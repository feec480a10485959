import { type Transaction } from 'sequelize';
import { Course } from '@/models/course';
import { ProblemSet } from '@/models/problem-set';
import { User } from '@/models/user';
import { sentenceOf } from '@/lib/checker/slips/sentences';
import { dividePoints, sumCredits } from '@/lib/domain/credit';
import { setPolicySchema } from '@/lib/domain/set-policy';
import { totalOf, type ReportedItem, type ReportedPart, type ScoreReportContent } from '@/lib/presenters/score-report';
import type { Part } from '@/lib/templates/content';
import { interpolate } from '@/lib/templates/interpolate';
import { reportAnswers, reportItems, type ReportAnswerRow, type ReportItemRow } from './report-material';

/** A student's report as it would be now; also for the preview before release. */
export async function reportContent(
  { problemSetId, userId }: { problemSetId: string; userId: string },
  transaction?: Transaction,
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
    appeal: answer.appealOutcome === null ? null : { outcome: answer.appealOutcome, sameGrader: answer.sameGrader },
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
  appeal: null,
} satisfies Partial<ReportedPart>;

function slipInWords(part: Part, slip: string): string {
  return part.expected.find(({ id }) => id === slip)?.sentence ?? sentenceOf(slip);
}
