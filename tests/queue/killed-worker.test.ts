import { randomUUID } from 'node:crypto';
import { QueryTypes } from 'sequelize';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { database } from '@/lib/db/connection';
import { inTransaction } from '@/lib/db/transaction';
import { enqueue } from '@/lib/queue/enqueue';
import { countJobs } from '@/lib/queue/failed-jobs';
import { startWorkerProcess, until, type WorkerProcess } from './worker-process';

const workers: WorkerProcess[] = [];

async function start(mode: 'waits' | 'works'): Promise<WorkerProcess> {
  const worker = await startWorkerProcess(mode);
  workers.push(worker);
  return worker;
}

async function addIntakeJob(queueName?: string): Promise<string> {
  const intakeId = randomUUID();
  await inTransaction((transaction) => enqueue('parse-intake', { intakeId }, { transaction, queueName }));
  return intakeId;
}

function effects() {
  return database().query<{ intakeId: string; attempt: number; pid: number }>(
    'select intake_id as "intakeId", attempt, pid from effects order by done_at',
    { type: QueryTypes.SELECT },
  );
}

beforeEach(async () => {
  await database().query(
    'create table effects (intake_id uuid, attempt integer, pid integer, done_at timestamptz default clock_timestamp())',
  );
});

afterEach(async () => {
  await Promise.all(workers.splice(0).map((worker) => worker.kill('SIGKILL')));
  await database().query('drop table effects');
});

describe('a worker killed in the midst of a job', () => {
  it('leaves the job to another within half a minute; the job of a living worker is not touched', async () => {
    const living = await start('waits');
    const slow = await addIntakeJob();
    await until(() => living.begun.includes(slow), 'the living worker takes its job');

    const doomed = await start('waits');
    const orphan = await addIntakeJob('one after another');
    await until(() => doomed.begun.includes(orphan), 'the doomed worker takes its job');
    const behind = await addIntakeJob('one after another');
    await doomed.kill('SIGKILL');

    const rescuer = await start('works');
    await until(async () => (await effects()).length === 2, 'the orphan and the one behind it are done', 30_000);
    expect(rescuer.begun).toEqual([orphan, behind]);

    living.child.send('go on');
    await until(async () => (await effects()).length === 3, 'the slow job is done');
    const rescuerPid = rescuer.child.pid;
    expect(await effects()).toMatchObject([
      { intakeId: orphan, attempt: 2, pid: rescuerPid },
      { intakeId: behind, attempt: 1, pid: rescuerPid },
      { intakeId: slow, attempt: 1, pid: living.child.pid },
    ]);
    await until(async () => Object.values(await countJobs()).every((count) => count === 0), 'the queue is empty');
  });

  it('ends its running job first when it is asked to end', async () => {
    const worker = await start('waits');
    const intakeId = await addIntakeJob();
    await until(() => worker.begun.includes(intakeId), 'the worker takes its job');
    const ended = worker.kill('SIGTERM');
    worker.child.send('go on');
    await ended;
    expect(worker.child.exitCode).toBe(0);
    expect(await effects()).toMatchObject([{ intakeId, attempt: 1 }]);
  });
});
