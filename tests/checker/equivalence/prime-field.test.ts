import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { FIELD_COUNT, LEAST_PRIME, primeField, ROOT_ORDER } from '@/lib/checker/equivalence/prime-field';

describe('prime fields', () => {
  it('have zeta of the full order, the right i and roots that square to their radicands', () => {
    for (let k = 0; k < FIELD_COUNT; k++) {
      const f = primeField(k);
      expect(f.p).toBeGreaterThanOrEqual(LEAST_PRIME);
      expect(f.p).toBeLessThan(2 ** 26);
      expect(f.power(f.zeta, ROOT_ORDER)).toBe(1);
      for (const q of [2, 3, 5, 7]) expect(f.power(f.zeta, ROOT_ORDER / q)).not.toBe(1);
      expect(f.multiply(f.i, f.i)).toBe(f.p - 1);
      for (const n of [2, 3, 5, 7, 11, 13, 17]) {
        const r = f.rootOfInteger(n, 2);
        expect(r).not.toBeNull();
        expect(f.multiply(r ?? 0, r ?? 0)).toBe(n);
      }
      const fourth = f.rootOfInteger(2, 4);
      if (fourth !== null) expect(f.multiply(fourth, fourth)).toBe(f.rootOfInteger(2, 2));
    }
  });

  it('multiplies, inverts and takes roots as exact integers do', () => {
    fc.assert(
      fc.property(
        fc.nat(2 ** 26 - 1),
        fc.nat(2 ** 26 - 1),
        fc.nat(FIELD_COUNT - 1),
        fc.constantFrom(2, 3, 5, 7, 6, 11),
        (a, b, k, q) => {
          const f = primeField(k);
          const x = a % f.p;
          const y = b % f.p;
          expect(f.multiply(x, y)).toBe(Number((BigInt(x) * BigInt(y)) % BigInt(f.p)));
          if (x !== 0) expect(f.multiply(x, f.invert(x))).toBe(1);
          const power = f.power(x, q);
          const root = f.root(power, q);
          expect(root).not.toBeNull();
          expect(f.power(root ?? -1, q)).toBe(power);
        },
      ),
      { numRuns: 400 },
    );
  });
});
