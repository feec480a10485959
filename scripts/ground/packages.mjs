import { createHash } from 'node:crypto';
import { existsSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { Failure, lastWords } from './failure.mjs';
import { readJson, writeJson } from './files.mjs';
import { projectRoot } from './folders.mjs';
import { findOnPath, run } from './programs.mjs';

const stamp = path.join(projectRoot, 'node_modules', '.halfmark-packages.json');

/** What the installed packages depend on: the lock file and the Node.js they were installed for. */
export function packagesKey(
  lockText,
  abi = process.versions.modules,
  platform = `${process.platform}-${process.arch}`,
) {
  return createHash('sha256').update(`${abi}\n${platform}\n`).update(lockText).digest('hex');
}

/**
 * Installs the locked packages when they are missing or belong to another lock file; otherwise takes a millisecond.
 *
 * @param {(line: string) => void} say
 * @param {(child: import('node:child_process').ChildProcess) => void} [onStart] told of npm, so that it can be ended
 */
export async function ensurePackages(say, onStart) {
  const key = packagesKey(readFileSync(path.join(projectRoot, 'package-lock.json')));
  if (readJson(stamp)?.key === key) return;
  if (await installedMatches()) {
    writeJson(stamp, { key }, 0o644);
    return;
  }
  if (!findOnPath('npm'))
    throw new Failure('npm is missing.', 'Install npm 10 or later beside Node.js and start again.');
  say('Installing packages (npm ci), about a minute …');
  rmSync(stamp, { force: true });
  const { code, output } = await run('npm', ['ci', '--no-audit', '--no-fund', '--include=dev'], {
    cwd: projectRoot,
    env: { ...process.env, NODE_ENV: '' },
    onStart,
  });
  if (code !== 0) {
    if (/ENOSPC/.test(output)) throw Object.assign(new Error('No space left on device'), { code: 'ENOSPC' });
    throw new Failure(
      `npm ci failed: ${lastWords(output.replace(/^npm warn.*$/gm, ''))}`,
      'Check the connection to the npm registry, then start again.',
    );
  }
  writeJson(stamp, { key }, 0o644);
}

/**
 * Whether what npm says it installed (node_modules/.package-lock.json) is what the lock file asks for: so packages
 * installed by hand are not installed a second time.
 */
async function installedMatches() {
  const hidden = path.join(projectRoot, 'node_modules', '.package-lock.json');
  if (!existsSync(hidden)) return false;
  return sameInstall(readJson(path.join(projectRoot, 'package-lock.json')), readJson(hidden), (name) =>
    existsSync(path.join(projectRoot, name, 'package.json')),
  );
}

/** Every locked package that is not optional is installed in its locked version, and nothing else is. */
export function sameInstall(locked, installed, isThere) {
  if (!locked?.packages || !installed?.packages) return false;
  const wanted = Object.entries(locked.packages).filter(([name]) => name !== '');
  const complete = wanted.every(([name, { version, integrity, optional, devOptional }]) => {
    const found = installed.packages[name];
    if (!found) return optional === true || devOptional === true;
    return found.version === version && found.integrity === integrity && isThere(name);
  });
  return complete && Object.keys(installed.packages).every((name) => name in locked.packages);
}
