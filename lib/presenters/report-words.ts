import { formatCredit } from '@/lib/domain/credit';
import type { ReportedChange } from './score-report';

/** A change of a report in words: "Question 2, part b: 1.5 marks, before 1 mark". */
export function changeInWords({ position, key, before, after }: ReportedChange): string {
  return `Question ${position}, part ${key}: ${marksInWords(after)}, before ${marksInWords(before)}`;
}

function marksInWords(credit: number | null): string {
  if (credit === null) return 'still being marked';
  return `${formatCredit(credit)} ${credit === 1000 ? 'mark' : 'marks'}`;
}
