import { database, closeDatabase } from '@/lib/db/connection';
import { type JobHandler } from '@/lib/jobs/job-handler';
import { runWorker } from '@/lib/jobs/run-worker';

/*
 * A worker process for the tests of the queue. Its one job either waits for the message "go on" or is done at once; its
 * effect is a row. It tells its parent "ready", and "begun" with the intake's id when a job has begun.
 */

const waits = process.argv[2] === 'waits';
const goOn = new Promise<void>((resolve) => {
  process.on('message', (message) => message === 'go on' && resolve());
});

const parseIntake: JobHandler<'parse-intake'> = async ({ intakeId }, { attempt }) => {
  process.send?.({ begun: intakeId });
  if (waits) await goOn;
  await database().query('insert into effects (intake_id, attempt, pid) values (:intakeId, :attempt, :pid)', {
    replacements: { intakeId, attempt, pid: process.pid },
  });
};

const worker = await runWorker({
  databaseUrl: process.env.DATABASE_URL ?? '',
  handlers: { 'parse-intake': parseIntake },
  recurring: [],
  concurrency: 1,
});
process.on('SIGTERM', () => {
  void worker
    .stop()
    .then(closeDatabase)
    .then(() => process.exit(0));
});
process.send?.('ready');
