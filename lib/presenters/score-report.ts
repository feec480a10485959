import { sumCredits, type Thousandths } from '@/lib/domain/credit';
import type { Verdict } from '@/lib/domain/verdict';

/** How a part stands in a report: marked, not answered, or still being marked. */
export type ReportedState = 'marked' | 'no-answer' | 'waiting';

/** One part of a score report. Credits are thousandths of a mark. */
export type ReportedPart = {
  key: string;
  /** Markdown with the student's drawn values. */
  prompt: string;
  state: ReportedState;
  /** What was typed, as typed; null without an answer. */
  answer: string | null;
  readingLatex: string;
  readingPlain: string;
  verdict: Verdict | null;
  /** The recognised slip in plain words; null for none. */
  slip: string | null;
  credit: Thousandths;
  outOf: Thousandths;
  /** The grader's comment in Markdown; empty for none. */
  comment: string;
  markedBy: 'checker' | 'person' | null;
  followThrough: boolean;
  /**
   * What came of an appeal that has been answered; null for none. `sameGrader` where it was answered by who marked the
   * part before, for want of another grader. The reply is the comment.
   */
  appeal: { outcome: 'upheld' | 'kept' | 'lowered'; sameGrader: boolean } | null;
  /** The answer that an appeal would be about; null without one. */
  answerId: string | null;
};

/** One question of a score report; `prompt` is Markdown with the student's drawn values. */
export type ReportedItem = {
  position: number;
  title: string;
  prompt: string;
  credit: Thousandths;
  outOf: Thousandths;
  parts: ReportedPart[];
};

/** A part whose credit or state is another than in the report before. */
export type ReportedChange = { position: number; key: string; before: Thousandths | null; after: Thousandths | null };

/** A student's score report for one set: what the e-mail, the page and the print are made from. */
export type ScoreReportContent = {
  course: { code: string; title: string; timeZone: string; notice: string };
  set: { number: number; title: string };
  student: string;
  items: ReportedItem[];
  /** Null where the set's policy shows no total. */
  total: { credit: Thousandths; outOf: Thousandths; partsWaiting: number } | null;
  appeals: { until: string | null; mayLower: boolean };
  changes: ReportedChange[];
};

/** The total of the items, with how many parts are still being marked. */
export function totalOf(items: readonly ReportedItem[]): NonNullable<ScoreReportContent['total']> {
  return {
    credit: sumCredits(items.map((item) => item.credit)),
    outOf: sumCredits(items.map((item) => item.outOf)),
    partsWaiting: items.flatMap((item) => item.parts).filter((part) => part.state === 'waiting').length,
  };
}

/** What is different from an earlier report, part by part; a part that was or is still being marked has no credit. */
export function changesSince(before: readonly ReportedItem[], after: readonly ReportedItem[]): ReportedChange[] {
  const creditOf = (part: ReportedPart | undefined) =>
    part === undefined || part.state === 'waiting' ? null : part.credit;
  return after.flatMap((item) => {
    const earlier = before.find(({ position }) => position === item.position);
    return item.parts.flatMap((part) => {
      const was = creditOf(earlier?.parts.find(({ key }) => key === part.key));
      const is = creditOf(part);
      return was === is ? [] : [{ position: item.position, key: part.key, before: was, after: is }];
    });
  });
}
