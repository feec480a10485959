/*
 * `npm run migrate`: brings the database up to date. With DATABASE_URL it is that database; without, the database of
 * this clone, started for the purpose.
 */
import { existsSync } from 'node:fs';
import { migrate } from './ground/database-steps.mjs';
import { Failure, report } from './ground/failure.mjs';
import { inState, makeStateFolder, projectRoot } from './ground/folders.mjs';
import { openOwnDatabase } from './ground/own-database.mjs';
import { ensurePackages } from './ground/packages.mjs';
import { takeLock } from './ground/run-lock.mjs';
import { readSettings } from './ground/settings.mjs';
import { shutDownInOrder } from './ground/shut-down.mjs';

const end = shutDownInOrder({ codeAfterSignal: 130 });
const say = (line) => console.log(line);

try {
  const file = `${projectRoot}/.env`;
  if (existsSync(file)) process.loadEnvFile(file);
  const { databaseUrl } = readSettings(process.env);
  makeStateFolder();
  await ensurePackages(say, end.watchHelper);
  say(await migrate(databaseUrl ?? (await openClone()), end.watchHelper));
  await end.now(0);
} catch (error) {
  if (!end.isEnding()) report(error, projectRoot);
  await end.now(end.isEnding() ? null : 1);
}

async function openClone() {
  const lock = await takeLock(inState('running.json'));
  if ('holder' in lock) {
    throw new Failure(`Halfmark is running from this folder (process ${lock.holder.pid}).`, 'Stop it, then migrate.');
  }
  end.last('lock', () => lock.release());
  const own = await openOwnDatabase(say);
  end.last('database', own.stop);
  return own.url;
}
