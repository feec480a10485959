import { type Verdict } from './verdict';

/** An attempt at a part as the limit counts it. */
export type AttemptMade = {
  /** Null while the answer waits for its verdict. */
  verdict: Verdict | null;
  /** Whether the reader could read it; decides while there is no verdict. */
  readable: boolean;
};

/** Times one part may be handed in altogether, unreadable ones included; a person who gets here needs another's help. */
export const MOST_HAND_INS = 100;

/** How many attempts are used up: all but those that could not be read, which cost nothing. */
export function attemptsSpent(attempts: readonly AttemptMade[]): number {
  return attempts.filter(({ verdict, readable }) => (verdict === null ? readable : verdict !== 'unreadable')).length;
}

/** How many attempts are left of those a set allows; never negative. */
export function attemptsLeft(allowed: number, attempts: readonly AttemptMade[]): number {
  if (attempts.length >= MOST_HAND_INS) return 0;
  return Math.max(0, allowed - attemptsSpent(attempts));
}
