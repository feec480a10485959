import { describe, expect, it } from 'vitest';
import { wilsonInterval } from '@/lib/statistics/wilson-interval';

/** R. G. Newcombe, Stat. Med. 17 (1998) 857, table I, method 3 (four decimals); longer figures from statsmodels 0.13.5. */
const published = [
  { successes: 81, total: 263, lower: 0.2552885199, upper: 0.366209577 },
  { successes: 15, total: 148, lower: 0.0623863995, upper: 0.1604872417 },
  { successes: 0, total: 20, lower: 0, upper: 0.1611251581 },
  { successes: 1, total: 29, lower: 0.0061132143, upper: 0.1717552188 },
];

describe('Wilson’s interval', () => {
  it.each(published)('of $successes in $total', ({ successes, total, lower, upper }) => {
    const interval = wilsonInterval(successes, total);
    expect(interval?.lower).toBeCloseTo(lower, 9);
    expect(interval?.upper).toBeCloseTo(upper, 9);
  });

  it('says nothing of nothing, and refuses what is no proportion', () => {
    expect(wilsonInterval(0, 0)).toBeNull();
    expect(() => wilsonInterval(3, 2)).toThrow(RangeError);
    expect(wilsonInterval(5, 5)?.upper).toBe(1);
  });
});
