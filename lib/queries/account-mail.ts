import { QueryTypes } from 'sequelize';
import { type LinkPurpose } from '@/lib/auth/link-token';
import { database } from '@/lib/db/connection';

/** What the mail around a link says. `timeZone` is that of a course of the person's, UTC where there is none. */
export type AccountMail = {
  purpose: LinkPurpose;
  name: string;
  email: string;
  expiresAt: Date;
  invitedBy: string | null;
  courseNames: string[];
  timeZone: string;
};

/** What to mail for a link; null where it was used, has run out, or its account is deactivated. */
export async function accountMailOf(linkTokenId: string, now: Date): Promise<AccountMail | null> {
  const [mail] = await database().query<AccountMail>(
    `select l.purpose, u.name, u.email, l.expires_at as "expiresAt", inviter.name as "invitedBy",
            coalesce(joined.names, '{}') as "courseNames", coalesce(joined.zone, 'UTC') as "timeZone"
       from link_tokens l
       join users u on u.id = l.user_id
       left join users inviter on inviter.id = l.created_by
       left join lateral (
         select array_agg(c.code || ', ' || c.title order by c.code) as names, min(c.time_zone) as zone
           from memberships m join courses c on c.id = m.course_id
          where m.user_id = u.id and m.left_at is null) joined on true
      where l.id = :linkTokenId and l.used_at is null and l.expires_at > :now and u.deactivated_at is null`,
    { type: QueryTypes.SELECT, replacements: { linkTokenId, now } },
  );
  return mail ?? null;
}
