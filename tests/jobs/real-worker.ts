import { fork, type ChildProcess } from 'node:child_process';
import path from 'node:path';

const workers: ChildProcess[] = [];

/** The worker itself, as it runs in production, in a process of its own. */
export async function startRealWorker(): Promise<ChildProcess> {
  const child = fork(path.resolve('lib/jobs/worker.ts'), [], {
    execArgv: ['--import', 'tsx'],
    env: { ...process.env, LOG_LEVEL: 'silent' },
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
  });
  workers.push(child);
  await new Promise<void>((resolve, reject) => {
    child.once('message', () => resolve());
    child.once('exit', (code) => reject(new Error(`The worker ended at once (${code}).`)));
  });
  return child;
}

/** Ends a worker as a power cut would. */
export function kill(child: ChildProcess): Promise<void> {
  return new Promise((resolve) => {
    if (child.exitCode !== null || child.signalCode !== null) return resolve();
    child.once('exit', () => resolve());
    child.kill('SIGKILL');
  });
}

/** Ends every worker that a test started. */
export async function killAll(): Promise<void> {
  await Promise.all(workers.splice(0).map(kill));
}
