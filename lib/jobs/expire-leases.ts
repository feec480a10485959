import { inTransaction } from '@/lib/db/transaction';
import { log } from '@/lib/log';
import { expireLeases as putBack } from '@/lib/services/expire-leases';
import type { JobHandler } from './job-handler';

/** Once a minute: items whose grader gave no sign of life go back to the queue. */
export const expireLeases: JobHandler<'expire-leases'> = async () => {
  const count = await inTransaction((transaction) =>
    putBack({ actor: { kind: 'system', name: 'expire-leases' }, transaction, now: new Date() }),
  );
  if (count > 0) log.info({ count }, 'leases ran out');
};
