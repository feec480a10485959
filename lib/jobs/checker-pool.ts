import { Piscina } from 'piscina';
import type { CheckRequest } from '@/lib/checker/contract';
import { log } from '@/lib/log';
import type { ThreadResult } from './checker-worker';
import { compiledChecker } from './compiled-checker';

/** One check takes under a millisecond and is bounded by its own count of steps; this ends a thread that hangs all the same. */
const BACKSTOP_MS = 1_000;
/** Room for starting a thread, which loads the checker first. */
const START_MS = 10_000;

type Threads = Piscina<readonly CheckRequest[], ThreadResult[]>;

let pool: Promise<Threads> | null = null;

/** The threads of this process; a start that failed is not kept, so that the next check tries again. */
function threads(): Promise<Threads> {
  pool ??= startThreads().catch((error: unknown) => {
    pool = null;
    throw error;
  });
  return pool;
}

async function startThreads(): Promise<Threads> {
  return new Piscina({
    filename: await compiledChecker(),
    // A compiled script needs nothing that this process was started with, such as a loader of TypeScript.
    execArgv: [],
    minThreads: 1,
    maxThreads: 2,
    idleTimeout: 30_000,
    resourceLimits: { maxOldGenerationSizeMb: 256 },
  });
}

/** A request the checker gave no answer to in time, or at all. */
export type ThreadFailure = { failed: true; requestId: string };

/**
 * Checks requests in a worker thread, in order. Where the thread hangs or dies they are tried once more one by one, and
 * only the one at fault comes back as a failure. Throws where no thread can be had at all: that is no answer's fault, and
 * the job is to be tried again.
 */
export async function checkInThread(requests: readonly CheckRequest[]): Promise<(ThreadResult | ThreadFailure)[]> {
  await runBounded([]);
  try {
    return await runBounded(requests);
  } catch (error) {
    log.warn({ err: error, checks: requests.length }, 'a checker thread was ended; its checks are tried one by one');
  }
  const results: (ThreadResult | ThreadFailure)[] = [];
  for (const request of requests) {
    try {
      results.push(...(await runBounded([request])));
    } catch (error) {
      log.error({ err: error, check: request.id }, 'a check was given up');
      results.push({ failed: true, requestId: request.id });
    }
  }
  return results;
}

async function runBounded(requests: readonly CheckRequest[]): Promise<ThreadResult[]> {
  const held = await threads();
  return held.run(requests, { signal: AbortSignal.timeout(START_MS + BACKSTOP_MS * requests.length) });
}

/** Ends the threads of this process; a later check starts new ones. */
export async function closeCheckerPool(): Promise<void> {
  const held = pool;
  pool = null;
  await (await held)?.destroy();
}
