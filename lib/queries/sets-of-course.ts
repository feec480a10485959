import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';
import { type Thousandths } from '@/lib/domain/credit';
import { type ProblemSetState } from '@/lib/domain/problem-set-state';

/** A set in the list of its course, with what its staff want to know at a glance. */
export type SetOfCourse = {
  id: string;
  number: number;
  title: string;
  state: ProblemSetState;
  opensAt: Date | null;
  closesAt: Date | null;
  items: number;
  points: Thousandths;
  /** Students who handed in at least one answer. */
  answeredBy: number;
  /** Answers that wait for a person or are held by one. */
  waiting: number;
};

/** The sets of a course, the latest first. */
export async function setsOfCourse(courseId: string): Promise<SetOfCourse[]> {
  return database().query<SetOfCourse>(
    `select p.id, p.number, p.title, p.state, p.opens_at as "opensAt", p.closes_at as "closesAt",
            (select count(*) from problem_set_items i where i.problem_set_id = p.id)::integer as items,
            (select coalesce(sum(i.points), 0) from problem_set_items i where i.problem_set_id = p.id)::integer as points,
            (select count(distinct s.user_id)
               from problem_set_items i
               join draws d on d.item_id = i.id
               join submissions s on s.draw_id = d.id
              where i.problem_set_id = p.id)::integer as "answeredBy",
            (select count(*) from queue_items q
              where q.problem_set_id = p.id and q.state in ('waiting', 'taken', 'escalated'))::integer as waiting
       from problem_sets p
      where p.course_id = :courseId
      order by p.number desc`,
    { type: QueryTypes.SELECT, replacements: { courseId } },
  );
}

/** How many students are in a course now. */
export async function countStudents(courseId: string): Promise<number> {
  const [row] = await database().query<{ students: number }>(
    `select count(*)::integer as students from memberships
      where course_id = :courseId and role = 'student' and left_at is null`,
    { type: QueryTypes.SELECT, replacements: { courseId } },
  );
  return row?.students ?? 0;
}
