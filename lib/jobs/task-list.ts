import { type JobHelpers, type TaskList } from 'graphile-worker';
import { describeError } from '@/lib/log-scrub';
import { log, withLogContext } from '@/lib/log';
import { isJobName, parsePayload, type JobName } from '@/lib/queue/jobs';
import { type JobHandler, type JobHandlers } from './job-handler';

/** The handlers in the form that the queue calls: payload checked, lines of the log marked with the job. */
export function buildTaskList(handlers: JobHandlers): TaskList {
  const names = Object.keys(handlers).filter(isJobName);
  return Object.fromEntries(
    names.map((name) => [
      name,
      (payload: unknown, helpers: JobHelpers) =>
        withLogContext({ jobId: helpers.job.id, job: name }, () => runJob(name, handlers[name], payload, helpers)),
    ]),
  );
}

async function runJob<Name extends JobName>(
  name: Name,
  handler: JobHandler<Name> | undefined,
  payload: unknown,
  { job, abortSignal }: JobHelpers,
): Promise<void> {
  if (!handler) throw new Error(`There is no handler for ${name}.`);
  const started = performance.now();
  const milliseconds = () => Math.round(performance.now() - started);
  try {
    await handler(parsePayload(name, payload), {
      jobId: job.id,
      attempt: job.attempts,
      isLastAttempt: job.attempts >= job.max_attempts,
      signal: abortSignal ?? new AbortController().signal,
    });
    log.info({ ms: milliseconds(), attempt: job.attempts }, 'job done');
  } catch (error) {
    const failure = describeError(error instanceof Error ? error : new Error('Something that is no error was thrown.'));
    log.error({ ms: milliseconds(), attempt: job.attempts, of: job.max_attempts, err: error }, 'job failed');
    // The queue keeps this text with the job: so it is made from what may stand in a log.
    throw new Error([failure.type, failure.code, failure.message].filter(Boolean).join(': '), { cause: error });
  }
}
