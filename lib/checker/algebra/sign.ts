import { Flag, type Graph, type Node, Op } from './graph';
import { toNumber } from './rational';

interface Interval {
  readonly low: number;
  readonly high: number;
}

const EVERYTHING: Interval = { low: -Infinity, high: Infinity };
/** Rounding allowance of the interval ends, relative to their size. */
const SLACK = 1e-13;

/**
 * Sign of a real node over the whole domain: 1 where it is nowhere negative, −1 where nowhere positive, 0 where
 * neither is known. Flags first; then interval arithmetic (Moore 1966) over the domains of the variables.
 */
export function signOf(g: Graph, node: Node): -1 | 0 | 1 {
  const flags = g.flags[node]!;
  if (flags & Flag.NonNegative) return 1;
  if (flags & Flag.NonPositive) return -1;
  if (!(flags & Flag.Real)) return 0;
  const { low, high } = intervalOf(g, node, 0);
  const slack = SLACK * Math.min(1, Math.max(Math.abs(low), Math.abs(high)));
  if (low >= -slack) return 1;
  return high <= slack ? -1 : 0;
}

function intervalOf(g: Graph, node: Node, depth: number): Interval {
  if (!g.has(node, Flag.Real) || depth > 60) return EVERYTHING;
  g.spend(1);
  return clampToFlags(g, node, enclosure(g, node, depth + 1));
}

function clampToFlags(g: Graph, node: Node, { low, high }: Interval): Interval {
  return {
    low: g.has(node, Flag.NonNegative) ? Math.max(low, 0) : low,
    high: g.has(node, Flag.NonPositive) ? Math.min(high, 0) : high,
  };
}

function enclosure(g: Graph, node: Node, depth: number): Interval {
  const a = g.a[node]!;
  const b = g.b[node]!;
  switch (g.op[node]) {
    case Op.Number: {
      const value = toNumber(g.valueOf(node));
      return { low: value, high: value };
    }
    case Op.Pi:
      return { low: Math.PI, high: Math.PI };
    case Op.Symbol: {
      const variable = g.variables[a]!;
      return variable.domain === 'between' ? { low: variable.low, high: variable.high } : EVERYTHING;
    }
    case Op.Add: {
      const x = intervalOf(g, a, depth);
      const y = intervalOf(g, b, depth);
      return { low: x.low + y.low, high: x.high + y.high };
    }
    case Op.Multiply:
      return productOf(intervalOf(g, a, depth), intervalOf(g, b, depth));
    case Op.Power:
      return powerOf(intervalOf(g, a, depth), b);
    case Op.Root: {
      const x = intervalOf(g, a, depth);
      return x.low >= 0 ? { low: x.low ** (1 / b), high: x.high ** (1 / b) } : EVERYTHING;
    }
    case Op.Exp: {
      const x = intervalOf(g, a, depth);
      return { low: Math.exp(x.low), high: Math.exp(x.high) };
    }
    case Op.Ln: {
      const x = intervalOf(g, a, depth);
      return x.low >= 0 ? { low: Math.log(x.low), high: Math.log(x.high) } : EVERYTHING;
    }
    case Op.Sin: {
      const x = intervalOf(g, a, depth);
      return cosineOver({ low: x.low - Math.PI / 2, high: x.high - Math.PI / 2 });
    }
    case Op.Cos:
      return cosineOver(intervalOf(g, a, depth));
    case Op.Abs: {
      const x = intervalOf(g, a, depth);
      const high = Math.max(Math.abs(x.low), Math.abs(x.high));
      return { low: x.low > 0 ? x.low : x.high < 0 ? -x.high : 0, high };
    }
    default:
      return EVERYTHING;
  }
}

const timesEnd = (x: number, y: number): number => (x === 0 || y === 0 ? 0 : x * y);

function productOf(x: Interval, y: Interval): Interval {
  const ends = [timesEnd(x.low, y.low), timesEnd(x.low, y.high), timesEnd(x.high, y.low), timesEnd(x.high, y.high)];
  return { low: Math.min(...ends), high: Math.max(...ends) };
}

function powerOf(x: Interval, n: number): Interval {
  if (n < 0) {
    if (x.low < 0 && x.high > 0) return EVERYTHING;
    const inverse = { low: x.high === 0 ? -Infinity : 1 / x.high, high: x.low === 0 ? Infinity : 1 / x.low };
    return powerOf(inverse, -n);
  }
  if (n % 2 === 1) return { low: x.low ** n, high: x.high ** n };
  const high = Math.max(Math.abs(x.low), Math.abs(x.high)) ** n;
  return { low: x.low > 0 ? x.low ** n : x.high < 0 ? x.high ** n : 0, high };
}

/** Range of the cosine over an interval. */
function cosineOver({ low, high }: Interval): Interval {
  if (!(high - low < 2 * Math.PI)) return { low: -1, high: 1 };
  const slack = 1e-12;
  const containsEven = Math.floor((high + slack) / (2 * Math.PI)) >= Math.ceil((low - slack) / (2 * Math.PI));
  const containsOdd =
    Math.floor((high - Math.PI + slack) / (2 * Math.PI)) >= Math.ceil((low - Math.PI - slack) / (2 * Math.PI));
  const ends = [Math.cos(low), Math.cos(high)];
  return { low: containsOdd ? -1 : Math.min(...ends), high: containsEven ? 1 : Math.max(...ends) };
}
