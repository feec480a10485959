import { spawn, spawnSync } from 'node:child_process';
import { accessSync, constants } from 'node:fs';
import path from 'node:path';
import { Failure, lastWords } from './failure.mjs';

/** The full path of a program on PATH, or null. */
export function findOnPath(name) {
  for (const folder of (process.env.PATH ?? '').split(path.delimiter)) {
    const file = path.join(folder, name);
    if (folder && isExecutable(file)) return file;
  }
  return null;
}

export function isExecutable(file) {
  try {
    accessSync(file, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

export function isRoot() {
  return process.getuid?.() === 0;
}

/**
 * Runs a program to its end and gathers what it says.
 *
 * @returns {Promise<{ code: number, output: string }>} code 127 where the program is missing, 128 + n after signal n
 */
export function run(program, values, { onStart, ...options } = {}) {
  return new Promise((resolve) => {
    const child = spawn(program, values, { stdio: ['ignore', 'pipe', 'pipe'], ...options });
    onStart?.(child);
    let output = '';
    const gather = (chunk) => {
      output = (output + chunk).slice(-200_000);
    };
    child.stdout?.on('data', gather);
    child.stderr?.on('data', gather);
    child.once('error', (error) => resolve({ code: 127, output: error.message }));
    child.once('close', (code, signal) => resolve({ code: code ?? 128 + (signal ? 1 : 0), output }));
  });
}

/** Runs a quick program and gives what it printed, or null where it failed. */
export function ask(program, values, options = {}) {
  const answer = spawnSync(program, values, { encoding: 'utf8', ...options });
  return answer.status === 0 ? answer.stdout : null;
}

/**
 * Installs Debian packages, as root only.
 *
 * @param {string[]} packages
 * @param {string} purpose what they are needed for, for the person who reads the message
 */
export async function installDebianPackages(packages, purpose) {
  const list = packages.join(' ');
  if (!isRoot() || !findOnPath('apt-get')) {
    const command = findOnPath('apt-get')
      ? `run: sudo apt-get update && sudo apt-get install -y --no-install-recommends ${list}`
      : `install it with your system's package manager (Debian's name for it is ${list})`;
    throw new Failure(`${purpose} is missing.`, `To install it, ${command}`);
  }
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive', LC_ALL: 'C' };
  // A lock held by another package manager is waited for; a half-done update alone is no reason to give up.
  const wait = ['-o', 'DPkg::Lock::Timeout=300'];
  const update = await run('apt-get', [...wait, 'update'], { env });
  const install = await run('apt-get', [...wait, 'install', '-y', '--no-install-recommends', ...packages], { env });
  if (install.code !== 0) {
    const words = /no space left/i.test(install.output)
      ? 'No space left on device'
      : lastWords(`${update.code === 0 ? '' : update.output}\n${install.output}`);
    throw new Failure(
      `${purpose} could not be installed: ${words}`,
      `Mend that, or install by hand: apt-get update && apt-get install -y --no-install-recommends ${list}`,
    );
  }
}
