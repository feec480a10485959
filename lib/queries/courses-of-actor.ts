import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';
import { type PersonActor } from '@/lib/domain/actor';
import { type CourseRole } from '@/lib/domain/roles';

/** A course that somebody is in, with what a list of courses tells of it. */
export type CourseOfActor = {
  id: string;
  code: string;
  title: string;
  term: string;
  department: string;
  role: CourseRole;
  students: number;
  openSets: number;
};

/** The courses a person is in, the latest first. */
export async function coursesOfActor(actor: PersonActor): Promise<CourseOfActor[]> {
  return database().query<CourseOfActor>(
    `select c.id, c.code, c.title, c.term, d.name as department, own.role,
            (select count(*) from memberships m
              where m.course_id = c.id and m.role = 'student' and m.left_at is null)::integer as students,
            (select count(*) from problem_sets p where p.course_id = c.id and p.state = 'open')::integer as "openSets"
       from memberships own
       join courses c on c.id = own.course_id
       join departments d on d.id = c.department_id
      where own.user_id = :userId and own.left_at is null
      order by c.created_at desc, c.code`,
    { type: QueryTypes.SELECT, replacements: { userId: actor.userId } },
  );
}
