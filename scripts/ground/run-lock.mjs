import { linkSync, renameSync, rmSync, unlinkSync } from 'node:fs';
import { Failure } from './failure.mjs';
import { readJson, writeJson } from './files.mjs';
import { isAlive, sleep, startTicks } from './processes.mjs';

/**
 * Takes a lock that is held by a living process, written down in a file. A lock whose process is gone (or whose process
 * id now belongs to another program) is cleared.
 *
 * @param {string} file
 * @returns {Promise<{ note(more: object): void, release(): void, tookOver: boolean } |
 *   { holder: Record<string, unknown> }>} `tookOver`: the last holder ended without letting go
 */
export async function takeLock(file) {
  const mine = { pid: process.pid, startTicks: startTicks(process.pid), since: new Date().toISOString() };
  const draft = `${file}.${process.pid}.new`;
  let tookOver = false;
  for (let attempt = 0; attempt < 20; attempt += 1) {
    writeJson(draft, mine);
    try {
      // A link appears whole or not at all, and never replaces another.
      linkSync(draft, file);
      unlinkSync(draft);
      return { ...held(file, mine), tookOver };
    } catch (error) {
      rmSync(draft, { force: true });
      if (error.code !== 'EEXIST') throw error;
    }
    const holder = readJson(file);
    if (holder !== null && holds(holder)) return { holder };
    clearStale(file);
    tookOver = true;
    await sleep(20 + Math.random() * 60);
  }
  throw new Failure(`The lock ${file} cannot be taken.`, 'Delete that file and start again.');
}

/** Whether the process that a lock names still runs. */
export function holds(holder) {
  if (!Number.isInteger(holder?.pid) || !isAlive(holder.pid)) return false;
  const ticks = startTicks(holder.pid);
  return ticks === null || holder.startTicks == null || ticks === holder.startTicks;
}

/** Takes a stale lock away by renaming it: where two do so at once, only one has it in hand, and puts back a fresh one. */
function clearStale(file) {
  const aside = `${file}.${process.pid}.stale`;
  try {
    renameSync(file, aside);
  } catch (error) {
    if (error.code === 'ENOENT') return;
    throw error;
  }
  const caught = readJson(aside);
  if (caught !== null && holds(caught)) {
    try {
      linkSync(aside, file);
    } catch (error) {
      if (error.code !== 'EEXIST') throw error;
    }
  }
  rmSync(aside, { force: true });
}

function held(file, mine) {
  let entry = mine;
  return {
    /** Adds what others should know, such as the address. */
    note(more) {
      entry = { ...entry, ...more };
      writeJson(file, entry, 0o644);
    },
    release() {
      if (readJson(file)?.pid === process.pid) rmSync(file, { force: true });
    },
  };
}
