import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  addRational,
  bigRational,
  compareRational,
  invertRational,
  isZero,
  moduloRational,
  multiplyRational,
  powerRational,
  rationalKey,
  toNumber,
} from '@/lib/checker/algebra/rational';

const pair = fc.tuple(fc.bigInt({ min: -(10n ** 30n), max: 10n ** 30n }), fc.bigInt({ min: 1n, max: 10n ** 30n }));
const small = fc.tuple(fc.bigInt({ min: -50n, max: 50n }), fc.bigInt({ min: 1n, max: 50n }));
const either = fc.oneof(pair, small);

describe('exact rationals', () => {
  it('add and multiply as integers over a common denominator do', () => {
    fc.assert(
      fc.property(either, either, ([a, b], [c, d]) => {
        const x = bigRational(a, b);
        const y = bigRational(c, d);
        expect(rationalKey(addRational(x, y))).toBe(rationalKey(bigRational(a * d + c * b, b * d)));
        expect(rationalKey(multiplyRational(x, y))).toBe(rationalKey(bigRational(a * c, b * d)));
        expect(Math.sign(compareRational(x, y))).toBe(a * d === c * b ? 0 : a * d < c * b ? -1 : 1);
        if (!isZero(x)) expect(rationalKey(multiplyRational(x, invertRational(x)))).toBe('1');
      }),
    );
  });

  it('reduce into a period and raise to powers', () => {
    fc.assert(
      fc.property(small, fc.integer({ min: 1, max: 12 }), ([a, b], m) => {
        const x = bigRational(a, b);
        const r = toNumber(moduloRational(x, m));
        expect(r).toBeGreaterThanOrEqual(0);
        expect(r).toBeLessThan(m);
        expect(Number.isInteger(Math.round(((toNumber(x) - r) / m) * 1e9) / 1e9)).toBe(true);
        expect(rationalKey(powerRational(x, 3)!)).toBe(rationalKey(bigRational(a ** 3n, b ** 3n)));
      }),
    );
  });

  it('refuse a power beyond thousands of bits', () => {
    expect(powerRational(bigRational(10n, 1n), 10_000_000)).toBeNull();
  });
});
