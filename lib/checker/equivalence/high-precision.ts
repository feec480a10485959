import { Flag, type Graph, type Node, Op } from '../algebra/graph';
import {
  type Complex,
  complex,
  cosine,
  D,
  exponential,
  integerPower,
  inverse,
  logarithm,
  piReal,
  plus,
  principalRoot,
  type Real,
  sine,
  size,
  times,
  ZERO_REAL,
} from './complex-decimal';
import { type NumericPoint } from './numeric';

/**
 * Figures carried in two evaluations, as what is rounding in one changes in the other, and the figures that are then
 * trusted: agreement to so many of the largest value met is no difference. The second stage is for what passes the first.
 */
const STAGES = [
  { precisions: [50, 64], trusted: 38 },
  { precisions: [100, 130], trusted: 80 },
] as const;
/** Steps charged to the work limit for one node. */
const STEP_COST = 4000;
/** An imaginary part this small beside a negative real one leaves the side of a branch cut open. */
const ON_CUT = 1e-40;

/**
 * Whether two nodes differ, at the point of the double evaluation, in the first 80 figures of what enters them, by the
 * same amount at two precisions.
 */
export function highPrecisionDifference(point: NumericPoint, x: Node, y: Node): PreciseSides | null {
  for (const { precisions, trusted } of STAGES) {
    const sides = differenceAt(point, x, y, precisions, trusted);
    if (sides) return sides;
  }
  return null;
}

function differenceAt(
  point: NumericPoint,
  x: Node,
  y: Node,
  precisions: readonly number[],
  trusted: number,
): PreciseSides | null {
  const distances: Real[] = [];
  let sides: PreciseSides | null = null;
  for (const precision of precisions) {
    D.set({ precision });
    const evaluation = new HighPrecision(point.graph, point.values);
    const left = evaluation.value(x);
    const right = evaluation.value(y);
    if (!left || !right) return null;
    const distance = size({ re: left.re.minus(right.re), im: left.im.minus(right.im) });
    if (!distance.greaterThan(evaluation.largest.times(new D(10).pow(-trusted)))) return null;
    distances.push(distance);
    sides = { reference: show(left, distance), answer: show(right, distance) };
  }
  const [first, second] = distances;
  const stable = first !== undefined && second !== undefined && first.minus(second).abs().lessThan(second.div(1000));
  return stable ? sides : null;
}

/** Both sides at a witness, in as many figures as show the difference. */
export interface PreciseSides {
  readonly reference: string;
  readonly answer: string;
}

/** A value to three places beyond the first in which it differs. */
function show({ re, im }: Complex, distance: Real): string {
  const places = Math.max(0, -distance.e + 2);
  const text = (x: Real): string => x.toDecimalPlaces(places).toString();
  return im.abs().lessThan(distance.div(100)) ? text(re) : `${text(re)} + ${text(im)} i`;
}

class HighPrecision {
  private readonly known = new Map<Node, Complex | null>();
  /** Largest modulus of any value met: the scale of the rounding errors. */
  largest = new D(1);

  constructor(
    private readonly g: Graph,
    private readonly values: Float64Array,
  ) {}

  /** Null where undefined. */
  value(node: Node): Complex | null {
    const known = this.known.get(node);
    if (known !== undefined) return known;
    this.g.spend(STEP_COST);
    let result = this.compute(node);
    if (result && (!result.re.isFinite() || !result.im.isFinite())) result = null;
    if (result) {
      if (this.g.has(node, Flag.Real)) result = complex(result.re);
      const modulus = size(result);
      if (modulus.greaterThan(this.largest)) this.largest = modulus;
    }
    this.known.set(node, result);
    return result;
  }

  private compute(node: Node): Complex | null {
    const { g } = this;
    const a = g.a[node]!;
    switch (g.op[node]) {
      case Op.Number: {
        const value = g.valueOf(node);
        return complex(new D(value.n.toString()).div(value.d.toString()));
      }
      case Op.Symbol: {
        const solution = g.solved.get(a);
        const given = complex(new D(this.values[a]!));
        if (solution === undefined) return given;
        const root = this.value(solution);
        return root && times(given, root);
      }
      case Op.I:
        return { re: ZERO_REAL, im: new D(1) };
      case Op.Pi:
        return complex(piReal());
      default:
    }
    const x = this.value(a);
    if (!x) return null;
    switch (g.op[node]) {
      case Op.Add: {
        const y = this.value(g.b[node]!);
        return y && plus(x, y);
      }
      case Op.Multiply: {
        const y = this.value(g.b[node]!);
        return y && times(x, y);
      }
      case Op.Power:
        if (g.b[node]! < 0) return size(x).isZero() ? null : integerPower(inverse(x), -g.b[node]!);
        return integerPower(x, g.b[node]!);
      case Op.Root:
        if (isOnCut(x)) return null;
        return principalRoot(x, g.b[node]!);
      case Op.Exp:
        return x.re.abs().greaterThan(1e5) ? null : exponential(x);
      case Op.Ln:
        return size(x).isZero() || isOnCut(x) ? null : logarithm(x);
      case Op.Sin:
        return x.re.abs().greaterThan(1e12) || x.im.abs().greaterThan(1e5) ? null : sine(x);
      case Op.Cos:
        return x.re.abs().greaterThan(1e12) || x.im.abs().greaterThan(1e5) ? null : cosine(x);
      case Op.Abs:
        return complex(x.re.abs());
      default:
        return null;
    }
  }
}

const isOnCut = (x: Complex): boolean =>
  x.re.isNegative() && !x.im.isZero() && x.im.abs().lessThan(x.re.abs().times(ON_CUT));
