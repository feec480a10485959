import { mkdirSync, statSync } from 'node:fs';
import path from 'node:path';
import { Failure } from './failure.mjs';

/** The folder of the project: where package.json stands. */
export const projectRoot = path.resolve(import.meta.dirname, '..', '..');

/** What this clone keeps for itself, ignored by git: secrets, logs, mail, stamps and (where it can) the database. */
export const stateFolder = path.join(projectRoot, '.halfmark');

/** A path inside the state folder. */
export function inState(...names) {
  return path.join(stateFolder, ...names);
}

/**
 * Makes the state folder. It can be walked through but not listed by others (mode 711), because the database inside it
 * runs as a user of its own; every secret in it has mode 600. Files of two users in it would lock one of them out, so it
 * serves the user who made it.
 */
export function makeStateFolder() {
  mkdirSync(stateFolder, { recursive: true, mode: 0o711 });
  const { uid } = statSync(stateFolder);
  if (process.getuid && uid !== process.getuid()) {
    throw new Failure(
      `${stateFolder} belongs to another user (number ${uid}), who started Halfmark here first.`,
      'Start as that user, or move it aside to begin anew.',
    );
  }
  mkdirSync(inState('log'), { recursive: true, mode: 0o700 });
}
