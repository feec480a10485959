import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parse } from '@/lib/checker/notation/parse';
import { type Expression } from '@/lib/checker/notation/tree';
import { evaluateConstant } from '@/lib/templates/evaluate-constant';
import { printExpression } from '@/lib/templates/print-expression';
import { isExpression } from '@/lib/templates/read-text';
import { substitute } from '@/lib/templates/substitute';

const symbols = { n: 'real', m: 'real', omega: 'positive', theta: 'real' } as const;

function read(text: string): Expression {
  const { tree, diagnostics } = parse(text, { kind: 'scalar', symbols, allowReferenceFunctions: true });
  if (tree === null || !isExpression(tree)) throw new Error(`${text}: ${diagnostics[0]?.message ?? 'no expression'}`);
  return tree;
}

const put = (text: string, values: Record<string, string>) =>
  printExpression(substitute(read(text), new Map(Object.entries(values).map(([name, value]) => [name, read(value)]))));

describe('substitute', () => {
  it.each([
    ['n*omega', '-3', '(-3)*omega'],
    ['n omega', '-3', '(-3)*omega'],
    ['omega n', '-3', 'omega*(-3)'],
    ['nω', '2', '2*omega'],
    ['omega^n', '-3', 'omega^(-3)'],
    ['n^2', '-3', '(-3)^(2)'],
    ['-n', '-3', '-(-3)'],
    ['omega - n', '-3', 'omega - (-3)'],
    ['omega/n', '1/2', 'omega/(1/2)'],
    ['omega/2n', '3', 'omega/2*3'],
    ['sin n theta', '-2', 'sin((-2)*theta)'],
    ['sin(n)', '-2', 'sin(-2)'],
    ['n omega', 'theta + 1', '(theta + 1)*omega'],
    ['|n|', '-3', 'abs(-3)'],
    ['expectation(n S_z, |+>)', '-3', 'expectation((-3)*S_z, |+z>)'],
  ])('puts n of %s as %s: %s', (text, value, printed) => {
    expect(put(text, { n: value })).toBe(printed);
  });

  it('puts values in all at once, never into one another', () => {
    expect(put('n + m', { n: 'm', m: '2' })).toBe('m + 2');
  });

  it('leaves other names alone', () => {
    expect(put('omega theta', { n: '3' })).toBe('omega*theta');
  });

  it('agrees with working out the same formula with the numbers in their places', () => {
    fc.assert(
      fc.property(formula(4), fc.integer({ min: -9, max: 9 }), fractions(), (made, n, m) => {
        const expected = made.compute(n, m.value);
        fc.pre(Number.isFinite(expected) && Math.abs(expected) < 1e12);
        // A divisor that is written as zero is refused on reading.
        fc.pre(
          parse(made.text, { kind: 'scalar', symbols }).diagnostics.every(({ code }) => code !== 'division-by-zero'),
        );
        const printed = put(made.text, { n: String(n), m: m.text });
        const value = evaluateConstant(read(printed));
        if (value === null) return false;
        return Math.abs(value.re - expected) <= 1e-9 * Math.max(1, Math.abs(expected)) && Math.abs(value.im) < 1e-9;
      }),
      { numRuns: 2000 },
    );
  });
});

/** A formula as text in several spellings, and the same as a function of its two names. */
type Formula = { text: string; compute: (n: number, m: number) => number };

function formula(depth: number): fc.Arbitrary<Formula> {
  const leaf = fc.oneof(
    fc.constant<Formula>({ text: 'n', compute: (n) => n }),
    fc.constant<Formula>({ text: 'm', compute: (_n, m) => m }),
    fc.integer({ min: 0, max: 5 }).map((value): Formula => ({ text: String(value), compute: () => value })),
  );
  if (depth === 0) return leaf;
  const part = formula(depth - 1);
  const pair = (join: (a: Formula, b: Formula) => Formula) => fc.tuple(part, part).map(([a, b]) => join(a, b));
  return fc.oneof(
    leaf,
    pair((a, b) => ({ text: `${a.text} + ${b.text}`, compute: (n, m) => a.compute(n, m) + b.compute(n, m) })),
    pair((a, b) => ({ text: `${a.text} - (${b.text})`, compute: (n, m) => a.compute(n, m) - b.compute(n, m) })),
    pair((a, b) => ({ text: `(${a.text}) (${b.text})`, compute: (n, m) => a.compute(n, m) * b.compute(n, m) })),
    pair((a, b) => ({ text: `(${a.text})/(${b.text})`, compute: (n, m) => over(a.compute(n, m), b.compute(n, m)) })),
    pair((a, b) => ({
      text: `\\frac{${a.text}}{${b.text}}`,
      compute: (n, m) => over(a.compute(n, m), b.compute(n, m)),
    })),
    part.map((a): Formula => ({ text: `-(${a.text})^2`, compute: (n, m) => -(a.compute(n, m) ** 2) })),
    part.map((a): Formula => ({ text: `cos(${a.text})`, compute: (n, m) => Math.cos(a.compute(n, m)) })),
    part.map((a): Formula => ({ text: `|${a.text}|`, compute: (n, m) => Math.abs(a.compute(n, m)) })),
  );
}

/** Division by zero has no value, wherever it stands in a formula. */
function over(top: number, bottom: number): number {
  return bottom === 0 ? Number.NaN : top / bottom;
}

function fractions(): fc.Arbitrary<{ text: string; value: number }> {
  return fc
    .tuple(fc.integer({ min: -9, max: 9 }), fc.integer({ min: 1, max: 9 }))
    .map(([top, bottom]) => ({ text: `${top}/${bottom}`, value: top / bottom }));
}
