import { execFile } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, renameSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { promisify } from 'node:util';
import { seedFingerprint } from '@/scripts/ground/serve-for-test.mjs';
import { copyDatabase, createTestDatabase, dropTestDatabase, onServer } from './test-database';

/** One process at a time makes the seeded template; any number, the same in all. */
const SEED_LOCK = 4_207_344;

/**
 * A database with the demo in it that nobody else uses, as a copy of one that is seeded once for these sources.
 *
 * @returns its address, and the folder of uploaded files that the demo refers to (to be copied, not written to)
 */
export async function createSeededDatabase(): Promise<{ url: string; uploads: string }> {
  return onServer(async (server) => {
    await server.query('select pg_advisory_lock($1)', [SEED_LOCK]);
    const { rows } = await server.query<{ id: string }>(
      'select system_identifier::text as id from pg_control_system()',
    );
    const key = `${seedFingerprint()}_${(rows[0]?.id ?? '').slice(-8)}`;
    const template = `halfmark_test_seeded_${key}`;
    const uploads = path.join(process.env.HALFMARK_TEST_FOLDER ?? os.tmpdir(), `halfmark-seeded-${key}`);
    const found = await server.query('select from pg_database where datname = $1', [template]);
    if (found.rowCount === 0 || !existsSync(uploads)) {
      await server.query(`drop database if exists ${template}`);
      const seeded = await seedTemplate(uploads);
      await server.query(`alter database ${new URL(seeded).pathname.slice(1)} rename to ${template}`);
    }
    return { url: await copyDatabase(template), uploads };
  });
}

/** Seeds a new database; gives its address. */
async function seedTemplate(uploads: string): Promise<string> {
  const making = `${uploads}-${randomBytes(4).toString('hex')}`;
  mkdirSync(making, { recursive: true, mode: 0o700 });
  const url = await createTestDatabase();
  try {
    await promisify(execFile)(process.execPath, ['--import', 'tsx', 'scripts/seed.ts'], {
      env: {
        ...process.env,
        NODE_ENV: 'production',
        DATABASE_URL: url,
        APP_URL: 'http://127.0.0.1:3420',
        NEXTAUTH_SECRET: randomBytes(32).toString('hex'),
        UPLOADS_DIR: making,
      },
      maxBuffer: 10_000_000,
    });
    rmSync(uploads, { recursive: true, force: true });
    renameSync(making, uploads);
    return url;
  } catch (error) {
    rmSync(making, { recursive: true, force: true });
    await dropTestDatabase(url);
    throw error;
  }
}
