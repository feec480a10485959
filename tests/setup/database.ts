import { afterAll } from 'vitest';
import { createTestDatabase, dropTestDatabase } from './test-database';

/** Every test file has a migrated database of its own, named by `DATABASE_URL` before any of its modules is loaded. */
const url = await createTestDatabase();
process.env.DATABASE_URL = url;
process.env.NEXTAUTH_SECRET ??= 'a secret for tests only, of enough length';

const { closeDatabase, database } = await import('@/lib/db/connection');
database();

afterAll(async () => {
  await closeDatabase();
  await dropTestDatabase(url);
});
