/*
 * `npm run migrate`: brings the database up to date. With DATABASE_URL it is that database; without, the database of
 * this clone, started for the purpose.
 */
import { openCommandDatabase } from './ground/command-database.mjs';
import { migrate } from './ground/database-steps.mjs';
import { report } from './ground/failure.mjs';
import { projectRoot } from './ground/folders.mjs';
import { shutDownInOrder } from './ground/shut-down.mjs';

const end = shutDownInOrder({ codeAfterSignal: 130 });

try {
  const { databaseUrl } = await openCommandDatabase(end, { besideRunning: false });
  console.log(await migrate(databaseUrl, end.watchHelper));
  await end.now(0);
} catch (error) {
  if (!end.isEnding()) report(error, projectRoot);
  await end.now(end.isEnding() ? null : 1);
}
