import { describe, expect, it } from 'vitest';
import { markingAgreement, type MarkedTwice } from '@/lib/statistics/marking-agreement';

const repeat = (count: number, one: number, other: number): MarkedTwice[] =>
  Array.from({ length: count }, () => ({ one, other, outOf: 2000 }));

describe('the agreement of two markings', () => {
  it('has the figures of a two-by-two table worked by hand, with shares of credit as categories', () => {
    // 20, 5, 10, 15 of 50: observed 0.7, by chance 0.5, kappa 0.4 by hand; Wilson's interval of 35/50 by hand too.
    const pairs = [...repeat(20, 2000, 2000), ...repeat(5, 2000, 0), ...repeat(10, 0, 2000), ...repeat(15, 0, 0)];
    const { kappa, agreement, meanDifference, weight, kappaIntervalHolds } = markingAgreement(pairs);
    expect(kappa).toMatchObject({ defined: true, pairs: 50 });
    expect(kappa.defined && kappa.kappa).toBeCloseTo(0.4, 12);
    expect(agreement?.share).toBeCloseTo(0.7, 12);
    expect(agreement?.interval.lower).toBeCloseTo(0.5625, 3);
    expect(agreement?.interval.upper).toBeCloseTo(0.809, 3);
    expect(meanDifference).toBeCloseTo(-0.1, 12);
    expect({ weight, kappaIntervalHolds }).toEqual({ weight: 'enough', kappaIntervalHolds: true });
  });

  it('counts the same share of different full credits as one category', () => {
    const { kappa } = markingAgreement([
      { one: 500, other: 500, outOf: 1000 },
      { one: 1500, other: 1500, outOf: 3000 },
    ]);
    expect(kappa).toMatchObject({ defined: false, why: 'chance agreement is 1' });
  });

  it('has no kappa and no NaN where chance alone agrees', () => {
    const all = markingAgreement(repeat(5, 1000, 1000));
    expect(all.kappa.defined).toBe(false);
    expect(all.agreement?.share).toBe(1);
    expect(all.agreement?.interval.lower).toBeLessThan(0.6);
    expect(all.weight).toBe('very few');
    expect(JSON.stringify(all)).not.toContain('NaN');
  });

  it('claims no interval of kappa where all pairs agree, or where they are very few', () => {
    expect(markingAgreement([...repeat(20, 0, 0), ...repeat(20, 2000, 2000)])).toMatchObject({
      kappa: { defined: true, kappa: 1 },
      kappaIntervalHolds: false,
    });
    const fewPairs = [...repeat(3, 0, 0), ...repeat(3, 2000, 2000), ...repeat(1, 0, 2000)];
    expect(markingAgreement(fewPairs).kappaIntervalHolds).toBe(false);
  });

  it('says nothing without pairs', () => {
    expect(markingAgreement([])).toMatchObject({ pairs: 0, agreement: null, meanDifference: null, weight: 'nothing' });
  });
});
