import { EventEmitter } from 'node:events';
import { Logger, parseCronItems, run, type Runner, type WorkerEvents } from 'graphile-worker';
import { log } from '@/lib/log';
import { openPresence, type Presence } from '@/lib/queue/worker-presence';
import { type JobHandlers } from './job-handler';
import { buildTaskList } from './task-list';

export type WorkerSettings = {
  databaseUrl: string;
  handlers: JobHandlers;
  /** Jobs put in by the clock; those without a handler are left out. */
  recurring: readonly { name: string; at: string }[];
  /** Jobs run at once. */
  concurrency: number;
};

/** A running worker. */
export type RunningWorker = {
  /** Settles when the worker has ended by itself; rejects where that was a failure. */
  ended: Promise<void>;
  /** Takes no further job, lets running ones end (within five seconds, then asks them to), and lets go. */
  stop(): Promise<void>;
};

const sweepEveryMs = 5_000;

/** Runs jobs from the queue until stopped, and frees the jobs of other workers that died. */
export async function runWorker({
  databaseUrl,
  handlers,
  recurring,
  concurrency,
}: WorkerSettings): Promise<RunningWorker> {
  let fail: (error: Error) => void = () => undefined;
  const lost = new Promise<never>((_resolve, reject) => {
    fail = reject;
  });
  const presence = await openPresence(databaseUrl, fail);
  const events: WorkerEvents = new EventEmitter();
  events.on('pool:create', ({ workerPool }) => {
    presence.announce(workerPool.id).catch(fail);
  });

  const runner = await run({
    connectionString: databaseUrl,
    maxPoolSize: concurrency + 2,
    concurrency,
    pollInterval: 1_000,
    noHandleSignals: true,
    events,
    logger: queueLogger(),
    taskList: buildTaskList(handlers),
    parsedCronItems: parseCronItems(
      recurring
        .filter(({ name }) => name in handlers)
        .map(({ name, at }) => ({
          task: name,
          match: at,
          // A second one is not added while the last still waits, and none is made up for minutes without a worker.
          options: { maxAttempts: 1, backfillPeriod: 0, jobKey: `recurring ${name}` },
        })),
    ),
  });
  const stopSweeping = sweep(presence, fail);
  return supervise(runner, lost, async () => {
    stopSweeping();
    await presence.close();
  });
}

function supervise(runner: Runner, lost: Promise<never>, letGo: () => Promise<void>): RunningWorker {
  let stopping: Promise<void> | null = null;
  const ended = Promise.race([runner.promise, lost]);
  ended.catch(() => undefined);
  return {
    ended,
    stop() {
      stopping ??= runner
        .stop()
        .catch((error: unknown) => log.error({ err: error }, 'the worker did not stop cleanly'))
        .then(letGo);
      return stopping;
    },
  };
}

/** Looks for the jobs of dead workers at once and then every few seconds; returns how to end that. */
function sweep(presence: Presence, fail: (error: Error) => void): () => void {
  let ended = false;
  let timer: NodeJS.Timeout | undefined;
  const look = async () => {
    try {
      const dead = await presence.freeJobsOfTheDead();
      if (dead.length > 0) log.warn({ workers: dead }, 'took up the jobs of workers that are gone');
    } catch (error) {
      if (!ended) fail(error instanceof Error ? error : new Error('The queue could not be swept.'));
    }
    if (!ended) timer = setTimeout(() => void look(), sweepEveryMs);
  };
  void look();
  return () => {
    ended = true;
    clearTimeout(timer);
  };
}

/** The queue's own lines in our log: what it warns of. Its line about a failed job repeats ours and is left out. */
function queueLogger(): Logger {
  return new Logger((scope) => (level, message, meta) => {
    if (meta?.['failure'] === true) return;
    const fields = { queueWorker: scope['workerId'], queueTask: scope['taskIdentifier'] };
    if (String(level) === 'error') log.error(fields, message);
    else if (String(level) === 'warning') log.warn(fields, message);
    else log.debug(fields, message);
  });
}
