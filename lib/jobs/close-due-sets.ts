import { Op } from 'sequelize';
import { inTransaction } from '@/lib/db/transaction';
import { closeSet } from '@/lib/services/close-problem-set';
import { ProblemSet } from '@/models/problem-set';
import { type JobHandler } from './job-handler';

/**
 * Closes every open set whose closing time has passed, each in a transaction of its own. A set that opens at a planned
 * time needs no job: it takes answers from that time on.
 */
export const closeDueSets: JobHandler<'close-due-sets'> = async (_payload, { signal }) => {
  const due = await ProblemSet.findAll({ where: dueAt(new Date()), attributes: ['id'] });
  for (const { id } of due) {
    signal.throwIfAborted();
    await inTransaction(async (transaction) => {
      const now = new Date();
      // Looked at again while held: its closing time may have been moved, or another worker was faster.
      const set = await ProblemSet.findOne({
        where: { ...dueAt(now), id },
        transaction,
        lock: transaction.LOCK.UPDATE,
      });
      if (set !== null) await closeSet({ actor: { kind: 'system', name: 'close-due-sets' }, transaction, now }, set);
    });
  }
};

function dueAt(now: Date) {
  return { state: 'open' as const, closesAt: { [Op.lte]: now } };
}
