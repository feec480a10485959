import { BaseError, Transaction } from 'sequelize';
import { database } from './connection';

const isolationLevels = {
  'read committed': Transaction.ISOLATION_LEVELS.READ_COMMITTED,
  'repeatable read': Transaction.ISOLATION_LEVELS.REPEATABLE_READ,
  serializable: Transaction.ISOLATION_LEVELS.SERIALIZABLE,
} as const;

/** serialization_failure and deadlock_detected: the database asks for the whole transaction to be tried again. */
const retryCodes = new Set(['40001', '40P01']);
const MOST_TRIES = 5;

/**
 * Runs `work` in one transaction: all of it is committed, or none of it. Where the database asks for it (deadlock,
 * serialization failure) the whole of `work` is run again, so it must do nothing outside the transaction.
 */
export async function inTransaction<Result>(
  work: (transaction: Transaction) => Promise<Result>,
  isolation: keyof typeof isolationLevels = 'read committed',
): Promise<Result> {
  for (let tries = 1; ; tries += 1) {
    try {
      return await database().transaction({ isolationLevel: isolationLevels[isolation] }, work);
    } catch (error) {
      if (tries >= MOST_TRIES || !asksForRetry(error)) throw error;
      await pause(tries);
    }
  }
}

function asksForRetry(error: unknown): boolean {
  const source: unknown = error instanceof BaseError && 'parent' in error ? error.parent : error;
  return typeof source === 'object' && source !== null && 'code' in source && retryCodes.has(String(source.code));
}

/** Waits a little longer each time, unevenly, so that two that met do not meet again. */
function pause(tries: number): Promise<void> {
  const milliseconds = 10 * 2 ** tries * (0.5 + Math.random());
  return new Promise((resolve) => setTimeout(resolve, milliseconds));
}
