import { checkAnswers } from './check-answers';
import { closeDueSets } from './close-due-sets';
import { type JobHandlers } from './job-handler';
import { sendAccountMail } from './send-account-mail';

/**
 * The handler of every job. A job whose handler is missing here stays in the queue until a worker has one.
 */
export const jobHandlers: JobHandlers = {
  'check-answers': checkAnswers,
  'close-due-sets': closeDueSets,
  'send-account-mail': sendAccountMail,
};

/** Jobs that the clock puts into the queue: minute, hour, day of month, month, day of week (UTC). */
export const recurringJobs = [
  { name: 'expire-leases', at: '* * * * *' },
  { name: 'close-due-sets', at: '* * * * *' },
] as const;
