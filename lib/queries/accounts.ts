import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';
import { type CourseRole } from '@/lib/domain/roles';
import { HalfmarkError } from '@/lib/errors';

/** An account as the list of all accounts shows it. */
export type AccountInList = {
  id: string;
  name: string;
  email: string;
  isAdministrator: boolean;
  hasPassword: boolean;
  isDeactivated: boolean;
  courses: { code: string; role: CourseRole }[];
};

export const accountsPerPage = 50;

const columns = `
  u.id, u.name, u.email, u.is_administrator as "isAdministrator", u.password_hash is not null as "hasPassword",
  u.deactivated_at is not null as "isDeactivated",
  coalesce((select json_agg(json_build_object('code', c.code, 'role', m.role) order by c.code)
              from memberships m join courses c on c.id = m.course_id
             where m.user_id = u.id and m.left_at is null), '[]') as courses`;

/**
 * One account that is not erased.
 *
 * @throws HalfmarkError `not-found`
 */
export async function accountById(userId: string): Promise<AccountInList> {
  const [account] = await database().query<AccountInList>(
    `select ${columns} from users u where u.id = :userId and u.erased_at is null`,
    { type: QueryTypes.SELECT, replacements: { userId } },
  );
  if (account === undefined) throw new HalfmarkError('not-found');
  return account;
}

/** The accounts whose name or e-mail contains a text, by name, one page of them, and how many there are in all. */
export async function accounts(input: {
  search: string;
  page: number;
}): Promise<{ rows: AccountInList[]; total: number }> {
  const rows = await database().query<AccountInList & { total: number }>(
    `select ${columns}, count(*) over ()::integer as total
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
