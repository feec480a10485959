import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';

/** The latest closing time that an extension gives a student for a set, their own or their section's; null for none. */
export async function extendedUntil(
  problemSetId: string,
  userId: string,
  transaction?: Transaction,
): Promise<Date | null> {
  const rows = await database().query<{ until: Date | null }>(
    `select max(e.closes_at) as until
       from extensions e
       join problem_sets s on s.id = e.problem_set_id
      where e.problem_set_id = :problemSetId
        and (e.user_id = :userId
             or e.section_id = (select m.section_id from memberships m
                                 where m.course_id = s.course_id and m.user_id = :userId and m.left_at is null))`,
    { type: QueryTypes.SELECT, replacements: { problemSetId, userId }, transaction },
  );
  return rows[0]?.until ?? null;
}
