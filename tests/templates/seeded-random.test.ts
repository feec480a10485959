import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nextWord, seededRandom, splitMix64, type XoshiroState } from '@/lib/templates/seeded-random';

describe('seededRandom', () => {
  it('steps as the published xoshiro128** 1.1 does from the state 1, 2, 3, 4', () => {
    const state: XoshiroState = [1, 2, 3, 4];
    const words = Array.from({ length: 10 }, () => nextWord(state));
    expect(words).toEqual([
      11520, 0, 5927040, 70819200, 2031721883, 1637235492, 1287239034, 3734860849, 3729100597, 4258142804,
    ]);
  });

  it('spreads a seed as the published SplitMix64 does from 1234567', () => {
    const first = splitMix64(1234567n);
    const second = splitMix64(first.counter);
    expect([first.output, second.output]).toEqual([6457827717110365317n, 3203168211198807973n]);
  });

  // Worked out by a separate program in another language; they may never change, or every stored draw would.
  it.each([
    ['', [6, 4, 2, 6, 5, 1, 0, 5]],
    ['a', [5, 0, 5, 1, 5, 3, 5, 6]],
    ['ħω', [2, 2, 5, 4, 2, 2, 0, 4]],
    ['7f3c2a', [6, 4, 4, 2, 2, 1, 2, 6]],
  ])('gives the frozen numbers below 7 for the seed %j', (seed, expected) => {
    const random = seededRandom(seed);
    expect(expected.map(() => random.below(7))).toEqual(expected);
  });

  it('stays below its bound', () => {
    fc.assert(
      fc.property(fc.string(), fc.integer({ min: 1, max: 2 ** 32 }), (seed, bound) => {
        const value = seededRandom(seed).below(bound);
        return Number.isInteger(value) && value >= 0 && value < bound;
      }),
    );
  });

  it('gives each of five values about equally often', () => {
    const random = seededRandom('even');
    const counts = [0, 0, 0, 0, 0];
    for (let draw = 0; draw < 50_000; draw += 1) counts[random.below(5)]! += 1;
    // Five standard deviations of a binomial with p = 1/5 around 10,000.
    for (const count of counts) expect(Math.abs(count - 10_000)).toBeLessThan(5 * Math.sqrt(50_000 * 0.2 * 0.8));
  });

  it('refuses a bound that is no bound', () => {
    expect(() => seededRandom('x').below(0)).toThrow(RangeError);
    expect(() => seededRandom('x').below(1.5)).toThrow(RangeError);
  });
});
