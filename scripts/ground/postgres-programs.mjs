import { existsSync, mkdirSync, readdirSync, realpathSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { Failure } from './failure.mjs';
import { ask, findOnPath, installDebianPackages, isExecutable, isRoot } from './programs.mjs';

const oldestSupported = 14;

/** The major version in what `postgres --version` prints, or null. */
export function majorVersion(text) {
  const match = /\(PostgreSQL\) (\d+)/.exec(text ?? '');
  return match ? Number(match[1]) : null;
}

/**
 * Finds the folder of PostgreSQL's server programs, installing Debian's package where there is none.
 *
 * @param {(line: string) => void} say
 * @param {number | null} required the major version an existing cluster needs; null for the newest found
 * @returns {Promise<{ folder: string, version: number }>}
 */
export async function ensurePostgresPrograms(say, required = null) {
  const found = choose(findInstallations(), required);
  if (found) return found;
  if (required === null) {
    if (isRoot()) say('Installing PostgreSQL (Debian package postgresql) …');
    await installWithoutDefaultCluster();
    const installed = choose(findInstallations(), null);
    if (installed) return installed;
    throw new Failure(
      'PostgreSQL was installed, but its server programs (initdb, postgres) were not found.',
      'Put their folder on PATH and start again.',
    );
  }
  throw new Failure(
    `The database of this clone was made by PostgreSQL ${required}, whose server programs are gone.`,
    `Install them again (Debian: apt-get install postgresql-${required}), or move .halfmark aside to begin anew.`,
  );
}

/** The newest installation that serves, or the one of the required version. */
export function choose(installations, required) {
  const fit = installations.filter(({ version }) =>
    required === null ? version >= oldestSupported : version === required,
  );
  return fit.sort((a, b) => b.version - a.version)[0] ?? null;
}

function findInstallations() {
  const folders = new Set();
  const debian = '/usr/lib/postgresql';
  if (existsSync(debian)) for (const version of readdirSync(debian)) folders.add(path.join(debian, version, 'bin'));
  const onPath = findOnPath('initdb');
  if (onPath) folders.add(path.dirname(realpathSync(onPath)));
  return [...folders]
    .filter((folder) => ['initdb', 'postgres'].every((name) => isExecutable(path.join(folder, name))))
    .map((folder) => ({ folder, version: majorVersion(ask(path.join(folder, 'postgres'), ['--version'])) }))
    .filter(({ version }) => version !== null);
}

/**
 * Debian's package makes and starts a cluster of its own on port 5432, which Halfmark does not need: a setting read at
 * installation turns that off, and is taken away again afterwards.
 */
async function installWithoutDefaultCluster() {
  const folder = '/etc/postgresql-common/createcluster.d';
  const setting = path.join(folder, 'halfmark.conf');
  if (!isRoot()) return installDebianPackages(['postgresql'], 'PostgreSQL');
  mkdirSync(folder, { recursive: true });
  writeFileSync(setting, 'create_main_cluster = false\n');
  try {
    await installDebianPackages(['postgresql'], 'PostgreSQL');
  } finally {
    rmSync(setting, { force: true });
  }
}
