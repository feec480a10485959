import { endChild, hasEnded, saysReady, startChild, turnLog } from './children.mjs';
import { Failure } from './failure.mjs';
import { sleep, waitUntil } from './processes.mjs';

const mostRestarts = 5;
const withinMs = 60_000;

/**
 * One of our own programs that is kept running: started, waited for, started again when it ends by itself.
 *
 * @typedef {object} Service
 * @property {string} name
 * @property {string[]} command what follows `node`
 * @property {Record<string, string | undefined>} env
 * @property {string} log
 * @property {string | null} healthUrl asked until it answers 200; null for a program that says "ready"
 * @property {number} patience milliseconds it is given to end
 * @property {boolean} [endsLast] others talk to it until they end
 */

/**
 * Starts a service and keeps it running.
 *
 * @param {Service} service
 * @param {{ say(line: string): void, giveUp(error: Error): void }} listener `giveUp` is called when it keeps ending
 * @returns {Promise<{ pid(): number | undefined, stop(): Promise<void> }>} settled once the service answers
 */
export async function keepRunning(service, { say, giveUp }) {
  turnLog(service.log);
  let stopping = false;
  let child = null;
  const ends = [];

  const launch = () => {
    child = startChild(service.command, service);
    return child;
  };
  const watch = (started) => {
    started.once('exit', (code, signal) => {
      if (stopping) return;
      const now = performance.now();
      ends.push(now);
      if (ends.filter((time) => now - time < withinMs).length > mostRestarts) {
        giveUp(
          new Failure(
            `The ${service.name} keeps ending (${signal ?? `exit code ${code}`}).`,
            `Its log is ${service.log}`,
          ),
        );
        return;
      }
      say(`The ${service.name} ended (${signal ?? `exit code ${code}`}); starting it again.`);
      void sleep(500).then(() => {
        if (!stopping) watch(launch());
      });
    });
  };

  const first = launch();
  if (!(await isUp(service, first))) {
    stopping = true;
    await endChild(first, 1_000);
    throw new Failure(
      `The ${service.name} did not start.`,
      `Its log is ${service.log}; mend the cause and start again.`,
    );
  }
  watch(first);
  return {
    pid: () => child.pid,
    async stop() {
      stopping = true;
      await endChild(child, service.patience);
    },
  };
}

async function isUp(service, child) {
  if (service.healthUrl === null) return saysReady(child, 60_000);
  const answered = await waitUntil(async () => hasEnded(child) || (await answersWell(service.healthUrl)), 60_000, 100);
  return answered && !hasEnded(child);
}

async function answersWell(url) {
  try {
    const answer = await fetch(url, { signal: AbortSignal.timeout(5_000), redirect: 'manual' });
    await answer.arrayBuffer();
    return answer.status === 200;
  } catch {
    return false;
  }
}
