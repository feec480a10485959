import { type JobName, type JobPayload } from '@/lib/queue/jobs';

/** What a handler is told besides its payload. */
export type JobRun = {
  jobId: string;
  /** 1 at the first try. */
  attempt: number;
  /** No further try follows: what must be said to a person is to be said now. */
  isLastAttempt: boolean;
  /** Aborted when the worker has been asked to end: stop at the next safe point by throwing. */
  signal: AbortSignal;
};

/**
 * Does one job. It may be run again after it was cut short at any point, so its effect must be the same when it happens
 * twice: write in one transaction, and look first whether it has been done. Throwing means "try again later".
 */
export type JobHandler<Name extends JobName> = (payload: JobPayload<Name>, run: JobRun) => Promise<void>;

/** The handler of each job there is one for. */
export type JobHandlers = { [Name in JobName]?: JobHandler<Name> };
