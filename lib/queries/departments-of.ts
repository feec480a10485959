import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';
import { type PersonActor } from '@/lib/domain/actor';

/** A department with the courses it gives, as the shelf and its policies need it. */
export type DepartmentView = { id: string; name: string; courseIds: string[] };

type Row = { id: string; name: string; course_ids: string[] };

/** The department with that id; null for none. */
export async function departmentForPolicy(id: string, transaction?: Transaction): Promise<DepartmentView | null> {
  const [department] = await read('where d.id = :id', { id }, transaction);
  return department ?? null;
}

/** The departments whose courses a person belongs to, by name; every department for an administrator. */
export async function departmentsOf(actor: PersonActor, transaction?: Transaction): Promise<DepartmentView[]> {
  if (actor.isAdministrator) return read('', {}, transaction);
  const courseIds = [...actor.memberships.keys()];
  if (courseIds.length === 0) return [];
  return read(
    'where exists (select from courses c where c.department_id = d.id and c.id in (:courseIds))',
    { courseIds },
    transaction,
  );
}

async function read(
  where: string,
  replacements: Record<string, unknown>,
  transaction?: Transaction,
): Promise<DepartmentView[]> {
  const rows = await database().query<Row>(
    `select d.id, d.name, array(select c.id from courses c where c.department_id = d.id) as course_ids
       from departments d ${where} order by d.name`,
    { type: QueryTypes.SELECT, replacements, transaction },
  );
  return rows.map((row) => ({ id: row.id, name: row.name, courseIds: row.course_ids }));
}
