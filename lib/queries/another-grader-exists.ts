import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';

/**
 * Whether a course has a grader beside those excepted who may mark the student: present staff, no declared conflict of
 * interest, the student's section where the course keeps TAs to their own.
 */
export async function anotherGraderExists(
  { courseId, studentId, except }: { courseId: string; studentId: string; except: readonly string[] },
  transaction?: Transaction,
): Promise<boolean> {
  return (await gradersFor({ courseId, studentId, except }, transaction)).length > 0;
}

/** The graders of a course who may mark the student, by user id, with their role. */
export async function gradersFor(
  { courseId, studentId, except }: { courseId: string; studentId: string; except: readonly string[] },
  transaction?: Transaction,
): Promise<{ userId: string; role: string }[]> {
  return database().query<{ userId: string; role: string }>(
    `select m.user_id as "userId", m.role
       from memberships m
       join courses c on c.id = m.course_id
       join users u on u.id = m.user_id and u.deactivated_at is null
      where m.course_id = :courseId
        and m.left_at is null
        and m.role in ('ta', 'head-ta', 'instructor')
        and m.user_id <> :studentId
        and not (m.user_id = any (array[:except]::uuid[]))
        and not exists (
          select from conflicts_of_interest k
           where k.course_id = m.course_id and k.grader_id = m.user_id and k.student_id = :studentId)
        and (m.role <> 'ta' or not c.tas_see_own_sections_only or exists (
          select from section_graders g
            join memberships s on s.section_id = g.section_id and s.course_id = m.course_id
           where g.membership_id = m.id and s.user_id = :studentId))
      order by m.user_id`,
    { type: QueryTypes.SELECT, transaction, replacements: { courseId, studentId, except: atLeastOne(except) } },
  );
}

/** An empty list cannot be written as an array's elements; the nil uuid is nobody. */
function atLeastOne(ids: readonly string[]): string[] {
  return ids.length > 0 ? [...ids] : ['00000000-0000-0000-0000-000000000000'];
}
