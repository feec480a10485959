import { mkdirSync } from 'node:fs';
import path from 'node:path';

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
 * runs as a user of its own; every secret in it has mode 600.
 */
export function makeStateFolder() {
  mkdirSync(stateFolder, { recursive: true, mode: 0o711 });
  mkdirSync(inState('log'), { recursive: true, mode: 0o700 });
}
