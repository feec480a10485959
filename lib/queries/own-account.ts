import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';
import { type CourseRole } from '@/lib/domain/roles';

/** What a person sees of their own account. Times outside any course are told in `timeZone`, that of a course of theirs. */
export type OwnAccount = {
  name: string;
  email: string;
  passwordChangedAt: Date | null;
  timeZone: string;
  courses: { id: string; code: string; title: string; term: string; role: CourseRole }[];
};

/** One's own account and the courses one is in, the latest first. */
export async function ownAccount(userId: string): Promise<OwnAccount> {
  const [account] = await database().query<OwnAccount>(
    `select u.name, u.email, u.password_changed_at as "passwordChangedAt",
            coalesce(joined.courses, '[]') as courses, coalesce(joined.zone, 'UTC') as "timeZone"
       from users u
       left join lateral (
         select json_agg(json_build_object('id', c.id, 'code', c.code, 'title', c.title, 'term', c.term, 'role', m.role)
                         order by c.created_at desc, c.code) as courses,
                (array_agg(c.time_zone order by c.created_at desc))[1] as zone
           from memberships m join courses c on c.id = m.course_id
          where m.user_id = u.id and m.left_at is null) joined on true
      where u.id = :userId`,
    { type: QueryTypes.SELECT, replacements: { userId } },
  );
  if (account === undefined) throw new Error('A signed-in person has an account.');
  return account;
}
