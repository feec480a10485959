import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';
import { type ProblemSetState } from '@/lib/domain/problem-set-state';

/** A set as its student finds it in the list of their work. */
export type OwnSetRow = {
  setId: string;
  number: number;
  title: string;
  state: ProblemSetState;
  opensAt: Date | null;
  closesAt: Date | null;
  /** The latest closing time by extension; null for none. */
  extendedUntil: Date | null;
  /** When this student's scores came out; null while they have not. */
  releasedAt: Date | null;
  courseId: string;
  courseCode: string;
  courseTitle: string;
  courseNotice: string;
  timeZone: string;
  parts: number;
  partsHandedIn: number;
};

/** The sets that have begun in every course where a person is a student now, the latest to close first. */
export async function ownSets(userId: string, now: Date, transaction?: Transaction): Promise<OwnSetRow[]> {
  return database().query<OwnSetRow>(
    `select s.id as "setId", s.number, s.title, s.state, s.opens_at as "opensAt", s.closes_at as "closesAt",
            (select max(e.closes_at) from extensions e
              where e.problem_set_id = s.id and (e.user_id = m.user_id or e.section_id = m.section_id)) as "extendedUntil",
            (select r.released_at from set_releases r
              where r.problem_set_id = s.id and r.user_id = m.user_id) as "releasedAt",
            c.id as "courseId", c.code as "courseCode", c.title as "courseTitle",
            c.notice as "courseNotice", c.time_zone as "timeZone",
            (select coalesce(sum(jsonb_array_length(v.content -> 'parts')), 0)
               from problem_set_items i
               left join draws d on d.item_id = i.id and d.user_id = m.user_id
               join template_versions v on v.id = coalesce(d.template_version_id, i.template_version_id)
              where i.problem_set_id = s.id)::integer as parts,
            (select count(*)
               from problem_set_items i
               join draws d on d.item_id = i.id and d.user_id = m.user_id
               join answers a on a.draw_id = d.id and a.superseded_at is null
              where i.problem_set_id = s.id)::integer as "partsHandedIn"
       from memberships m
       join courses c on c.id = m.course_id
       join problem_sets s on s.course_id = c.id
      where m.user_id = :userId and m.role = 'student' and m.left_at is null
        and s.state <> 'draft' and (s.opens_at is null or s.opens_at <= :now)
      order by s.closes_at desc nulls first, c.code, s.number`,
    { type: QueryTypes.SELECT, replacements: { userId, now }, transaction },
  );
}
