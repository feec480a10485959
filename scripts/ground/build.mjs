import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';
import { Failure, lastWords } from './failure.mjs';
import { readJson, writeJson, writeWhole } from './files.mjs';
import { inState, makeStateFolder, projectRoot } from './folders.mjs';
import { sleep } from './processes.mjs';
import { run } from './programs.mjs';
import { holds, takeLock } from './run-lock.mjs';

/** Everything that ends up in the build of the web server. */
const sources = [
  'app',
  'components',
  'lib',
  'models',
  'public',
  'migrations',
  'next.config.mjs',
  'package-lock.json',
  'postcss.config.mjs',
  'proxy.ts',
  'tailwind.config.ts',
  'tsconfig.json',
];

/** The folder of the build, relative to the project, as next.config.mjs takes it. */
export const buildFolder = process.env.HALFMARK_DIST_DIR ?? '.next';

/** A hash over the names and bytes of files and folders below a root; missing ones count as absent. */
export function hashOf(root, names) {
  const hash = createHash('sha256');
  const visit = (name) => {
    const file = path.join(root, name);
    if (!existsSync(file)) return;
    if (statSync(file).isDirectory()) {
      for (const entry of readdirSync(file).sort()) visit(path.join(name, entry));
      return;
    }
    const bytes = readFileSync(file);
    hash.update(`${name}\0${bytes.length}\0`).update(bytes);
  };
  for (const name of names) visit(name);
  return hash.digest('hex');
}

/** Whether the build on disk was made from the sources as they are now. */
export function buildIsCurrent() {
  return readJson(stampFile())?.sources === hashOf(projectRoot, sources);
}

/**
 * Builds the web application when its sources changed since the last build; takes milliseconds when they did not.
 *
 * @param {(line: string) => void} say
 * @param {{ onStart?: (child: import('node:child_process').ChildProcess) => void, running?: string }} options
 *   `running`: the lock file of `npm start`, whose build must not be replaced under a running server by another
 */
export async function ensureBuild(say, { onStart, mayReplace = () => null } = {}) {
  if (buildIsCurrent()) return;
  makeStateFolder();
  const lock = await waitForLock(inState('build.lock'));
  try {
    if (buildIsCurrent()) return;
    const obstacle = mayReplace();
    if (obstacle) throw obstacle;
    say('Building the pages, about a minute …');
    const hash = hashOf(projectRoot, sources);
    const { code, output } = await run(process.execPath, ['node_modules/next/dist/bin/next', 'build'], {
      cwd: projectRoot,
      env: { ...process.env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1', NO_COLOR: '1' },
      onStart,
    });
    if (code !== 0) {
      if (/ENOSPC|No space left/i.test(output)) throw Object.assign(new Error('No space left'), { code: 'ENOSPC' });
      const log = inState('log', 'build.log');
      writeWhole(log, output);
      throw new Failure(`The pages could not be built: ${firstError(output)}`, `All of it is in ${log}`);
    }
    writeJson(stampFile(), { sources: hash }, 0o644);
  } finally {
    lock.release();
  }
}

/** A reason not to build while `npm start` serves from the same folder, or null. */
export function servingFromHere(startLock) {
  const holder = readJson(startLock);
  if (holder === null || !holds(holder)) return null;
  return new Failure(
    `Halfmark is running from this folder (process ${holder.pid}) with a build of older sources, which may not be replaced under it.`,
    'Stop it (Ctrl-C where it was started) and try again.',
  );
}

/** The first line of a build's output that speaks of an error, or its last words. */
export function firstError(output) {
  const line = output.split('\n').find((one) => /error/i.test(one) && !/warning/i.test(one));
  return line?.trim().slice(0, 400) ?? lastWords(output);
}

async function waitForLock(file) {
  for (;;) {
    const lock = await takeLock(file);
    if ('release' in lock) return lock;
    await sleep(500);
  }
}

/** The stamp lies in the build itself, so that the two cannot part. */
function stampFile() {
  return path.join(projectRoot, buildFolder, 'halfmark-sources.json');
}
