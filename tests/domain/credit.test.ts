import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dividePoints, formatCredit, parseCredit, shareOfCredit, sumCredits } from '@/lib/domain/credit';

describe('credit in thousandths', () => {
  it('rounds half away from zero, once', () => {
    expect(shareOfCredit(1, 1, 2)).toBe(1);
    expect(shareOfCredit(3, 1, 2)).toBe(2);
    expect(shareOfCredit(-1, 1, 2)).toBe(-1);
    expect(shareOfCredit(5000, 2, 3)).toBe(3333);
    expect(shareOfCredit(4000, 500, 1000)).toBe(2000);
  });

  it('refuses fractions and a denominator that is not positive', () => {
    expect(() => shareOfCredit(0.5, 1, 2)).toThrow(RangeError);
    expect(() => shareOfCredit(1, 1, 0)).toThrow(RangeError);
  });

  it('writes and reads marks', () => {
    expect(formatCredit(3000)).toBe('3');
    expect(formatCredit(2500)).toBe('2.5');
    expect(formatCredit(333)).toBe('0.333');
    expect(formatCredit(-500)).toBe('−0.5');
    expect(parseCredit(' 2.5 ')).toBe(2500);
    for (const bad of ['', '2,5', '-1', '1.2345', '1e3', 'three']) expect(parseCredit(bad)).toBeNull();
  });

  it('reads back what it writes', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 999_999_999 }), (credit) => {
        expect(parseCredit(formatCredit(credit))).toBe(credit);
      }),
    );
  });

  it('divides points so that the parts add up to the item', () => {
    expect(dividePoints(10_000, [1, 1, 1])).toEqual([3333, 3333, 3334]);
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 1_000_000 }),
        fc.array(fc.integer({ min: 1, max: 1000 }), { minLength: 1, maxLength: 12 }),
        (points, weights) => {
          expect(sumCredits(dividePoints(points, weights))).toBe(points);
        },
      ),
    );
    expect(() => dividePoints(1000, [0, 0])).toThrow(RangeError);
  });
});
