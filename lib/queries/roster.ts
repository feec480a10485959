import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';
import { type CourseRole } from '@/lib/domain/roles';

/** One person of a course. `sections` are those a student is in or a TA grades. */
export type RosterPerson = {
  membershipId: string;
  userId: string;
  name: string;
  email: string;
  role: CourseRole;
  sections: { id: string; name: string }[];
  /** Whether they have set a password; until then their invitation is open. */
  hasPassword: boolean;
  isDeactivated: boolean;
};

/**
 * Who is in a course now, by role from instructor to student, then by name. With `sectionIds` only the students of these
 * sections, and all of the staff.
 */
export async function roster(courseId: string, sectionIds: readonly string[] | null): Promise<RosterPerson[]> {
  return database().query<RosterPerson>(
    `select m.id as "membershipId", u.id as "userId", u.name, u.email, m.role,
            u.password_hash is not null as "hasPassword", u.deactivated_at is not null as "isDeactivated",
            coalesce((
              select json_agg(json_build_object('id', s.id, 'name', s.name) order by s.name)
                from sections s
               where s.id = m.section_id
                  or s.id in (select g.section_id from section_graders g where g.membership_id = m.id)), '[]') as sections
       from memberships m join users u on u.id = m.user_id
      where m.course_id = :courseId and m.left_at is null
        and (:everyone or m.role <> 'student' or m.section_id::text = any(array[:sectionIds]::text[]))
      order by array_position(array['instructor', 'head-ta', 'ta', 'student'], m.role), u.name, u.id`,
    {
      type: QueryTypes.SELECT,
      replacements: { courseId, everyone: sectionIds === null, sectionIds: ['', ...(sectionIds ?? [])] },
    },
  );
}

/** A section with how many students it has. */
export type SectionOfCourse = { id: string; name: string; students: number };

/** The sections of a course by name. */
export async function sectionsOf(courseId: string): Promise<SectionOfCourse[]> {
  return database().query<SectionOfCourse>(
    `select s.id, s.name,
            (select count(*) from memberships m where m.section_id = s.id and m.left_at is null)::integer as students
       from sections s where s.course_id = :courseId order by s.name`,
    { type: QueryTypes.SELECT, replacements: { courseId } },
  );
}
