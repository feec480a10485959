import { chmodSync, chownSync, mkdtempSync, rmSync, existsSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { canReach, databaseUser } from './cluster-folder.mjs';
import { ensureCluster, startCluster } from './cluster.mjs';
import { ensurePostgresPrograms } from './postgres-programs.mjs';
import { newSecret } from './secrets.mjs';

/**
 * A PostgreSQL server for one test run, in a folder of its own that is deleted when the run ends, however it ends.
 *
 * @param {(line: string) => void} say
 * @returns {Promise<{ url: string, stop(): Promise<void> }>} `url` is that of a superuser, who may make databases
 */
export async function openTestDatabase(say) {
  const { folder } = await ensurePostgresPrograms(say);
  const user = databaseUser();
  const temporary = user === null || canReach(os.tmpdir(), user) ? os.tmpdir() : '/tmp';
  const home = mkdtempSync(path.join(temporary, 'halfmark-test-'));
  const remove = () => rmSync(home, { recursive: true, force: true });
  chmodSync(home, 0o700);
  if (user) chownSync(home, user.uid, user.gid);
  const log = path.join(home, 'log');
  const place = { home, user, programs: folder, password: newSecret(), log, throwAway: true };
  try {
    await ensureCluster(place);
    const server = await startCluster(place);
    return {
      url: server.superuserUrl,
      async stop() {
        await server.stop();
        if (existsSync(home)) remove();
      },
    };
  } catch (error) {
    remove();
    throw error;
  }
}
