import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';
import { parsePayload, type JobName, type JobPayload } from './jobs';

export type EnqueueOptions = {
  /** The job appears when this transaction commits, and never if it does not. */
  transaction: Transaction;
  /** Not before this time; at once where left out. */
  runAt?: Date;
  /** Smaller runs first; 0 where left out. */
  priority?: number;
  /** Jobs of one queue name run one after another, in the order they were put in. */
  queueName?: string;
  /** A waiting job with this key is replaced instead of a second one being added. */
  jobKey?: string;
  /** How often the job is tried before it is set aside as failed; 8 where left out (over about half an hour). */
  maxAttempts?: number;
};

const usualAttempts = 8;

/**
 * Puts a job into the queue as part of a transaction.
 *
 * @returns the id of the job
 * @throws z.ZodError where the payload does not fit the job
 */
export async function enqueue<Name extends JobName>(
  name: Name,
  payload: JobPayload<Name>,
  { transaction, runAt, priority, queueName, jobKey, maxAttempts = usualAttempts }: EnqueueOptions,
): Promise<string> {
  const rows = await database().query<{ id: string }>(
    `select job.id from graphile_worker.add_job(
       identifier => :name, payload => :payload::json, queue_name => :queueName, run_at => :runAt::timestamptz,
       max_attempts => :maxAttempts, job_key => :jobKey, priority => :priority
     ) as job`,
    {
      type: QueryTypes.SELECT,
      transaction,
      replacements: {
        name,
        payload: JSON.stringify(parsePayload(name, payload)),
        queueName: queueName ?? null,
        runAt: runAt?.toISOString() ?? null,
        maxAttempts,
        jobKey: jobKey ?? null,
        priority: priority ?? null,
      },
    },
  );
  const job = rows[0];
  if (!job) throw new Error(`The queue took no job ${name}.`);
  return String(job.id);
}
