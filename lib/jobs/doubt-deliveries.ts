import { inTransaction } from '@/lib/db/transaction';
import { log } from '@/lib/log';
import { doubtStaleDeliveries } from '@/lib/services/hand-over-delivery';
import type { JobHandler } from './job-handler';

/** Once a minute: hand-overs of reports whose worker died are put before a person. */
export const doubtDeliveries: JobHandler<'doubt-deliveries'> = async () => {
  const count = await inTransaction((transaction) =>
    doubtStaleDeliveries({ actor: { kind: 'system', name: 'doubt-deliveries' }, transaction, now: new Date() }),
  );
  if (count > 0) log.warn({ count }, 'hand-overs were cut short');
};
