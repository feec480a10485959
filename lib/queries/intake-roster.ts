import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';
import type { TemplateContent } from '@/lib/templates/content';

/** What rows of an answer sheet are matched with. */
export type IntakeRoster = {
  /** Present students by e-mail address in lower case. */
  students: ReadonlyMap<string, { userId: string; sectionId: string | null }>;
  /** Questions by their number in the set, with the letters of their parts. */
  questions: ReadonlyMap<number, { itemId: string; parts: readonly string[] }>;
  /** The number of the standing attempt, by `user item part`. */
  standing: ReadonlyMap<string, number>;
};

/** The key of `standing`. */
export function partOf(userId: string, itemId: string, partKey: string): string {
  return `${userId} ${itemId} ${partKey}`;
}

/** The students, questions and standing attempts of a set. */
export async function intakeRoster(problemSetId: string, transaction?: Transaction): Promise<IntakeRoster> {
  const options = { type: QueryTypes.SELECT, transaction, replacements: { problemSetId } } as const;
  const students = await database().query<{ email: string; userId: string; sectionId: string | null }>(
    `select u.email, u.id as "userId", m.section_id as "sectionId"
       from problem_sets p
       join memberships m on m.course_id = p.course_id and m.role = 'student' and m.left_at is null
       join users u on u.id = m.user_id
      where p.id = :problemSetId`,
    options,
  );
  const questions = await database().query<{ position: number; itemId: string; content: TemplateContent }>(
    `select i.position, i.id as "itemId", v.content
       from problem_set_items i
       join template_versions v on v.id = i.template_version_id
      where i.problem_set_id = :problemSetId
      order by i.position`,
    options,
  );
  const standing = await database().query<{ userId: string; itemId: string; partKey: string; attempt: number }>(
    `select d.user_id as "userId", d.item_id as "itemId", a.part_key as "partKey", a.attempt
       from answers a
       join draws d on d.id = a.draw_id
       join problem_set_items i on i.id = d.item_id
      where i.problem_set_id = :problemSetId and a.superseded_at is null`,
    options,
  );
  return {
    students: new Map(students.map(({ email, userId, sectionId }) => [email.toLowerCase(), { userId, sectionId }])),
    // Students count questions from 1 in the order of the set, whatever positions it keeps.
    questions: new Map(
      questions.map(({ itemId, content }, index) => [
        index + 1,
        { itemId, parts: content.parts.map((part) => part.key) },
      ]),
    ),
    standing: new Map(
      standing.map(({ userId, itemId, partKey, attempt }) => [partOf(userId, itemId, partKey), attempt]),
    ),
  };
}
