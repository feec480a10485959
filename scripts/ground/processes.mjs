import { readFileSync } from 'node:fs';

/** Whether a process with this id runs (also one of another user). */
export function isAlive(pid) {
  try {
    process.kill(pid, 0);
  } catch (error) {
    return error.code === 'EPERM';
  }
  return processState(pid) !== 'Z';
}

/**
 * When a process started, in clock ticks since the machine did, so that a process id used again by another program is
 * not taken for the one that wrote it down. Null where the system does not say (no /proc).
 */
export function startTicks(pid) {
  const fields = statFields(pid);
  return fields ? Number(fields[19]) : null;
}

/** The command line of a process, words separated by blanks; null where the system does not say. */
export function commandLine(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').replaceAll('\0', ' ').trim();
  } catch {
    return null;
  }
}

function processState(pid) {
  return statFields(pid)?.[0] ?? null;
}

/** The fields of /proc/PID/stat after the program's name (which may hold blanks and brackets). */
function statFields(pid) {
  try {
    const text = readFileSync(`/proc/${pid}/stat`, 'utf8');
    return text.slice(text.lastIndexOf(')') + 2).split(' ');
  } catch {
    return null;
  }
}

export const sleep = (milliseconds) => new Promise((resolve) => setTimeout(resolve, milliseconds));

/** Waits until a condition holds; false when it does not within the time. */
export async function waitUntil(condition, milliseconds, every = 50) {
  const end = performance.now() + milliseconds;
  for (;;) {
    if (await condition()) return true;
    if (performance.now() >= end) return false;
    await sleep(every);
  }
}
