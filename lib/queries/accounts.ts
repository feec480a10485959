import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';

/** An account as the list of all accounts shows it. */
export type AccountInList = {
  id: string;
  name: string;
  email: string;
  isAdministrator: boolean;
  hasPassword: boolean;
  isDeactivated: boolean;
  courses: string[];
};

export const accountsPerPage = 50;

/** The accounts whose name or e-mail contains a text, by name, one page of them, and how many there are in all. */
export async function accounts(input: {
  search: string;
  page: number;
}): Promise<{ rows: AccountInList[]; total: number }> {
  const rows = await database().query<AccountInList & { total: number }>(
    `select u.id, u.name, u.email, u.is_administrator as "isAdministrator", u.password_hash is not null as "hasPassword",
            u.deactivated_at is not null as "isDeactivated", count(*) over ()::integer as total,
            coalesce((select array_agg(c.code || ' (' || m.role || ')' order by c.code)
                        from memberships m join courses c on c.id = m.course_id
                       where m.user_id = u.id and m.left_at is null), '{}') as courses
       from users u
      where u.erased_at is null and (strpos(lower(u.name), :search) > 0 or strpos(u.email, :search) > 0)
      order by u.name, u.id
      limit :limit offset :offset`,
    {
      type: QueryTypes.SELECT,
      replacements: {
        search: input.search.trim().toLowerCase(),
        limit: accountsPerPage,
        offset: (input.page - 1) * accountsPerPage,
      },
    },
  );
  return { rows: rows.map(({ total: _total, ...row }) => row), total: rows[0]?.total ?? 0 };
}
