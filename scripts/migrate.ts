import { migrateUp, migrationStatus } from '@/lib/db/migrate';

/*
 * Brings the database that DATABASE_URL names up to date. `--check` changes nothing and ends with exit code 3 where
 * something is to be done. `npm run migrate` (scripts/migrate.mjs) provides DATABASE_URL where the person did not.
 */

const somethingToDo = 3;

async function main(): Promise<number> {
  const url = process.env.DATABASE_URL;
  if (!url) {
    console.error('halfmark: DATABASE_URL is not set. Run: npm run migrate');
    return 1;
  }
  if (process.argv.includes('--check')) {
    const { pending, unknown } = await migrationStatus(url);
    if (unknown.length > 0) console.log(`The database was made by a newer Halfmark: it has had ${unknown.join(', ')}.`);
    else if (pending.length > 0) console.log(`The database waits for ${pending.length} migrations.`);
    return unknown.length > 0 || pending.length > 0 ? somethingToDo : 0;
  }
  const applied = await migrateUp(url);
  for (const name of applied) console.log(`applied ${name}`);
  if (applied.length === 0) console.log('The database was up to date.');
  return 0;
}

main().then(
  (code) => {
    process.exitCode = code;
  },
  (error: unknown) => {
    console.error(error instanceof Error ? error.message : error);
    process.exitCode = 1;
  },
);
