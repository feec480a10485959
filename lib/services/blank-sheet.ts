import type { PersonActor } from '@/lib/domain/actor';
import { inTransaction } from '@/lib/db/transaction';
import { sectionBound, decide } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { intakeRoster } from '@/lib/queries/intake-roster';
import { assertMayTakeIn } from './receive-intake';

/** The rows of an answer sheet that is still empty: every student whom the person may take in, every part of the set. */
export async function blankSheet(
  actor: PersonActor,
  problemSetId: string,
): Promise<{ number: number; rows: [student: string, question: number, part: string, answer: string][] }> {
  return inTransaction(async (transaction) => {
    const set = await assertMayTakeIn({ actor, transaction, now: new Date() }, problemSetId);
    const course = await courseForActor(actor, set.courseId, transaction);
    const sections = sectionBound(actor, course, decide(actor, 'take-in-answers', course));
    const { students, questions } = await intakeRoster(set.id, transaction);
    const rows = [...students]
      .filter(([, { sectionId }]) => sections === null || (sectionId !== null && sections.includes(sectionId)))
      .sort(([first], [second]) => first.localeCompare(second, 'en'))
      .flatMap(([email]) =>
        [...questions].flatMap(([number, { parts }]) =>
          parts.map((part): [string, number, string, string] => [email, number, part, '']),
        ),
      );
    return { number: set.number, rows };
  });
}
