import { createHash } from 'node:crypto';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { type Sequelize } from 'sequelize';
import { database } from '@/lib/db/connection';

const quarterHour = 15 * 60;

/**
 * How many failures are let through in 15 minutes: few for one account, many for one address, since a whole campus may
 * share one. Asking for a reset mail is counted whether or not it "fails", because each may send a mail. Checks over
 * the HTTP interface are counted by caller, each check as one: enough for a big course, too few to keep the threads busy.
 */
export const attemptLimits = {
  'sign-in-account': 10,
  'sign-in-address': 300,
  'reset-account': 3,
  'reset-address': 60,
  checks: 30_000,
} as const;

export type AttemptKind = keyof typeof attemptLimits;

/** A try that was counted before its outcome is known; `forgive` takes it back when it was no failure after all. */
export type CountedAttempt =
  { allowed: true; forgive(): Promise<void> } | { allowed: false; retryAfterSeconds: number };

/** Limiters by connection, so that every test database and every hot reload has its own. */
const limiters = new WeakMap<Sequelize, Map<AttemptKind, RateLimiterPostgres>>();

/**
 * Counts a try, worth one point unless told otherwise, against a key before its outcome is known, so that many tries at once cannot all slip under the limit.
 * The count lies in PostgreSQL and is shared by every web process. Keys are stored hashed.
 */
export async function countAttempt(kind: AttemptKind, key: string, points = 1): Promise<CountedAttempt> {
  const limiter = limiterOf(kind);
  const stored = storedKey(key);
  try {
    await limiter.consume(stored, points);
    return {
      allowed: true,
      forgive: async () => {
        await limiter.reward(stored, points);
      },
    };
  } catch (refusal) {
    if (refusal instanceof RateLimiterRes) {
      return { allowed: false, retryAfterSeconds: Math.ceil(refusal.msBeforeNext / 1000) };
    }
    throw refusal;
  }
}

/** Forgets what was counted against a key: a person who has just set a new password begins anew. */
export async function forgetAttempts(kind: AttemptKind, key: string): Promise<void> {
  await limiterOf(kind).delete(storedKey(key));
}

function storedKey(key: string): string {
  return createHash('sha256').update(key).digest('hex');
}

function limiterOf(kind: AttemptKind): RateLimiterPostgres {
  const storeClient = database();
  const known = limiters.get(storeClient) ?? new Map<AttemptKind, RateLimiterPostgres>();
  limiters.set(storeClient, known);
  const found = known.get(kind);
  if (found !== undefined) return found;
  const limiter = new RateLimiterPostgres({
    storeClient,
    storeType: 'sequelize',
    tableName: 'sign_in_failures',
    tableCreated: true,
    keyPrefix: kind,
    points: attemptLimits[kind],
    duration: quarterHour,
  });
  known.set(kind, limiter);
  return limiter;
}
