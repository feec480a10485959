import { ensureBuild } from '../../scripts/ground/build.mjs';
import { ensureChromium } from '../../scripts/ground/chromium.mjs';
import { makeStateFolder } from '../../scripts/ground/folders.mjs';
import { openTestDatabase } from '../../scripts/ground/test-database.mjs';

/**
 * Runs a benchmark with what it needs: the production build, a PostgreSQL server of its own and a browser, all gone
 * afterwards, however it ends.
 *
 * @param {() => Promise<void>} work reads HALFMARK_TEST_DATABASE_URL and HALFMARK_CHROMIUM
 */
export async function withHalfmark(work) {
  const say = (line) => console.error(line);
  makeStateFolder();
  process.env.HALFMARK_CHROMIUM = await ensureChromium(say);
  await ensureBuild(say, { onStart: () => undefined, mayReplace: () => null });
  const database = await openTestDatabase(say);
  const stop = () => void database.stop().then(() => process.exit(130));
  process.once('SIGINT', stop);
  process.once('SIGTERM', stop);
  process.env.HALFMARK_TEST_DATABASE_URL = database.url;
  try {
    await work();
  } finally {
    process.off('SIGINT', stop);
    process.off('SIGTERM', stop);
    await database.stop();
  }
}
