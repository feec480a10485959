import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { Logger, runMigrations } from 'graphile-worker';
import pg from 'pg';
import { type Sequelize } from 'sequelize';
import { Umzug } from 'umzug';
import { openDatabase } from './connection';
import { migrationNames, migrationsFolder } from './migration-files';
import { type MigrationSteps } from './migration-step';
import { readMigrationStatus, type MigrationStatus } from './migration-status';

/** Any number, the same in every process: two that migrate one database at once wait for each other on it. */
const MIGRATION_LOCK = 4_207_342;
const silent = new Logger(() => () => undefined);

/** Brings a database up to date, and the job queue's own tables with it. Returns the names of what was applied. */
export async function migrateUp(url: string): Promise<string[]> {
  return withMigrator(url, async (umzug) => {
    const applied = await umzug.up();
    await runMigrations({ connectionString: url, logger: silent });
    return applied.map((migration) => migration.name);
  });
}

/** Takes back the last `steps` migrations, newest first; `'all'` empties the schema. Returns the names taken back. */
export async function migrateDown(url: string, steps: number | 'all' = 1): Promise<string[]> {
  return withMigrator(url, async (umzug) => {
    const reverted = await umzug.down(steps === 'all' ? { to: 0 } : { step: steps });
    return reverted.map((migration) => migration.name);
  });
}

/** What has been done to a database and what is still to do. */
export async function migrationStatus(url: string): Promise<MigrationStatus> {
  const sequelize = openDatabase(url, { poolSize: 1, guarded: true });
  try {
    return await readMigrationStatus(sequelize);
  } finally {
    await sequelize.close();
  }
}

async function withMigrator<Result>(url: string, use: (umzug: Umzug<Sequelize>) => Promise<Result>): Promise<Result> {
  const lock = new pg.Client({ connectionString: url, application_name: 'halfmark migrate' });
  await lock.connect();
  const sequelize = openDatabase(url, { poolSize: 2, guarded: false });
  try {
    await lock.query('select pg_advisory_lock($1)', [MIGRATION_LOCK]);
    await sequelize.query(
      'create table if not exists schema_migrations (name text primary key, applied_at timestamptz not null default now())',
    );
    return await use(
      new Umzug({ migrations: await loadMigrations(sequelize), context: sequelize, storage, logger: undefined }),
    );
  } finally {
    await sequelize.close();
    await lock.end();
  }
}

/** Each direction runs in a transaction, and so does the note that it was done: a crash leaves both or neither. */
async function loadMigrations(sequelize: Sequelize) {
  const folder = migrationsFolder();
  const names = await migrationNames(folder);
  return Promise.all(
    names.map(async (name) => {
      const file = pathToFileURL(path.join(folder, name)).href;
      const steps = (await import(/* @vite-ignore */ /* webpackIgnore: true */ file)) as MigrationSteps;
      return {
        name,
        up: () => runStep(sequelize, steps.up, 'insert into schema_migrations (name) values (:name)', name),
        down: () => runStep(sequelize, steps.down, 'delete from schema_migrations where name = :name', name),
      };
    }),
  );
}

async function runStep(sequelize: Sequelize, step: MigrationSteps['up'], note: string, name: string): Promise<void> {
  await sequelize.transaction(async (transaction) => {
    await step(async (statement) => {
      await sequelize.query(statement, { transaction, raw: true });
    });
    await sequelize.query(note, { transaction, replacements: { name } });
  });
}

const storage = {
  /** Noted by `runStep`, in the migration's own transaction. */
  logMigration: () => Promise.resolve(),
  unlogMigration: () => Promise.resolve(),
  executed: async ({ context }: { context: Sequelize }) => (await readMigrationStatus(context)).applied,
};
