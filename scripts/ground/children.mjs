import { spawn } from 'node:child_process';
import { closeSync, existsSync, openSync, renameSync, rmSync, statSync } from 'node:fs';
import path from 'node:path';
import { projectRoot } from './folders.mjs';
import { waitUntil } from './processes.mjs';

const endWithParent = path.join(projectRoot, 'scripts', 'ground', 'end-with-parent.mjs');
const largestLog = 10 * 1024 * 1024;

/**
 * Starts one of our own Node.js programs so that it ends with us: its standard input is a pipe whose closing it takes
 * as the order to end. It has a session of its own, so that Ctrl-C reaches only us and we decide the order of ending.
 *
 * @param {string[]} command what follows `node`
 * @param {{ env: Record<string, string | undefined>, log: string }} options
 * @returns {import('node:child_process').ChildProcess} with an IPC channel for the message "ready"
 */
export function startChild(command, { env, log }) {
  const out = openSync(log, 'a', 0o600);
  const child = spawn(process.execPath, ['--import', endWithParent, ...command], {
    cwd: projectRoot,
    env,
    stdio: ['pipe', out, out, 'ipc'],
    detached: true,
  });
  closeSync(out);
  child.stdin.on('error', () => {});
  child.on('error', () => {});
  return child;
}

/** Moves a log that grew large aside, keeping one older. Called while nobody writes to it. */
export function turnLog(log) {
  if (!existsSync(log) || statSync(log).size < largestLog) return;
  rmSync(`${log}.1`, { force: true });
  renameSync(log, `${log}.1`);
}

export function hasEnded(child) {
  return child.exitCode !== null || child.signalCode !== null || child.pid === undefined;
}

/** Resolves to true when the child says it is ready, to false when it ends first or the time is over. */
export function saysReady(child, milliseconds) {
  return new Promise((resolve) => {
    const timer = setTimeout(() => resolve(false), milliseconds);
    const settle = (value) => {
      clearTimeout(timer);
      resolve(value);
    };
    child.on('message', (message) => message === 'ready' && settle(true));
    child.once('exit', () => settle(false));
    child.once('error', () => settle(false));
  });
}

/** Asks a child to end and waits; after the patience it is killed, with all that it started. */
export async function endChild(child, patience) {
  if (hasEnded(child)) return;
  child.kill('SIGTERM');
  if (await waitUntil(() => hasEnded(child), patience)) return;
  try {
    process.kill(-child.pid, 'SIGKILL');
  } catch (error) {
    if (error.code !== 'ESRCH') throw error;
  }
  await waitUntil(() => hasEnded(child), 5_000);
}
