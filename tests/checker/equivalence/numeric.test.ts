import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Graph, type Node } from '@/lib/checker/algebra/graph';
import { bigRational } from '@/lib/checker/algebra/rational';
import { add, cos, exp, multiply, power, sin } from '@/lib/checker/algebra/scalars';
import { squareRoot } from '@/lib/checker/algebra/roots';
import { highPrecisionDifference } from '@/lib/checker/equivalence/high-precision';
import { NumericPoint } from '@/lib/checker/equivalence/numeric';

type Build = (g: Graph, x: Node) => Node;

const inverse = (g: Graph, x: Node): Node => (x === g.zero ? g.one : power(g, x, -1));
const huge = (g: Graph, x: Node): Node => multiply(g, g.number(bigRational(10n ** 160n, 1n)), x);

const { build } = fc.letrec<{ build: Build }>((tie) => ({
  build: fc.oneof(
    { depthSize: 'medium' },
    fc.constantFrom<Build>(
      (_, x) => x,
      (g) => g.i,
      (g) => g.integer(3),
      (g) => g.number(bigRational(1n, 3n)),
    ),
    fc.tuple(tie('build'), tie('build')).map(
      ([a, b]): Build =>
        (g, x) =>
          add(g, a(g, x), b(g, x)),
    ),
    fc.tuple(tie('build'), tie('build')).map(
      ([a, b]): Build =>
        (g, x) =>
          multiply(g, a(g, x), b(g, x)),
    ),
    fc
      .tuple(
        fc.constantFrom(sin, cos, exp, squareRoot, inverse, huge, (g: Graph, y: Node) => power(g, y, 3)),
        tie('build'),
      )
      .map(
        ([f, a]): Build =>
          (g, x) =>
            f(g, a(g, x)),
      ),
  ),
}));

describe('the bound on the error of a double evaluation', () => {
  it('covers the distance to the value in a hundred figures', () => {
    fc.assert(
      fc.property(
        build,
        fc.double({ min: -2, max: 2, noNaN: true }).filter((v) => v === 0 || Math.abs(v) > 1e-290),
        (of, value) => {
          const g = Graph.acquire();
          const x = g.variable({ name: 'x', part: 'whole', domain: 'real', low: -Infinity, high: Infinity });
          const node = of(g, x);
          const point = new NumericPoint(g, Float64Array.of(value));
          point.evaluate(node);
          if (!point.isKnown(node)) return;
          // The exact double result as a node: it differs from the true value by no more than the bound.
          const rational = (d: number): Node => g.number(fromDouble(d));
          const computed = add(g, rational(point.re[node]!), multiply(g, g.i, rational(point.im[node]!)));
          const sides = highPrecisionDifference(point, node, computed);
          if (!sides) return;
          const distance = Math.hypot(...parts(sides.reference).map((part, k) => part - parts(sides.answer)[k]!));
          expect(distance).toBeLessThanOrEqual(point.error[node]! + 1e-300 + 1e-15 * distance + tooCoarse(sides));
        },
      ),
      { numRuns: 400 },
    );
  }, 60_000);
});

/** The texts are read back as doubles: their own rounding is not the evaluation's. */
function tooCoarse({ reference }: { reference: string }): number {
  return 2.3e-16 * Math.hypot(...parts(reference));
}

function parts(text: string): [number, number] {
  const [re = '0', im = '0'] = text.replace(' i', '').split(' + ');
  return [Number(re), Number(im)];
}

function fromDouble(d: number): ReturnType<typeof bigRational> {
  if (d === 0) return bigRational(0n, 1n);
  let exponent = 0;
  let mantissa = d;
  while (!Number.isInteger(mantissa) && exponent < 1100) {
    mantissa *= 2;
    exponent++;
  }
  return bigRational(BigInt(mantissa), 1n << BigInt(exponent));
}
