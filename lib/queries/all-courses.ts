import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';

/** A course as the list of all courses shows it. */
export type CourseInList = {
  id: string;
  code: string;
  title: string;
  term: string;
  department: string;
  instructors: string[];
  students: number;
};

/** Every course, the latest first. */
export async function allCourses(): Promise<CourseInList[]> {
  return database().query<CourseInList>(
    `select c.id, c.code, c.title, c.term, d.name as department,
            coalesce((select array_agg(u.name order by u.name) from memberships m join users u on u.id = m.user_id
                       where m.course_id = c.id and m.role = 'instructor' and m.left_at is null), '{}') as instructors,
            (select count(*) from memberships m
              where m.course_id = c.id and m.role = 'student' and m.left_at is null)::integer as students
       from courses c join departments d on d.id = c.department_id
      order by c.created_at desc, c.code`,
    { type: QueryTypes.SELECT },
  );
}

/** The names of the departments there are, for a form to offer. */
export async function departmentNames(): Promise<string[]> {
  const rows = await database().query<{ name: string }>('select name from departments order by name', {
    type: QueryTypes.SELECT,
  });
  return rows.map((row) => row.name);
}
