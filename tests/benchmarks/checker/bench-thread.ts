/** The tasks of the checker's benchmark; each runs in a thread of its own and posts its result. */
import { parentPort, workerData } from 'node:worker_threads';
import { growthByLength, memoryOverChecks, readingTime, throughput } from './own-figures';
import { decideWithHalfmark, decideWithMathjs, decideWithNerdamer, scalarPairs, type ScalarPair } from './scalar-pairs';

interface Task {
  readonly folder: string;
  readonly task: string;
  readonly seconds?: number;
  readonly warmUp?: number;
  readonly checks?: number;
  readonly count?: number;
  readonly pairs?: readonly ScalarPair[];
}

const task = workerData as Task;
parentPort?.postMessage(result());

function result(): unknown {
  const { folder, seconds = 5, warmUp = 0, checks = 1, count = 1, pairs = [] } = task;
  switch (task.task) {
    case 'throughput':
      return throughput(folder, seconds, warmUp);
    case 'reading':
      return readingTime(folder, seconds);
    case 'growth':
      return growthByLength();
    case 'memory':
      return memoryOverChecks(folder, checks);
    case 'pairs':
      return scalarPairs(folder, count);
    case 'halfmark':
      return decideWithHalfmark(pairs);
    case 'mathjs':
      return decideWithMathjs(pairs);
    case 'nerdamer':
      return decideWithNerdamer(pairs);
    default:
      throw new Error(`no task ${task.task}`);
  }
}
