import { formatCredit } from '@/lib/domain/credit';
import type { ReportedChange, ReportedPart } from './score-report';

/** A change of a report in words: "Question 2, part b: 1.5 marks, before 1 mark". */
export function changeInWords({ position, key, before, after }: ReportedChange): string {
  return `Question ${position}, part ${key}: ${marksInWords(after)}, before ${marksInWords(before)}`;
}

function marksInWords(credit: number | null): string {
  if (credit === null) return 'still being marked';
  return `${formatCredit(credit)} ${credit === 1000 ? 'mark' : 'marks'}`;
}

const outcomes = {
  upheld: 'On your appeal the credit was raised.',
  kept: 'On your appeal a person looked at it again and kept the credit.',
  lowered: 'On your appeal the credit was lowered.',
} as const;

/** What came of an appeal, in words for the student. */
export function appealInWords({ outcome, sameGrader }: NonNullable<ReportedPart['appeal']>): string {
  if (!sameGrader) return outcomes[outcome];
  return `${outcomes[outcome]} The course has no other grader, so the person who marked it before answered.`;
}

/** Whether an appeal may lower a credit, said before one is made. */
export function appealRuleInWords(mayLower: boolean): string {
  return mayLower
    ? 'An appeal may raise, keep or lower the credit.'
    : 'An appeal may raise the credit or keep it; it does not lower it.';
}

/** The caution under which every report stands. */
export const reportCaution =
  'A verdict of the checker is advice until your course’s policy or a person makes it a mark; you can always ask ' +
  'for a person. The rules of your course and institution on grading, appeals, accommodations, academic ' +
  'integrity and student records govern.';

/** A recognised slip as a sentence: the catalogue's words and an author's own sentence read alike. */
export function slipAsSentence(slip: string): string {
  return `Likely slip: ${slip.trim().replace(/[.\s]+$/, '')}.`;
}
