import { QueryTypes, type Sequelize } from 'sequelize';
import { migrationNames } from './migration-files';

/** What has been done to a database, and what is still to do; `unknown` was done by a newer Halfmark. */
export type MigrationStatus = { applied: string[]; pending: string[]; unknown: string[] };

/** Reads which migrations a database has had. A database that has had none yet is all pending. */
export async function readMigrationStatus(sequelize: Sequelize): Promise<MigrationStatus> {
  const names = await migrationNames();
  const done = await appliedMigrations(sequelize);
  const known = new Set(names);
  return {
    applied: names.filter((name) => done.has(name)),
    pending: names.filter((name) => !done.has(name)),
    unknown: [...done].filter((name) => !known.has(name)),
  };
}

async function appliedMigrations(sequelize: Sequelize): Promise<Set<string>> {
  const [table] = await sequelize.query<{ found: boolean }>(
    `select to_regclass('public.schema_migrations') is not null as found`,
    { type: QueryTypes.SELECT },
  );
  if (!table?.found) return new Set();
  const rows = await sequelize.query<{ name: string }>('select name from schema_migrations order by name', {
    type: QueryTypes.SELECT,
  });
  return new Set(rows.map((row) => row.name));
}
