import { inTransaction } from '@/lib/db/transaction';
import { storeIntakeRows } from '@/lib/services/store-intake-rows';
import type { JobHandler } from './job-handler';

/** Rows in one transaction and one checking job: some hundred milliseconds of work, so little is repeated after a kill. */
const CHUNK = 100;

/** Turns an intake's rows into attempts, chunk by chunk; run again, it goes on after the last whole chunk. */
export const commitIntake: JobHandler<'commit-intake'> = async ({ intakeId }, run) => {
  for (let more = true; more;) {
    run.signal.throwIfAborted();
    more = await inTransaction((transaction) =>
      storeIntakeRows(
        { actor: { kind: 'system', name: 'commit-intake' }, transaction, now: new Date() },
        { intakeId, most: CHUNK },
      ),
    );
  }
};
