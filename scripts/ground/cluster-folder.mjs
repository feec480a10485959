import { createHash } from 'node:crypto';
import { spawnSync } from 'node:child_process';
import { chownSync, existsSync, mkdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';
import { Failure } from './failure.mjs';
import { ask, isRoot } from './programs.mjs';

/**
 * Who runs the database: nobody special, unless root started us. PostgreSQL refuses to run as root, so it then runs as
 * the user `postgres` that Debian's package made.
 *
 * @returns {{ uid: number, gid: number } | null} null where the database runs as the user who started
 */
export function databaseUser() {
  if (!isRoot()) return null;
  const uid = ask('id', ['-u', 'postgres']);
  const gid = ask('id', ['-g', 'postgres']);
  if (uid === null || gid === null) {
    throw new Failure(
      'PostgreSQL does not run as root, and there is no user "postgres" to run it.',
      'Make one (useradd --system postgres), or start Halfmark as an ordinary user.',
    );
  }
  return { uid: Number(uid), gid: Number(gid) };
}

/** A name for the clone at this path that can stand in another path. */
export function cloneKey(folder) {
  return createHash('sha256').update(folder).digest('hex').slice(0, 16);
}

/**
 * Chooses where the cluster lies: in the project where the database's user can walk there, else in a folder of the
 * machine that is named for the path of the clone.
 *
 * @returns {{ home: string, inside: boolean }} `home` exists and belongs to the database's user, mode 700
 */
export function clusterHome(stateFolder, projectRoot, user) {
  const inside = path.join(stateFolder, 'postgres');
  const outside = path.join('/var/lib/halfmark', cloneKey(projectRoot));
  if (user === null || canReach(stateFolder, user)) return { home: own(inside, user), inside: true };
  if (existsSync(path.join(inside, 'data', 'PG_VERSION'))) {
    throw new Failure(
      `The user "postgres" can no longer reach the database in ${inside}.`,
      `Let others walk the folders above it again (chmod o+x), or move it to ${outside} (cp -a, as root).`,
    );
  }
  mkdirSync(path.dirname(outside), { recursive: true, mode: 0o755 });
  return { home: own(outside, user), inside: false };
}

/** The major version that made the cluster, or null where there is none yet. */
export function clusterVersion(home) {
  const file = path.join(home, 'data', 'PG_VERSION');
  return existsSync(file) ? Number(readFileSync(file, 'utf8').trim()) : null;
}

/** Whether the user can walk to this folder; asked of the system, which knows of more than mode bits. */
export function canReach(folder, user) {
  const { status } = spawnSync('/bin/sh', ['-c', 'cd "$1"', 'sh', folder], { ...user, cwd: '/', stdio: 'ignore' });
  return status === 0;
}

function own(folder, user) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const { uid, mode } = statSync(folder);
  const owner = user?.uid ?? process.getuid?.() ?? uid;
  if (uid !== owner && clusterVersion(folder) === null && user !== null) chownSync(folder, user.uid, user.gid);
  else if (uid !== owner) {
    throw new Failure(
      `${folder} belongs to another user (number ${uid}).`,
      'Start as the user who started first, or move it aside to begin anew.',
    );
  }
  if ((mode & 0o077) !== 0) throw new Failure(`${folder} can be read by others.`, `Run: chmod 700 ${folder}`);
  return folder;
}
