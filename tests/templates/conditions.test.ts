import { describe, expect, it } from 'vitest';
import { conditionHolds } from '@/lib/templates/conditions';

describe('conditionHolds', () => {
  it.each([
    ['n = 3', true],
    ['n != 3', false],
    ['0 < n < 4', true],
    ['0 < n < 3', false],
    ['n <= 3 and m >= -2', true],
    ['n = 2 or m = -2', true],
    ['not n = 3', false],
    ['not (n = 2 or m = 2)', true],
    ['n + m = 1', true],
    ['n^2 - m^2 > 4', true],
    ['q + q = 1', true],
    ['q*2 != 1', false],
    ['r^2 = 2', true],
    ['r = 1.41421356237', false],
    ['r > 1.41421356237', true],
    ['abs(m) = 2', true],
    ['|m| < |n|', true],
    ['cos(pi/n) = 1/2', true],
    ['expectation(sigma_z, ket(+)) = 1', true],
    ['probability(ket(+), ket(+x)) = q', true],
    ['trace(A A) = 2', true],
    ['trace(A) != 0', false],
    ['c = 2 i - i', true],
  ])('says of %s: %s', (condition, value) => {
    const values = { n: '3', m: '-2', q: '1/2', r: 'sqrt(2)', A: 'sigma_x', c: 'i' };
    expect(conditionHolds(condition, values)).toEqual({ ok: true, value });
  });

  it.each(['n >', 'k = 1', 'c < 1', 'n', 'A = 1 +', 'x = 1'])('cannot tell of %s', (condition) => {
    const result = conditionHolds(condition, { n: '3', A: 'sigma_x', c: 'i', x: 'omega' }, [
      { name: 'omega', domain: 'real' },
    ]);
    expect(result).toMatchObject({ ok: false, error: expect.stringMatching(/\S/) as string });
  });
});
