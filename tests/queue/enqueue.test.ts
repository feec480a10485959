import { randomUUID } from 'node:crypto';
import { QueryTypes } from 'sequelize';
import { afterEach, describe, expect, it } from 'vitest';
import { database } from '@/lib/db/connection';
import { inTransaction } from '@/lib/db/transaction';
import { type JobHandlers } from '@/lib/jobs/job-handler';
import { runWorker, type RunningWorker } from '@/lib/jobs/run-worker';
import { enqueue } from '@/lib/queue/enqueue';
import { countJobs, listFailedJobs, retryFailedJob } from '@/lib/queue/failed-jobs';
import { until } from './worker-process';

let worker: RunningWorker | null = null;

afterEach(async () => {
  await worker?.stop();
  worker = null;
  await database().query('delete from graphile_worker._private_jobs');
});

async function work(handlers: JobHandlers, recurring: { name: string; at: string }[] = []): Promise<void> {
  worker = await runWorker({ databaseUrl: process.env.DATABASE_URL ?? '', handlers, recurring, concurrency: 2 });
}

const add = (
  intakeId: string,
  options: { maxAttempts?: number; runAt?: Date; jobKey?: string; priority?: number } = {},
) => inTransaction((transaction) => enqueue('parse-intake', { intakeId }, { transaction, ...options }));

describe('putting a job into the queue', () => {
  it('happens with the transaction or not at all', async () => {
    const failing = inTransaction(async (transaction) => {
      await enqueue('expire-leases', {}, { transaction });
      throw new Error('something else failed');
    });
    await expect(failing).rejects.toThrow('something else failed');
    expect(await countJobs()).toEqual({ waiting: 0, running: 0, failed: 0 });

    await inTransaction(async (transaction) => {
      await enqueue('expire-leases', {}, { transaction });
      expect((await countJobs()).waiting).toBe(0);
    });
    expect((await countJobs()).waiting).toBe(1);
  });

  it('refuses a payload that does not fit the job', async () => {
    await expect(add('not an id')).rejects.toThrow();
    expect((await countJobs()).waiting).toBe(0);
  });

  it('replaces a waiting job with the same key', async () => {
    const last = randomUUID();
    await add(randomUUID(), { jobKey: 'one' });
    await add(last, { jobKey: 'one' });
    const seen: string[] = [];
    await work({ 'parse-intake': ({ intakeId }) => Promise.resolve(void seen.push(intakeId)) });
    await until(async () => (await countJobs()).waiting + (await countJobs()).running === 0, 'the job is done');
    expect(seen).toEqual([last]);
  });

  it('keeps time, priority and number of tries', async () => {
    const runAt = new Date('2040-01-02T03:04:05Z');
    await add(randomUUID(), { runAt, priority: -3, maxAttempts: 2 });
    const rows = await database().query(
      'select run_at as "runAt", priority, max_attempts as "maxAttempts", attempts from graphile_worker.jobs',
      { type: QueryTypes.SELECT },
    );
    expect(rows).toEqual([{ runAt, priority: -3, maxAttempts: 2, attempts: 0 }]);
  });
});

describe('a worker', () => {
  it('runs a job once and deletes it', async () => {
    const seen: unknown[] = [];
    await work({ 'parse-intake': (payload, { attempt }) => Promise.resolve(void seen.push({ ...payload, attempt })) });
    const ids = [randomUUID(), randomUUID(), randomUUID()];
    for (const id of ids) await add(id);
    await until(() => seen.length === 3, 'three jobs are done');
    await until(async () => (await countJobs()).running === 0, 'they are deleted');
    expect(await countJobs()).toEqual({ waiting: 0, running: 0, failed: 0 });
    expect(seen).toEqual(expect.arrayContaining(ids.map((intakeId) => ({ intakeId, attempt: 1 }))));
  });

  it('sets a job aside after its last try, without what the database quoted, and takes it up when told to', async () => {
    const intakeId = randomUUID();
    let mended = false;
    const attempts: { attempt: number; isLastAttempt: boolean }[] = [];
    await work({
      'parse-intake': async (_payload, { attempt, isLastAttempt }) => {
        attempts.push({ attempt, isLastAttempt });
        if (!mended) await database().query("select 'an answer of a student'::integer");
      },
    });
    const id = await add(intakeId, { maxAttempts: 1 });
    await until(async () => (await countJobs()).failed === 1, 'the job is set aside');
    const [failed] = await listFailedJobs();
    expect(failed).toMatchObject({ id, name: 'parse-intake', attempts: 1 });
    expect(failed?.lastError).toMatch(/22P02/);
    expect(failed?.lastError).not.toMatch(/student/);

    mended = true;
    expect(await inTransaction((transaction) => retryFailedJob(id, transaction))).toBe(true);
    await until(() => attempts.length === 2, 'it is tried again');
    await until(async () => (await countJobs()).running === 0, 'it is done');
    expect(attempts).toEqual([
      { attempt: 1, isLastAttempt: true },
      { attempt: 1, isLastAttempt: true },
    ]);
    expect(await inTransaction((transaction) => retryFailedJob(id, transaction))).toBe(false);
  });

  it('tries again later what failed', async () => {
    let tries = 0;
    await work({
      'parse-intake': () => {
        tries += 1;
        return tries === 1 ? Promise.reject(new Error('not yet')) : Promise.resolve();
      },
    });
    await add(randomUUID());
    await until(() => tries === 2, 'the second try', 20_000);
  });

  it('leaves jobs that it has no handler for', async () => {
    await work({});
    await add(randomUUID());
    await new Promise((resolve) => setTimeout(resolve, 1_500));
    expect(await countJobs()).toEqual({ waiting: 1, running: 0, failed: 0 });
  });
});
