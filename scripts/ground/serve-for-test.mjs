import { mkdirSync } from 'node:fs';
import path from 'node:path';
import { buildIsCurrent, hashOf } from './build.mjs';
import { endChild, saysReady, startChild } from './children.mjs';
import { Failure } from './failure.mjs';
import { projectRoot } from './folders.mjs';
import { freePort } from './ports.mjs';
import { newSecret } from './secrets.mjs';
import { httpAddress, sinkService, webService, workerService } from './service-list.mjs';
import { keepRunning } from './services.mjs';

/** A hash over what makes a seeded database what it is. */
export function seedFingerprint() {
  return hashOf(projectRoot, ['lib', 'models', 'migrations', 'seeders', 'package-lock.json']).slice(0, 12);
}

/** Free ports and fresh secrets for one running Halfmark whose files lie in one folder. */
export async function planForTest(folder) {
  for (const name of ['mail', 'uploads', 'log']) mkdirSync(path.join(folder, name), { recursive: true, mode: 0o700 });
  const [port, smtp, mailPage] = [await freePort(), await freePort(), await freePort()];
  return {
    baseEnv: { ...process.env, LOG_LEVEL: 'info' },
    host: '127.0.0.1',
    port,
    appUrl: httpAddress('127.0.0.1', port),
    sessionSecret: newSecret(),
    smtpUrl: `smtp://127.0.0.1:${smtp}`,
    sink: { smtp, mailPage },
    mailFolder: path.join(folder, 'mail'),
    uploadsFolder: path.join(folder, 'uploads'),
    logFolder: path.join(folder, 'log'),
  };
}

/** Starts the built application as `npm start` does, but for the supervision of its workers, which tests kill. */
export async function serveForTest(facts, workerCount) {
  if (!buildIsCurrent()) {
    throw new Failure(
      'The pages are not built from the present sources.',
      'Run `npm test -- journeys`, or start once.',
    );
  }
  const begun = [];
  const workers = [];
  const listener = {
    say: () => {},
    giveUp(error) {
      throw error;
    },
  };
  const startWorker = async () => {
    const service = workerService(facts);
    const child = startChild(service.command, service);
    workers.push(child);
    if (!(await saysReady(child, 60_000))) throw new Failure('The worker did not start.', `Its log is ${service.log}`);
  };
  const stop = async () => {
    await Promise.all(begun.filter(({ last }) => !last).map(({ end }) => end()));
    await Promise.all(workers.map((worker) => endChild(worker, 15_000)));
    await Promise.all(begun.filter(({ last }) => last).map(({ end }) => end()));
  };
  try {
    for (const service of [sinkService(facts), webService(facts)]) {
      begun.push({ last: service.endsLast === true, end: (await keepRunning(service, listener)).stop });
    }
    for (let number = 0; number < workerCount; number += 1) await startWorker();
  } catch (error) {
    await stop();
    throw error;
  }
  return {
    startWorker,
    async killWorkers(signal = 'SIGKILL') {
      await Promise.all(
        workers.splice(0).map(
          (worker) =>
            new Promise((resolve) => {
              if (worker.exitCode !== null || worker.signalCode !== null) return resolve();
              worker.once('exit', () => resolve());
              worker.kill(signal);
            }),
        ),
      );
    },
    stop,
  };
}
