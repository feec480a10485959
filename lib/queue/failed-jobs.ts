import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';

/** A job that was tried as often as it may be and did not succeed. */
export type FailedJob = {
  id: string;
  name: string;
  attempts: number;
  /** What the last try ended with: a sentence of ours or a code, never what a person typed. */
  lastError: string | null;
  createdAt: Date;
  lastTriedAt: Date;
};

/** The jobs that will not be tried again by themselves, latest first. */
export async function listFailedJobs(limit = 100): Promise<FailedJob[]> {
  return database().query<FailedJob>(
    `select id::text as "id", task_identifier as "name", attempts::integer as "attempts", last_error as "lastError",
            created_at as "createdAt", updated_at as "lastTriedAt"
       from graphile_worker.jobs
      where attempts >= max_attempts and locked_at is null
      order by updated_at desc, id desc
      limit :limit`,
    { type: QueryTypes.SELECT, replacements: { limit } },
  );
}

/** Gives a failed job all its tries again, from now. Returns false where there is no such failed job. */
export async function retryFailedJob(id: string, transaction: Transaction): Promise<boolean> {
  const rows = await database().query<{ id: string }>(
    `select (graphile_worker.reschedule_jobs(array[id], run_at => now(), attempts => 0)).id
       from graphile_worker.jobs
      where id = :id::bigint and attempts >= max_attempts and locked_at is null`,
    { type: QueryTypes.SELECT, replacements: { id }, transaction },
  );
  return rows.length > 0;
}

/** How many jobs wait or run, and how many were set aside as failed. */
export async function countJobs(): Promise<{ waiting: number; running: number; failed: number }> {
  const [counts] = await database().query<{ waiting: number; running: number; failed: number }>(
    `select (count(*) filter (where locked_at is null and attempts < max_attempts))::integer as "waiting",
            (count(*) filter (where locked_at is not null))::integer as "running",
            (count(*) filter (where locked_at is null and attempts >= max_attempts))::integer as "failed"
       from graphile_worker.jobs`,
    { type: QueryTypes.SELECT },
  );
  return counts ?? { waiting: 0, running: 0, failed: 0 };
}
