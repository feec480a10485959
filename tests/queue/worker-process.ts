import { fork, type ChildProcess } from 'node:child_process';
import path from 'node:path';

/** A fixture worker in a process of its own. */
export type WorkerProcess = {
  child: ChildProcess;
  /** The intakes whose jobs it has begun, in order. */
  begun: string[];
  kill(signal: NodeJS.Signals): Promise<void>;
};

/** Starts a worker that takes `parse-intake` jobs; one that waits finishes none before it is told "go on". */
export async function startWorkerProcess(mode: 'waits' | 'works'): Promise<WorkerProcess> {
  const child = fork(path.join(import.meta.dirname, 'fixture-worker.ts'), [mode], {
    execArgv: ['--import', 'tsx'],
    env: { ...process.env, LOG_LEVEL: 'silent' },
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
  });
  const begun: string[] = [];
  await new Promise<void>((resolve, reject) => {
    child.on('message', (message: unknown) => {
      if (message === 'ready') resolve();
      else if (typeof message === 'object' && message !== null && 'begun' in message) begun.push(String(message.begun));
    });
    child.once('exit', (code) => reject(new Error(`The worker ended at once (${code}).`)));
  });
  return {
    child,
    begun,
    kill: (signal) =>
      new Promise<void>((resolve) => {
        if (child.exitCode !== null || child.signalCode !== null) return resolve();
        child.once('exit', () => resolve());
        child.kill(signal);
      }),
  };
}

/** Waits until a condition holds. */
export async function until(condition: () => boolean | Promise<boolean>, what: string, ms = 15_000): Promise<void> {
  const end = performance.now() + ms;
  while (!(await condition())) {
    if (performance.now() > end) throw new Error(`It took longer than ${ms} ms: ${what}.`);
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
}
