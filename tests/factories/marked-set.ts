import { type Answer } from '@/models/answer';
import { type User } from '@/models/user';
import { buildAnswer, buildAnswerCheck, buildCreditEntry } from './answers';
import { buildClassroom, type Classroom } from './classroom';

/** A closed set whose students have answered part a, `i hbar S_z` for full credit by the checker; `answers` in order. */
export type MarkedSet = Classroom & { answers: Answer[] };

/** Builds a closed set that is marked and not yet released. Each part is worth 3000 thousandths. */
export async function buildMarkedSet(options: Parameters<typeof buildClassroom>[0] = {}): Promise<MarkedSet> {
  const classroom = await buildClassroom({ ...options, problemSet: { state: 'closed', ...options?.problemSet } });
  const answers: Answer[] = [];
  for (const draw of classroom.draws) {
    const answer = await buildAnswer(draw);
    await buildAnswerCheck(answer);
    await buildCreditEntry(answer);
    answers.push(answer);
  }
  return { ...classroom, answers };
}

/** The student at a place of the classroom, counted from 0. */
export function studentAt(classroom: Classroom, index = 0): User {
  const student = classroom.students[index];
  if (student === undefined) throw new RangeError('There is no such student.');
  return student.user;
}

/** The answer at a place of the classroom, counted from 0. */
export function answerAt(marked: MarkedSet, index = 0): Answer {
  const answer = marked.answers[index];
  if (answer === undefined) throw new RangeError('There is no such answer.');
  return answer;
}
