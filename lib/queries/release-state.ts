import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';

/** Where one student of a set stands before release. */
export type ReleaseRow = {
  userId: string;
  name: string;
  sectionId: string | null;
  sectionName: string | null;
  /** Parts that the checker or a person has yet to decide. */
  partsWaiting: number;
  /** The end of an extension that is still running; such a student is held back. */
  extendedUntil: Date | null;
  releasedAt: Date | null;
};

/** Every present student of a set's course, by name. */
export async function releaseState(problemSetId: string, now: Date, transaction?: Transaction): Promise<ReleaseRow[]> {
  return database().query<ReleaseRow>(
    `with waiting as (
       select d.user_id, count(*)::int as parts
         from answers a
         join draws d on d.id = a.draw_id
         join problem_set_items i on i.id = d.item_id
        where i.problem_set_id = :problemSetId and a.superseded_at is null
          and (a.check_state <> 'checked' or a.current_credit_entry_id is null or exists (
                 select from queue_items q
                  where q.answer_id = a.id and q.kind = 'review'
                    and q.state in ('waiting', 'taken', 'escalated', 'to-settle')))
        group by d.user_id)
     select u.id as "userId", u.name, m.section_id as "sectionId", s.name as "sectionName",
            coalesce(w.parts, 0) as "partsWaiting", x.until as "extendedUntil", r.released_at as "releasedAt"
       from problem_sets p
       join memberships m on m.course_id = p.course_id and m.role = 'student' and m.left_at is null
       join users u on u.id = m.user_id
       left join sections s on s.id = m.section_id
       left join waiting w on w.user_id = u.id
       left join set_releases r on r.problem_set_id = p.id and r.user_id = u.id
       left join lateral (
         select max(e.closes_at) as until
           from extensions e
          where e.problem_set_id = p.id and (e.user_id = u.id or e.section_id = m.section_id)
            and e.closes_at > :now::timestamptz) x on true
      where p.id = :problemSetId
      order by u.name, u.id`,
    { type: QueryTypes.SELECT, transaction, replacements: { problemSetId, now: now.toISOString() } },
  );
}
