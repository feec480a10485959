import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';
import { readMigrationStatus } from '@/lib/db/migration-status';
import { environment } from '@/lib/env';
import { log } from '@/lib/log';

/** Whether each thing that serving people needs is there. */
export type Readiness = { environment: boolean; database: boolean; migrations: boolean; queue: boolean };

const patienceMs = 5_000;

/** Asks the database and the queue, and looks whether the schema is the one this Halfmark was written for. */
export async function readReadiness(): Promise<Readiness> {
  const isFit = await holds('environment', () => Promise.resolve(environment() !== null));
  const answers = isFit && (await holds('database', () => asksWell('select 1')));
  return {
    environment: isFit,
    database: answers,
    migrations:
      answers &&
      (await holds('migrations', async () => {
        const { pending, unknown } = await readMigrationStatus(database());
        return pending.length === 0 && unknown.length === 0;
      })),
    queue: answers && (await holds('queue', () => asksWell('select id from graphile_worker.jobs limit 1'))),
  };
}

async function asksWell(statement: string): Promise<boolean> {
  await database().query(statement, { type: QueryTypes.SELECT });
  return true;
}

async function holds(what: keyof Readiness, ask: () => Promise<boolean>): Promise<boolean> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<never>((_resolve, reject) => {
    timer = setTimeout(() => reject(new Error('No answer in time.')), patienceMs);
  });
  try {
    return await Promise.race([ask(), late]);
  } catch (error) {
    log.warn({ what, err: error }, 'not ready');
    return false;
  } finally {
    clearTimeout(timer);
  }
}
