import { type AnswerKind } from '@/lib/checker/contract';
import { attemptsLeft } from '@/lib/domain/attempts';
import { formatCredit, sumCredits } from '@/lib/domain/credit';
import { acceptsAnswers, closingTime } from '@/lib/domain/problem-set-state';
import { type Verdict } from '@/lib/domain/verdict';
import { type AttemptRow } from '@/lib/queries/attempts-of-draws';
import { type OwnSet } from '@/lib/queries/own-set';
import { type SavedRow } from '@/lib/queries/saved-answers';
import { type DrawnValues, type TemplateContent } from '@/lib/templates/content';
import { interpolate } from '@/lib/templates/interpolate';
import { pointsOfPart } from '@/lib/templates/points-of-part';
import { partReadingOf, readAnswer, type PartReading } from '@/lib/templates/read-answer';

/** A problem set as its student may see it. Plain data that may leave the server: times as ISO texts, marks as printed. */
export type StudentSet = {
  setId: string;
  number: number;
  title: string;
  course: { code: string; title: string; timeZone: string };
  /** The student's own closing time; null for a set without one. */
  closesAt: string | null;
  /** Whether that is later than for the others. */
  isExtended: boolean;
  takesAnswers: boolean;
  isReleased: boolean;
  /** Whether the verdict of an answer is told at once. */
  showsVerdict: boolean;
  marks: string;
  questions: StudentQuestion[];
};

export type StudentQuestion = {
  drawId: string;
  /** Counted from 1, in the order of the set. */
  place: number;
  title: string;
  /** Markdown with the drawn values set in. */
  prompt: string;
  marks: string;
  parts: StudentPart[];
};

export type StudentPart = {
  key: string;
  /** Markdown with the drawn values set in. */
  prompt: string;
  marks: string;
  kind: AnswerKind;
  reading: PartReading;
  attemptsAllowed: number;
  attemptsLeft: number;
  /** What stands as handed in; null while nothing was. */
  handedIn: StudentAnswer | null;
  /** What was typed last, where that is not what was handed in; null otherwise. */
  unsent: string | null;
  /** The revision under which it was saved; 0 for never. */
  revision: number;
};

export type StudentAnswer = {
  text: string;
  attempt: number;
  receipt: string;
  submittedAt: string;
  /** Whether the reader could read it; otherwise a person does, and it cost no attempt. */
  readable: boolean;
  /** Taken in from a file by the course's staff, not typed. */
  byStaff: boolean;
  /** The verdict alone, and only where the set tells it at once; `waiting` until there is one. */
  verdict: Verdict | 'waiting' | null;
};

/** What of a question the presenter is given; `content` holds the reference, none of which goes further. */
export type QuestionSource = {
  drawId: string;
  points: number;
  content: TemplateContent;
  values: DrawnValues;
};

/**
 * Presents a set to its student, by naming every field that goes out: prompts, kinds and symbols, marks, the student's own
 * texts. References, solutions, slips, evidence, messages of the checker and drawn seeds stay behind.
 */
export function presentStudentSet(
  set: OwnSet,
  questions: readonly QuestionSource[],
  own: { attempts: readonly AttemptRow[]; saved: readonly SavedRow[] },
  now: Date,
): StudentSet {
  const closesAt = closingTime(set.closesAt, set.extendedUntil);
  return {
    setId: set.id,
    number: set.number,
    title: set.title,
    course: { code: set.course.code, title: set.course.title, timeZone: set.course.timeZone },
    closesAt: closesAt?.toISOString() ?? null,
    isExtended: closesAt !== null && set.closesAt !== null && closesAt > set.closesAt,
    takesAnswers: acceptsAnswers(set, set.extendedUntil, now),
    isReleased: set.releasedAt !== null,
    showsVerdict: set.policy.showVerdictAtOnce,
    marks: formatCredit(sumCredits(questions.map(({ points }) => points))),
    questions: questions.map((question, index) => ({
      drawId: question.drawId,
      place: index + 1,
      title: question.content.title,
      prompt: interpolate(question.content.prompt, question.values, question.content),
      marks: formatCredit(question.points),
      parts: question.content.parts.map(({ key }) => presentPart(set, question, key, own)),
    })),
  };
}

function presentPart(
  set: OwnSet,
  { drawId, points, content, values }: QuestionSource,
  key: string,
  own: { attempts: readonly AttemptRow[]; saved: readonly SavedRow[] },
): StudentPart {
  const isThis = (row: { drawId: string; partKey: string }) => row.drawId === drawId && row.partKey === key;
  const attempts = own.attempts.filter(isThis);
  const stands = attempts.find((attempt) => attempt.stands);
  const saved = own.saved.find(isThis);
  const reading = partReadingOf(content, key);
  const made = attempts.map(({ verdict, text }) => ({
    verdict,
    readable: verdict === null ? readAnswer(content, key, text).readable : verdict !== 'unreadable',
  }));
  const prompt = content.parts.find((part) => part.key === key)?.prompt ?? '';
  return {
    key,
    prompt: interpolate(prompt, values, content),
    marks: formatCredit(pointsOfPart(content, points, key)),
    kind: reading.kind,
    reading,
    attemptsAllowed: set.attemptsAllowed,
    attemptsLeft: attemptsLeft(set.attemptsAllowed, made),
    handedIn: stands
      ? presentAnswer(stands, made[attempts.indexOf(stands)]?.readable ?? true, set.policy.showVerdictAtOnce)
      : null,
    unsent: saved && saved.text !== stands?.text ? saved.text : null,
    revision: saved?.revision ?? 0,
  };
}

function presentAnswer(attempt: AttemptRow, readable: boolean, showsVerdict: boolean): StudentAnswer {
  return {
    text: attempt.text,
    attempt: attempt.attempt,
    receipt: attempt.receipt,
    submittedAt: attempt.submittedAt.toISOString(),
    readable,
    byStaff: attempt.source === 'intake',
    verdict: showsVerdict ? (attempt.verdict ?? 'waiting') : null,
  };
}
