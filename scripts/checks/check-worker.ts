/** Answers batches of lines in a thread of its own; see check-workers. */
import { parentPort, workerData } from 'node:worker_threads';
import { check } from '../../lib/checker/index';
import { type CheckOutcome } from '../../lib/checker/contract';

interface Line {
  readonly number: number;
  /** Null where the line was too long to be kept. */
  readonly text: string | null;
}

const progress = new Int32Array(workerData as SharedArrayBuffer);

parentPort?.on('message', ({ batch, givenUp }: { batch: readonly Line[]; givenUp: readonly number[] }) => {
  const answers = batch.map((line, k) => {
    Atomics.store(progress, 0, k);
    return JSON.stringify(
      givenUp.includes(k) ? { id: null, line: line.number, error: 'The check took too long.' } : answer(line),
    );
  });
  parentPort?.postMessage(answers);
});

function answer({ number, text }: Line): CheckOutcome {
  if (text === null) return { id: null, line: number, error: 'The line is longer than 1 MB.' };
  let request: unknown;
  try {
    request = JSON.parse(text);
  } catch {
    return { id: null, line: number, error: 'The line is not JSON.' };
  }
  const outcome = check(request, { now: () => performance.now() });
  return 'error' in outcome ? { id: outcome.id, line: number, error: outcome.error } : outcome;
}
