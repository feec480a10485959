import { describe, expect, it } from 'vitest';
import { attemptsLeft, attemptsSpent, MOST_HAND_INS, type AttemptMade } from '@/lib/domain/attempts';

const made = (verdict: AttemptMade['verdict'], readable = true): AttemptMade => ({ verdict, readable });

describe('attempts', () => {
  it.each([
    ['agrees', made('agrees'), 1],
    ['differs', made('differs'), 1],
    ['undecided', made('undecided'), 1],
    ['unreadable', made('unreadable'), 0],
    ['unreadable by the verdict, whatever the reader said', made('unreadable', true), 0],
    ['readable by the verdict, whatever the reader said', made('differs', false), 1],
    ['waiting and readable', made(null, true), 1],
    ['waiting and not readable', made(null, false), 0],
  ])('that %s cost %o', (_name, attempt, cost) => {
    expect(attemptsSpent([attempt])).toBe(cost);
  });

  it('are never less than none, also where a set allows fewer than were made', () => {
    expect(attemptsLeft(3, [made('agrees')])).toBe(2);
    expect(attemptsLeft(1, [made('agrees'), made('agrees')])).toBe(0);
  });

  it('end somewhere, unreadable or not', () => {
    const unreadable = Array.from({ length: MOST_HAND_INS }, () => made('unreadable'));
    expect(attemptsLeft(3, unreadable.slice(1))).toBe(3);
    expect(attemptsLeft(3, unreadable)).toBe(0);
  });
});
