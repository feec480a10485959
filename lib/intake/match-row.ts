import { MAX_STORED_ANSWER, type RowRefusal } from '@/lib/domain/intake-row';
import { withoutNeutralising } from './neutralise-formula';
import type { AnswerRow } from './read-answer-rows';

/** What a row is matched with; see lib/queries/intake-roster. */
export type MatchAgainst = {
  students: ReadonlyMap<string, { userId: string; sectionId: string | null }>;
  questions: ReadonlyMap<number, { itemId: string; parts: readonly string[] }>;
  /** Sections whose students the uploader may take answers in for; null for all. */
  sections: readonly string[] | null;
  /** The number of the standing attempt at a part; undefined for none. */
  standingAttempt: (userId: string, itemId: string, partKey: string) => number | undefined;
};

/** What becomes of a row: matched with a student, question and part, or refused with a message that says how to mend it. */
export type MatchedRow =
  | { state: 'accepted'; userId: string; itemId: string; partKey: string; text: string; message: string | null }
  | { state: 'refused'; reason: RowRefusal; message: string };

/**
 * Matches the rows of one sheet, in order; a part that a row before has answered is refused as repeated, since nobody
 * can tell which of the two is meant.
 */
export function rowMatcher(against: MatchAgainst): (row: AnswerRow) => MatchedRow {
  const seen = new Map<string, number>();
  return (row) => {
    const student = matchStudent(row, against);
    if ('state' in student) return student;
    const question = matchQuestion(row, against);
    if ('state' in question) return question;
    const text = withoutNeutralising(row.answer);
    if (text.trim() === '') return refuse('empty-answer', 'There is no answer in this row.');
    if (text.length > MAX_STORED_ANSWER) {
      return refuse('too-long', `The answer is longer than ${MAX_STORED_ANSWER} characters.`);
    }
    const key = `${student.userId} ${question.itemId} ${question.partKey}`;
    const before = seen.get(key);
    if (before !== undefined) {
      return refuse('repeated', `Line ${before} already answers this part for this student. Keep one of the two.`);
    }
    seen.set(key, row.line);
    const standing = against.standingAttempt(student.userId, question.itemId, question.partKey);
    return {
      state: 'accepted',
      userId: student.userId,
      ...question,
      text,
      message: standing === undefined ? null : `Becomes attempt ${standing + 1}; attempt ${standing} is kept.`,
    };
  };
}

function matchStudent(row: AnswerRow, { students, sections }: MatchAgainst): { userId: string } | MatchedRow {
  const email = row.student.trim().toLowerCase();
  if (email === '') return refuse('no-student', 'The student’s e-mail address is missing.');
  const student = students.get(email);
  if (!student) {
    return refuse('unknown-student', `No student of this course has the address ${email.slice(0, 100)}.`);
  }
  if (sections !== null && (student.sectionId === null || !sections.includes(student.sectionId))) {
    return refuse('other-section', 'This student is in a section that you do not grade.');
  }
  return { userId: student.userId };
}

function matchQuestion(row: AnswerRow, { questions }: MatchAgainst): { itemId: string; partKey: string } | MatchedRow {
  const number = /^\d{1,3}$/.test(row.question.trim()) ? Number(row.question.trim()) : Number.NaN;
  const question = questions.get(number);
  if (!question) {
    const last = Math.max(0, ...questions.keys());
    return refuse('unknown-question', `The question is a number from 1 to ${last}.`);
  }
  const partKey = row.part.trim().toLowerCase();
  if (!question.parts.includes(partKey)) {
    return refuse('unknown-part', `Question ${number} has the parts ${question.parts.join(', ')}.`);
  }
  return { itemId: question.itemId, partKey };
}

function refuse(reason: RowRefusal, message: string): MatchedRow {
  return { state: 'refused', reason, message };
}
