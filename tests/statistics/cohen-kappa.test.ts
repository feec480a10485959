import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cohenKappa, linearWeights, quadraticWeights, type Kappa } from '@/lib/statistics/cohen-kappa';
import { contingencyTable } from '@/lib/statistics/contingency-table';
import examples from './published/kappa.json';

function figure(table: number[][], name: string): number {
  const of = (kappa: Kappa) => {
    if (!kappa.defined) throw new Error('Every published example is defined.');
    return kappa;
  };
  switch (name) {
    case 'kappa':
      return of(cohenKappa(table)).kappa;
    case 'standardError':
      return of(cohenKappa(table)).standardError;
    case 'lower':
      return of(cohenKappa(table)).interval.lower;
    case 'upper':
      return of(cohenKappa(table)).interval.upper;
    case 'linear':
      return of(cohenKappa(table, linearWeights)).kappa;
    case 'quadratic':
      return of(cohenKappa(table, quadraticWeights)).kappa;
    default:
      throw new RangeError(`No such figure: ${name}`);
  }
}

describe('Cohen’s kappa', () => {
  it.each(examples)('is as published and as computed elsewhere: $id', ({ table, published, computed }) => {
    for (const [name, [value, tolerance]] of Object.entries(published) as [string, [number, number]][]) {
      expect(Math.abs(figure(table, name) - value), `${name} as published`).toBeLessThanOrEqual(tolerance);
    }
    for (const [name, value] of Object.entries(computed) as [string, number][]) {
      expect(Math.abs(figure(table, name) - value), `${name} as computed`).toBeLessThan(1e-6);
    }
  });

  it('is not defined without pairs, and where chance alone always agrees', () => {
    expect(
      cohenKappa([
        [0, 0],
        [0, 0],
      ]),
    ).toMatchObject({ defined: false, why: 'no pairs' });
    expect(
      cohenKappa([
        [7, 0],
        [0, 0],
      ]),
    ).toMatchObject({ defined: false, why: 'chance agreement is 1', observed: 1 });
  });

  const table = fc
    .integer({ min: 2, max: 5 })
    .chain((size) =>
      fc.array(fc.array(fc.nat(30), { minLength: size, maxLength: size }), { minLength: size, maxLength: size }),
    );

  it('does not change when both raters’ categories are renamed alike, and stays between −1 and 1', () => {
    fc.assert(
      fc.property(table, (counts) => {
        const reversed = counts.map((row) => [...row].reverse()).reverse();
        const before = cohenKappa(counts);
        const after = cohenKappa(reversed);
        expect(after.defined).toBe(before.defined);
        if (!before.defined || !after.defined) return;
        expect(after.kappa).toBeCloseTo(before.kappa, 10);
        expect(after.standardError).toBeCloseTo(before.standardError, 10);
        expect(before.kappa).toBeLessThanOrEqual(1);
        expect(before.kappa).toBeGreaterThanOrEqual(-1);
      }),
    );
  });

  it('is 1 for perfect agreement and 0 for independence', () => {
    expect(
      cohenKappa([
        [3, 0],
        [0, 5],
      ]),
    ).toMatchObject({ kappa: 1, standardError: 0 });
    const independent = cohenKappa([
      [4, 8],
      [6, 12],
    ]);
    expect(independent.defined && Math.abs(independent.kappa) < 1e-12).toBe(true);
  });

  it('counts pairs by category', () => {
    expect(
      contingencyTable(
        [
          [0, 0],
          [0, 2],
          [2, 2],
        ] as const,
        [0, 1, 2],
      ),
    ).toEqual([
      [1, 0, 1],
      [0, 0, 0],
      [0, 0, 1],
    ]);
    expect(() => contingencyTable([[0, 3]], [0, 1])).toThrow(RangeError);
  });
});
