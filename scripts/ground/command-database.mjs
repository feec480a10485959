import { existsSync } from 'node:fs';
import { Failure } from './failure.mjs';
import { readJson } from './files.mjs';
import { inState, makeStateFolder, projectRoot } from './folders.mjs';
import { openOwnDatabase, ownDatabaseUrl } from './own-database.mjs';
import { ensurePackages } from './packages.mjs';
import { takeLock } from './run-lock.mjs';
import { readSettings } from './settings.mjs';

/**
 * The database that a command works on: that of DATABASE_URL, else this clone's own, started for the purpose where
 * Halfmark is not running.
 *
 * @param {ReturnType<typeof import('./shut-down.mjs').shutDownInOrder>} end
 * @param {{ besideRunning: boolean }} options whether the command may work on a database that is being served
 * @returns {Promise<{ databaseUrl: string, appUrl: string | null }>}
 */
export async function openCommandDatabase(end, { besideRunning }) {
  const say = (line) => console.log(line);
  const file = `${projectRoot}/.env`;
  if (existsSync(file)) process.loadEnvFile(file);
  const { databaseUrl, appUrl } = readSettings(process.env);
  makeStateFolder();
  await ensurePackages(say, end.watchHelper);
  if (databaseUrl !== null) return { databaseUrl, appUrl };

  const lock = await takeLock(inState('running.json'));
  if ('holder' in lock) {
    const { pid, url } = lock.holder;
    const { database: port } = readJson(inState('ports.json'), {});
    if (besideRunning && url && port) return { databaseUrl: ownDatabaseUrl(port), appUrl: appUrl ?? url };
    throw new Failure(`Halfmark is running from this folder (process ${pid}).`, 'Stop it and try again.');
  }
  end.last('lock', () => lock.release());
  const own = await openOwnDatabase(say);
  end.last('database', own.stop);
  return { databaseUrl: own.url, appUrl };
}
