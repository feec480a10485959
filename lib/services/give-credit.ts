import { Answer } from '@/models/answer';
import { CreditEntry, type CreditSource } from '@/models/credit-entry';
import type { Thousandths } from '@/lib/domain/credit';
import { HalfmarkError } from '@/lib/errors';
import type { ServiceContext } from './context';

/** A credit for one answer: how much of how much, what gave it, and why. */
export type CreditInput = {
  answerId: string;
  credit: Thousandths;
  outOf: Thousandths;
  source: CreditSource;
  rulingId?: string;
  reason?: string;
};

/**
 * Adds an entry to the history of an answer's credit and makes it the current one. Nothing is overwritten: the entry
 * follows the one that was current, and the database allows each entry one follower. Callers have authorised.
 */
export async function giveCredit(context: ServiceContext, input: CreditInput): Promise<CreditEntry> {
  const { transaction, actor, now } = context;
  const answer = await Answer.findByPk(input.answerId, { transaction, lock: transaction.LOCK.UPDATE });
  if (!answer) throw new HalfmarkError('not-found', 'That answer is no longer here.');
  const entry = await CreditEntry.create(
    {
      answerId: answer.id,
      credit: input.credit,
      outOf: input.outOf,
      source: input.source,
      rulingId: input.rulingId ?? null,
      actorId: actor.kind === 'user' ? actor.userId : null,
      reason: input.reason ?? '',
      previousEntryId: answer.currentCreditEntryId,
      createdAt: now,
    },
    { transaction },
  );
  await answer.update({ currentCreditEntryId: entry.id }, { transaction });
  return entry;
}
