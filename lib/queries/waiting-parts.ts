import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';

/** How many answers to one part of a set wait, for the checker and for a person. */
export type WaitingPart = { position: number; partKey: string; forChecker: number; forPerson: number };

/** The parts of a set to which answers wait, in order; what release would have to report as still being marked. */
export async function waitingParts(problemSetId: string): Promise<WaitingPart[]> {
  return database().query<WaitingPart>(
    `select i.position, a.part_key as "partKey",
            count(*) filter (where a.check_state <> 'checked')::integer as "forChecker",
            count(*) filter (where a.check_state = 'checked')::integer as "forPerson"
       from answers a
       join draws d on d.id = a.draw_id
       join memberships m on m.user_id = d.user_id and m.role = 'student' and m.left_at is null
       join problem_set_items i on i.id = d.item_id
       join problem_sets p on p.id = i.problem_set_id and p.course_id = m.course_id
      where i.problem_set_id = :problemSetId and a.superseded_at is null
        and (a.check_state <> 'checked' or a.current_credit_entry_id is null or exists (
               select from queue_items q
                where q.answer_id = a.id and q.kind = 'review'
                  and q.state in ('waiting', 'taken', 'escalated', 'to-settle')))
      group by i.position, a.part_key
      order by i.position, a.part_key`,
    { type: QueryTypes.SELECT, replacements: { problemSetId } },
  );
}
