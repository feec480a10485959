import { existsSync } from 'node:fs';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { type Sequelize } from 'sequelize';
import { z } from 'zod';
import { closeDatabase, database } from '@/lib/db/connection';
import { isLoopbackHost } from '@/lib/loopback';

/*
 * Puts the invented demo into the database that DATABASE_URL names, where that database is empty. It is called by
 * `npm start` for the project's own database and by the tests for theirs, and refuses any database that other machines
 * could reach: the demo's passwords are public.
 */

const seeder = z.object({
  seedDemo: z.custom<(database: Sequelize) => Promise<unknown>>((value) => typeof value === 'function'),
});

async function main(): Promise<void> {
  const url = process.env.DATABASE_URL;
  if (!url || !isLoopbackHost(new URL(url).hostname) || !isLoopbackHost(new URL(process.env.APP_URL ?? '').hostname)) {
    throw new Error('The demo is put into a database and served at an address of this machine only.');
  }
  const [row] = (await database().query('select exists (select from courses) as "hasCourses"'))[0] as {
    hasCourses: boolean;
  }[];
  if (row?.hasCourses !== false) {
    console.log('The database has courses already; nothing was added.');
    return;
  }
  const file = path.join(import.meta.dirname, '..', 'seeders', 'demo.ts');
  if (!existsSync(file)) {
    console.log('There is no demo to add.');
    return;
  }
  const { seedDemo } = seeder.parse(await import(pathToFileURL(file).href));
  await seedDemo(database());
}

main()
  .finally(closeDatabase)
  .catch((error: unknown) => {
    console.error(error instanceof Error ? (error.stack ?? error.message) : error);
    process.exitCode = 1;
  });
