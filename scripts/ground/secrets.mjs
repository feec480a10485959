import { randomBytes } from 'node:crypto';
import { chmodSync } from 'node:fs';
import { readJson, writeJson } from './files.mjs';
import { inState } from './folders.mjs';

/**
 * The secrets of this clone, made at the first start and kept in a file that only its owner may read.
 *
 * @returns {{ superuserPassword: string, databasePassword: string, sessionSecret: string }}
 */
export function secrets() {
  const file = inState('secrets.json');
  const kept = readJson(file);
  const all = {
    superuserPassword: kept?.superuserPassword ?? newSecret(),
    databasePassword: kept?.databasePassword ?? newSecret(),
    sessionSecret: kept?.sessionSecret ?? newSecret(),
  };
  if (kept === null || Object.keys(all).some((name) => kept[name] !== all[name])) writeJson(file, all);
  else chmodSync(file, 0o600);
  return all;
}

/** 256 random bits in letters, digits, - and _, which need no quoting in an address. */
export function newSecret() {
  return randomBytes(32).toString('base64url');
}
