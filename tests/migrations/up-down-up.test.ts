import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openDatabase } from '@/lib/db/connection';
import { migrateDown, migrateUp, migrationStatus } from '@/lib/db/migrate';
import { migrationNames } from '@/lib/db/migration-files';
import { createEmptyDatabase, dropTestDatabase } from '../setup/test-database';
import { describeSchema } from './catalog';

let url: string;

beforeAll(async () => {
  url = await createEmptyDatabase();
});

afterAll(() => dropTestDatabase(url));

async function schema(): Promise<string[]> {
  const sequelize = openDatabase(url, { poolSize: 1, guarded: true });
  try {
    return await describeSchema(sequelize);
  } finally {
    await sequelize.close();
  }
}

describe('migrations', () => {
  it('go up, all the way down leaving nothing, and up to the same schema', async () => {
    const names = await migrationNames();
    expect(await migrateUp(url)).toEqual(names);
    const before = await schema();
    expect(before.length).toBeGreaterThan(300);

    expect(await migrateDown(url, 'all')).toEqual([...names].reverse());
    expect(await schema()).toEqual([]);

    expect(await migrateUp(url)).toEqual(names);
    expect(await schema()).toEqual(before);
  });

  it('each take back exactly what they made', async () => {
    await migrateDown(url, 'all');
    const names = await migrationNames();
    await migrateUp(url);
    const after: string[][] = [];
    for (const name of [...names].reverse()) {
      after.unshift(await schema());
      expect(await migrateDown(url)).toEqual([name]);
    }
    expect(await schema()).toEqual([]);
    expect(new Set(after.map((lines) => lines.join('\n'))).size).toBe(names.length);
    await migrateUp(url);
    expect(await schema()).toEqual(after.at(-1));
  });

  it('do nothing the second time, and say so', async () => {
    await migrateUp(url);
    expect(await migrateUp(url)).toEqual([]);
    expect(await migrationStatus(url)).toEqual({ applied: await migrationNames(), pending: [], unknown: [] });
  });

  it('started twice at once are each applied once', async () => {
    await migrateDown(url, 'all');
    const results = await Promise.all([migrateUp(url), migrateUp(url)]);
    expect(results.flat().sort()).toEqual(await migrationNames());
  });

  it('report what is pending on a database that has had none', async () => {
    const empty = await createEmptyDatabase();
    try {
      expect(await migrationStatus(empty)).toEqual({ applied: [], pending: await migrationNames(), unknown: [] });
    } finally {
      await dropTestDatabase(empty);
    }
  });
});
