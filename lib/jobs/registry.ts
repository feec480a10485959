import { checkAnswers } from './check-answers';
import { closeDueSets } from './close-due-sets';
import { commitIntake } from './commit-intake';
import { doubtDeliveries } from './doubt-deliveries';
import { expireLeases } from './expire-leases';
import { type JobHandlers } from './job-handler';
import { parseIntake } from './parse-intake';
import { sendAccountMail } from './send-account-mail';
import { sendScoreReport } from './send-score-report';

/**
 * The handler of every job. A job whose handler is missing here stays in the queue until a worker has one.
 */
export const jobHandlers: JobHandlers = {
  'check-answers': checkAnswers,
  'close-due-sets': closeDueSets,
  'commit-intake': commitIntake,
  'doubt-deliveries': doubtDeliveries,
  'expire-leases': expireLeases,
  'parse-intake': parseIntake,
  'send-account-mail': sendAccountMail,
  'send-score-report': sendScoreReport,
};

/** Jobs that the clock puts into the queue: minute, hour, day of month, month, day of week (UTC). */
export const recurringJobs = [
  { name: 'expire-leases', at: '* * * * *' },
  { name: 'close-due-sets', at: '* * * * *' },
  { name: 'doubt-deliveries', at: '* * * * *' },
] as const;
