import { closeDatabase } from '@/lib/db/connection';
import { environment } from '@/lib/env';
import { log } from '@/lib/log';
import { jobHandlers, recurringJobs } from './registry';
import { runWorker } from './run-worker';

/*
 * The worker process: `node --import tsx lib/jobs/worker.ts`. Any number may run, on any machine that reaches the
 * database. SIGTERM, SIGINT and SIGHUP end it after the jobs it is running.
 */

/** After being asked to end it is gone within this time, whatever a job does; its job is then taken up by another. */
const longestFarewellMs = 12_000;

async function main(): Promise<void> {
  const { databaseUrl, workerConcurrency } = environment();
  const worker = await runWorker({
    databaseUrl,
    handlers: jobHandlers,
    recurring: recurringJobs,
    concurrency: workerConcurrency,
  });
  const asked = new Promise<void>((resolve) => {
    for (const signal of ['SIGTERM', 'SIGINT', 'SIGHUP'] as const) process.on(signal, () => resolve());
  });
  log.info({ jobs: Object.keys(jobHandlers), concurrency: workerConcurrency }, 'worker ready');
  process.send?.('ready');

  await Promise.race([asked, worker.ended]);
  setTimeout(() => process.exit(1), longestFarewellMs).unref();
  await worker.stop();
  await closeDatabase();
  log.info('worker ended');
}

main().then(
  () => process.exit(0),
  (error: unknown) => {
    log.fatal({ err: error }, 'worker failed');
    process.exit(1);
  },
);
