import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';
import type { FlagReason } from '@/lib/domain/flag-reasons';
import type { Verdict } from '@/lib/domain/verdict';

/** An answer of a set that waits for a person. */
export type QueueRow = {
  id: string;
  kind: 'review' | 'appeal';
  state: 'waiting' | 'taken' | 'escalated';
  reasons: FlagReason[];
  position: number;
  partKey: string;
  verdict: Verdict | null;
  slip: string | null;
  studentId: string;
  studentName: string;
  section: string | null;
  since: Date;
  heldBy: string | null;
  heldUntil: Date | null;
  holderName: string | null;
  /** Waiting answers of the same part with the same kin key, this one among them; 1 where it has none. */
  kin: number;
};

/**
 * The answers of a set that wait for a person and that this grader may mark: of the sections given (null for all), never
 * one's own, none with a conflict of interest. A hold that ran out counts as waiting. Appeals first, then by age.
 */
export async function queueOfSet(
  {
    problemSetId,
    courseId,
    graderId,
    sections,
    now,
  }: { problemSetId: string; courseId: string; graderId: string; sections: readonly string[] | null; now: Date },
  transaction?: Transaction,
): Promise<QueueRow[]> {
  return database().query<QueueRow>(
    `select q.id, q.kind, q.reasons, i.position, q.part_key as "partKey", c.verdict, c.slip,
            case when q.state = 'taken' and q.held_until <= :now::timestamptz then 'waiting' else q.state end as state,
            case when q.held_until > :now::timestamptz then q.held_by end as "heldBy",
            case when q.held_until > :now::timestamptz then q.held_until end as "heldUntil",
            case when q.held_until > :now::timestamptz then h.name end as "holderName",
            d.user_id as "studentId", u.name as "studentName", s.name as section, q.created_at as since,
            case when q.kin_key is null then 1
                 else (count(*) over (partition by q.item_id, q.part_key, q.kin_key))::int end as kin
       from queue_items q
       join problem_set_items i on i.id = q.item_id
       join answers a on a.id = q.answer_id
       join draws d on d.id = a.draw_id
       join users u on u.id = d.user_id
       left join answer_checks c on c.id = a.current_check_id
       left join memberships m on m.course_id = :courseId and m.user_id = d.user_id
       left join sections s on s.id = m.section_id
       left join users h on h.id = q.held_by
      where q.problem_set_id = :problemSetId
        and q.state in ('waiting', 'taken', 'escalated')
        and d.user_id <> :graderId
        and not exists (
          select from conflicts_of_interest k
           where k.course_id = :courseId and k.grader_id = :graderId and k.student_id = d.user_id)
        and (:bound = 'no' or m.section_id = any (array[:sections]::uuid[]))
      order by (q.kind = 'appeal') desc, q.created_at, q.id`,
    {
      type: QueryTypes.SELECT,
      transaction,
      replacements: {
        problemSetId,
        courseId,
        graderId,
        now: now.toISOString(),
        bound: sections === null ? 'no' : 'yes',
        sections: sections && sections.length > 0 ? [...sections] : ['00000000-0000-0000-0000-000000000000'],
      },
    },
  );
}

/** A mark that changes whenever the queue of a set does, for pages that look whether they are out of date. */
export async function queueStamp(problemSetId: string): Promise<string> {
  const [row] = await database().query<{ stamp: string }>(
    `select concat_ws(' ', count(*), max(q.updated_at),
              (select count(*) from second_markings m where m.problem_set_id = :problemSetId and m.state = 'to-settle'))
              as stamp
       from queue_items q
      where q.problem_set_id = :problemSetId and q.state in ('waiting', 'taken', 'escalated')`,
    { type: QueryTypes.SELECT, replacements: { problemSetId } },
  );
  return row?.stamp ?? '';
}

/** A second marking as a list shows it; nothing of either mark. */
export type SecondMarkingRow = { id: string; position: number; partKey: string; studentId: string; since: Date };

const secondMarkings = (which: string) => `
  select m.id, i.position, a.part_key as "partKey", d.user_id as "studentId", m.created_at as since
    from second_markings m
    join answers a on a.id = m.answer_id
    join draws d on d.id = a.draw_id
    join problem_set_items i on i.id = d.item_id
   where m.problem_set_id = :problemSetId and ${which}
   order by m.created_at, m.id`;

/** The second markings of a set that are assigned to a grader and not done. */
export async function ownSecondMarkings(problemSetId: string, graderId: string): Promise<SecondMarkingRow[]> {
  return database().query<SecondMarkingRow>(
    secondMarkings(`m.grader_id = :graderId and m.state in ('assigned', 'taken')`),
    {
      type: QueryTypes.SELECT,
      replacements: { problemSetId, graderId },
    },
  );
}

/** The second markings of a set that differ beyond its tolerance and wait to be settled. */
export async function disagreementsOf(problemSetId: string): Promise<SecondMarkingRow[]> {
  return database().query<SecondMarkingRow>(secondMarkings(`m.state = 'to-settle'`), {
    type: QueryTypes.SELECT,
    replacements: { problemSetId },
  });
}

/** The longest assigned second marking of a grader in a set; null where none is left. */
export async function nextSecondMarking(
  problemSetId: string,
  graderId: string,
  transaction?: Transaction,
): Promise<string | null> {
  const [row] = await database().query<{ id: string }>(
    `select m.id from second_markings m
      where m.problem_set_id = :problemSetId and m.grader_id = :graderId and m.state in ('assigned', 'taken')
      order by m.created_at, m.id limit 1`,
    { type: QueryTypes.SELECT, transaction, replacements: { problemSetId, graderId } },
  );
  return row?.id ?? null;
}
