import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { verdictOf } from '../kinds/ask';

const symbols = { x: 'real', y: 'positive', n: 'integer', z: 'complex', theta: { between: ['0', 'pi'] } } as const;

/** Scalar expressions in fully bracketed text. */
const { tree: scalar } = fc.letrec<{ tree: string }>((tie) => ({
  tree: fc.oneof(
    { depthSize: 'small', withCrossShrink: true },
    fc.constantFrom('x', 'y', 'z', 'theta', 'i', 'pi', 'hbar', '2', '3', '1/2', '0.25', 'sqrt(2)', '(-1)^n'),
    fc.tuple(tie('tree'), fc.constantFrom('+', '-', '*'), tie('tree')).map(([a, op, b]) => `(${a}${op}${b})`),
    fc.tuple(fc.constantFrom('sin', 'cos', 'exp', 'conj', 'abs'), tie('tree')).map(([f, a]) => `${f}(${a})`),
    fc.tuple(tie('tree'), fc.constantFrom('2', '3')).map(([a, n]) => `(${a})^${n}`),
    tie('tree').map((a) => `sqrt(${a})`),
    tie('tree').map((a) => `((${a})/(1+y^2))`),
  ),
}));

const runs = { numRuns: 400 };
const verdict = (reference: string, answer: string): string => {
  try {
    return verdictOf('scalar', reference, answer, symbols);
  } catch (error) {
    // A random reference may be defined nowhere, as abs(0)^… over a zero; that is an error of the request.
    return (error as Error).message;
  }
};

describe('equality of scalars', { timeout: 60_000 }, () => {
  it('is reflexive', () => {
    fc.assert(
      fc.property(scalar, (a) => ['agrees', 'undecided'].includes(verdict(a, a)) || verdict(a, a).includes('no value')),
      runs,
    );
  });

  it('decides an expression against itself all but always', () => {
    const seen = fc.sample(scalar, { numRuns: 500, seed: 11 }).map((a) => verdict(a, a));
    expect(seen.filter((v) => v === 'undecided').length).toBeLessThan(5);
  });

  it('is symmetric: no pair agrees one way and differs the other', () => {
    fc.assert(
      fc.property(scalar, scalar, (a, b) => {
        const both = [verdict(a, b), verdict(b, a)];
        return !(both.includes('agrees') && both.includes('differs'));
      }),
      runs,
    );
  });

  it('does not change where both sides are scaled, nor where terms and factors change places', () => {
    fc.assert(
      fc.property(scalar, scalar, (a, b) => {
        const wrong = 'differs';
        expect(verdict(`(${a})+(${b})`, `(${b})+(${a})`)).not.toBe(wrong);
        expect(verdict(`(${a})*(${b})`, `(${b})*(${a})`)).not.toBe(wrong);
        expect(verdict(`3*hbar*(${a})`, `hbar*(${a})+2*(${a})*hbar`)).not.toBe(wrong);
        expect(verdict(`((${a})+(${b}))^2`, `(${a})^2+2*(${a})*(${b})+(${b})^2`)).not.toBe(wrong);
      }),
      runs,
    );
  });

  it('sees a change', () => {
    fc.assert(
      fc.property(scalar, (a) => {
        expect(verdict(a, `(${a})+1/7`)).not.toBe('agrees');
        expect(verdict(a, `(${a})+y*x*1e-9`)).not.toBe('agrees');
      }),
      runs,
    );
  });

  it('knows the classical identities of any argument', () => {
    fc.assert(
      fc.property(fc.constantFrom('x', 'y', 'x*y', 'theta', 'x+theta/2', 'sqrt(x^2+y^2)', '2*x-y/3'), (a) => {
        const agree = (left: string, right: string): void => expect(verdict(left, right)).toBe('agrees');
        agree(`sin(${a})^2+cos(${a})^2`, '1');
        agree(`exp(i*(${a}))`, `cos(${a})+i*sin(${a})`);
        agree(`cosh(${a})^2-sinh(${a})^2`, '1');
        agree(`2*sin(${a})*cos(${a})`, `sin(2*(${a}))`);
        agree(`abs(exp(i*(${a})))`, '1');
        agree(`sqrt((${a})^2)`, `abs(${a})`);
        agree(`cos(${a}+n*pi)`, `(-1)^n*cos(${a})`);
        agree(`tan(atan(${a}))`, `${a}`);
      }),
      { numRuns: 30 },
    );
  });
});
