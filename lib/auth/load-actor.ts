import { QueryTypes, type Transaction } from 'sequelize';
import { type ActorMembership, type PersonActor } from '@/lib/domain/actor';
import { database } from '@/lib/db/connection';

type MembershipRow = ActorMembership & { courseId: string };
type Row = { id: string; name: string; is_administrator: boolean; memberships: MembershipRow[] };

/**
 * A person with the roles they hold at this moment: read anew for every request, so that a change of role, of section or
 * of account takes effect at once. Null for nobody, or for an account that was deactivated.
 */
export async function loadActor(userId: string, transaction?: Transaction): Promise<PersonActor | null> {
  const rows = await database().query<Row>(
    `select u.id, u.name, u.is_administrator,
            coalesce((
              select json_agg(json_build_object(
                'courseId', m.course_id, 'membershipId', m.id, 'role', m.role,
                'sectionIds', case
                  when m.role = 'student' then case when m.section_id is null then '[]' else json_build_array(m.section_id) end
                  else coalesce((select json_agg(g.section_id) from section_graders g where g.membership_id = m.id), '[]')
                end))
              from memberships m where m.user_id = u.id and m.left_at is null), '[]') as memberships
       from users u
      where u.id = :userId and u.deactivated_at is null`,
    { type: QueryTypes.SELECT, replacements: { userId }, transaction },
  );
  const row = rows[0];
  if (row === undefined) return null;
  return {
    kind: 'user',
    userId: row.id,
    name: row.name,
    isAdministrator: row.is_administrator,
    memberships: new Map(row.memberships.map(({ courseId, ...membership }) => [courseId, membership])),
  };
}
