import { QuietError } from './quiet-error';
import { BudgetExceeded, Flag, type Graph, MAXIMUM_EXPONENT, type Node, Op, POSITIVE } from './graph';
import {
  addRational,
  invertRational,
  isNegative,
  isOne,
  isZero,
  MINUS_ONE,
  multiplyRational,
  negateRational,
  ONE,
  powerRational,
  type Rational,
  TWO,
  ZERO,
} from './rational';

/**
 * Constructors of scalar nodes that simplify as they build: numbers fold, a product is (number)(i)(rest), equal factors
 * become powers, equal terms add. Every rewriting here holds at every point where both sides are defined.
 */

/** Thrown where a value is defined nowhere: 1/0, the logarithm of 0, the inverse of a singular operator. */
export class DefinedNowhere extends QuietError {}

/** The numeric coefficient and the rest of a product; the rest of a number is 1. */
function coefficientOf(g: Graph, node: Node): Rational {
  if (g.isNumber(node)) return g.valueOf(node);
  if (g.op[node] === Op.Multiply && g.isNumber(g.a[node]!)) return g.valueOf(g.a[node]!);
  return ONE;
}

function withoutCoefficient(g: Graph, node: Node): Node {
  if (g.isNumber(node)) return g.one;
  if (g.op[node] === Op.Multiply && g.isNumber(g.a[node]!)) return g.b[node]!;
  return node;
}

export { coefficientOf, withoutCoefficient };

export function add(g: Graph, x: Node, y: Node): Node {
  if (x === g.zero) return y;
  if (y === g.zero) return x;
  if (g.isNumber(x) && g.isNumber(y)) return g.number(addRational(g.valueOf(x), g.valueOf(y)));
  const restX = withoutCoefficient(g, x);
  if (restX === withoutCoefficient(g, y)) {
    return scale(g, addRational(coefficientOf(g, x), coefficientOf(g, y)), restX);
  }
  const fx = g.flags[x]!;
  const fy = g.flags[y]!;
  let flags = fx & fy & (Flag.Real | Flag.NonNegative | Flag.NonPositive | Flag.Imaginary);
  if (flags & (Flag.NonNegative | Flag.NonPositive) && (fx | fy) & Flag.NonZero) flags |= Flag.NonZero;
  return x < y ? g.node(Op.Add, x, y, flags) : g.node(Op.Add, y, x, flags);
}

export function sum(g: Graph, nodes: readonly Node[]): Node {
  let total = g.zero;
  for (const node of nodes) total = add(g, total, node);
  return total;
}

export const negate = (g: Graph, x: Node): Node => scale(g, MINUS_ONE, x);
export const subtract = (g: Graph, x: Node, y: Node): Node => add(g, x, negate(g, y));

/** c·x for a rational c. */
export function scale(g: Graph, c: Rational, x: Node): Node {
  if (isZero(c)) return g.zero;
  if (isOne(c)) return x;
  if (g.isNumber(x)) return g.number(multiplyRational(c, g.valueOf(x)));
  if (g.op[x] === Op.Multiply && g.isNumber(g.a[x]!)) {
    return scale(g, multiplyRational(c, g.valueOf(g.a[x]!)), g.b[x]!);
  }
  return rawProduct(g, g.number(c), x);
}

export function multiply(g: Graph, x: Node, y: Node): Node {
  if (x === g.zero || y === g.zero) return g.zero;
  if (g.isNumber(x)) return scale(g, g.valueOf(x), y);
  if (g.isNumber(y)) return scale(g, g.valueOf(y), x);
  let c = multiplyRational(coefficientOf(g, x), coefficientOf(g, y));
  let restX = withoutCoefficient(g, x);
  let restY = withoutCoefficient(g, y);
  let turns = 0;
  if (hasI(g, restX)) {
    turns++;
    restX = withoutI(g, restX);
  }
  if (hasI(g, restY)) {
    turns++;
    restY = withoutI(g, restY);
  }
  if (turns === 2) c = negateRational(c);
  let product = restProduct(g, restX, restY);
  if (g.isNumber(product) || g.op[product] === Op.Multiply) {
    c = multiplyRational(c, coefficientOf(g, product));
    product = withoutCoefficient(g, product);
  }
  if (turns === 1) product = product === g.one ? g.i : rawProduct(g, g.i, product);
  return scale(g, c, product);
}

export function product(g: Graph, nodes: readonly Node[]): Node {
  let total = g.one;
  for (const node of nodes) total = multiply(g, total, node);
  return total;
}

export const divide = (g: Graph, x: Node, y: Node): Node => multiply(g, x, power(g, y, -1));

/** x to an integer power. */
export function power(g: Graph, x: Node, n: number): Node {
  if (n === 1) return x;
  if (n === 0) return g.one;
  if (Math.abs(n) > MAXIMUM_EXPONENT) throw new BudgetExceeded('exponent');
  if (x === g.zero) {
    if (n < 0) throw new DefinedNowhere('division by zero');
    return g.zero;
  }
  switch (g.op[x]) {
    case Op.Number: {
      const folded = powerRational(g.valueOf(x), n);
      return folded ? g.number(folded) : g.node(Op.Power, x, n, powerFlags(g.flags[x]!, n));
    }
    case Op.I: {
      const turn = ((n % 4) + 4) % 4;
      return turn === 0 ? g.one : turn === 1 ? g.i : turn === 2 ? g.number(MINUS_ONE) : negate(g, g.i);
    }
    case Op.Multiply:
      return multiply(g, power(g, g.a[x]!, n), power(g, g.b[x]!, n));
    case Op.Power:
      return power(g, g.a[x]!, g.b[x]! * n);
    case Op.Root: {
      const q = g.b[x]!;
      const whole = Math.floor(n / q);
      const rest = n - whole * q;
      if (whole === 0) break;
      const outside = power(g, g.a[x]!, whole);
      return rest === 0 ? outside : multiply(g, outside, power(g, x, rest));
    }
    case Op.Exp:
      return exp(g, scale(g, { n, d: 1, big: false }, g.a[x]!));
    case Op.Abs:
      if (n % 2 === 0) return power(g, g.a[x]!, n);
      break;
    default:
  }
  return g.node(Op.Power, x, n, powerFlags(g.flags[x]!, n));
}

/** eˣ. */
export function exp(g: Graph, x: Node): Node {
  if (x === g.zero) return g.one;
  if (g.op[x] === Op.Ln) return g.a[x]!;
  const turns = turnsOf(g, x);
  if (turns) {
    const known = cosineOfTurns(g, turns);
    if (known !== null) return add(g, known, multiply(g, g.i, sineOfTurns(g, turns) ?? g.zero));
  }
  const flags = g.flags[x]! & Flag.Real ? POSITIVE : Flag.NonZero;
  return g.node(Op.Exp, x, 0, flags);
}

/** The rational c where x = c·i·π, or null. */
export function turnsOf(g: Graph, x: Node): Rational | null {
  const rest = withoutCoefficient(g, x);
  if (g.op[rest] !== Op.Multiply || g.a[rest] !== g.i || g.op[g.b[rest]!] !== Op.Pi) return null;
  return coefficientOf(g, x);
}

/** The rational c where x = c·π, or null. */
function halfTurnsOf(g: Graph, x: Node): Rational | null {
  return g.op[withoutCoefficient(g, x)] === Op.Pi ? coefficientOf(g, x) : null;
}

export function cos(g: Graph, x: Node): Node {
  if (x === g.zero) return g.one;
  const turns = halfTurnsOf(g, x);
  const known = turns && cosineOfTurns(g, turns);
  if (known !== null) return known;
  if (g.op[x] === Op.Abs) return cos(g, g.a[x]!);
  const even = isNegative(coefficientOf(g, x)) ? negate(g, x) : x;
  return g.node(Op.Cos, even, 0, g.flags[x]! & (Flag.Real | Flag.Imaginary) ? Flag.Real : 0);
}

export function sin(g: Graph, x: Node): Node {
  if (x === g.zero) return g.zero;
  const turns = halfTurnsOf(g, x);
  const known = turns && sineOfTurns(g, turns);
  if (known !== null) return known;
  if (isNegative(coefficientOf(g, x))) return negate(g, sin(g, negate(g, x)));
  return g.node(Op.Sin, x, 0, g.flags[x]! & (Flag.Real | Flag.Imaginary));
}

/** sin(cπ) where it is a multiple of 0, 1/2, √2/2, √3/2, 1; else null. */
function sineOfTurns(g: Graph, c: Rational): Node | null {
  return cosineOfTurns(g, addRational(c, { n: -1, d: 2, big: false }));
}

function cosineOfTurns(g: Graph, c: Rational): Node | null {
  if (c.big || c.d > 6 || c.d === 5) return null;
  // In twelfths of a half turn, folded into the first quarter.
  let twelfths = (((c.n * (12 / c.d)) % 24) + 24) % 24;
  if (twelfths > 12) twelfths = 24 - twelfths;
  const sign = twelfths > 6 ? -1 : 1;
  if (sign < 0) twelfths = 12 - twelfths;
  switch (twelfths) {
    case 0:
      return g.integer(sign);
    case 2:
      return scale(g, { n: sign, d: 2, big: false }, rootOfPrime(g, 3));
    case 3:
      return scale(g, { n: sign, d: 2, big: false }, rootOfPrime(g, 2));
    case 4:
      return g.number({ n: sign, d: 2, big: false });
    case 6:
      return g.zero;
    default:
      return null;
  }
}

/** √p as a node, for a prime p. */
export const rootOfPrime = (g: Graph, p: number): Node => g.node(Op.Root, g.integer(p), 2, POSITIVE);

export const pi = (g: Graph): Node => g.node(Op.Pi, 0, 0, POSITIVE);

export const isImaginaryUnitTimes = (g: Graph, node: Node): boolean => hasI(g, node);

function hasI(g: Graph, node: Node): boolean {
  return node === g.i || (g.op[node] === Op.Multiply && g.a[node] === g.i);
}

function withoutI(g: Graph, node: Node): Node {
  return node === g.i ? g.one : g.b[node]!;
}

/** Product of two nodes without numeric coefficient and without i. */
function restProduct(g: Graph, x: Node, y: Node): Node {
  if (x === g.one) return y;
  if (y === g.one) return x;
  const baseX = baseOf(g, x);
  const baseY = baseOf(g, y);
  if (baseX === baseY) return power(g, baseX, exponentOf(g, x) + exponentOf(g, y));
  // Merge into a product that already holds the base, so that a·b·a is a²·b and a·b/a is b.
  if (g.op[y] === Op.Multiply && g.op[x] !== Op.Multiply) return mergeInto(g, y, x);
  if (g.op[x] === Op.Multiply && g.op[y] !== Op.Multiply) return mergeInto(g, x, y);
  if (g.op[x] === Op.Multiply) return multiply(g, multiply(g, x, g.a[y]!), g.b[y]!);
  return rawProduct(g, x, y);
}

function mergeInto(g: Graph, chain: Node, factor: Node): Node {
  const base = baseOf(g, factor);
  let holds = false;
  for (let at: Node = chain; ; at = g.b[at]!) {
    const head = g.op[at] === Op.Multiply ? g.a[at]! : at;
    if (baseOf(g, head) === base) holds = true;
    if (g.op[at] !== Op.Multiply) break;
  }
  if (!holds)
    return factor < g.a[chain]!
      ? g.node(Op.Multiply, factor, chain, productFlags(g, factor, chain))
      : insert(g, chain, factor);
  const head = g.a[chain]!;
  const tail = g.b[chain]!;
  if (baseOf(g, head) === base) return multiply(g, restProduct(g, head, factor), tail);
  return multiply(g, head, restProduct(g, tail, factor));
}

/** Puts a new base into an ordered chain of factors. */
function insert(g: Graph, chain: Node, factor: Node): Node {
  if (g.op[chain] !== Op.Multiply) return rawProduct(g, chain, factor);
  const head = g.a[chain]!;
  if (factor < head) return g.node(Op.Multiply, factor, chain, productFlags(g, factor, chain));
  const tail = insert(g, g.b[chain]!, factor);
  return g.node(Op.Multiply, head, tail, productFlags(g, head, tail));
}

const baseOf = (g: Graph, x: Node): Node => (g.op[x] === Op.Power ? g.a[x]! : x);
const exponentOf = (g: Graph, x: Node): number => (g.op[x] === Op.Power ? g.b[x]! : 1);

function rawProduct(g: Graph, x: Node, y: Node): Node {
  const first = g.isNumber(x) || x === g.i || (!g.isNumber(y) && y !== g.i && x < y && g.op[x] !== Op.Multiply);
  const head = first ? x : y;
  const tail = first ? y : x;
  return g.node(Op.Multiply, head, tail, productFlags(g, head, tail));
}

function productFlags(g: Graph, x: Node, y: Node): number {
  const fx = g.flags[x]!;
  const fy = g.flags[y]!;
  let flags = fx & fy & Flag.NonZero;
  const imaginary = ((fx & Flag.Imaginary) === 0 ? 0 : 1) + ((fy & Flag.Imaginary) === 0 ? 0 : 1);
  const real = (fx & Flag.Real) + (fy & Flag.Real);
  if (imaginary === 1 && real === 1) flags |= Flag.Imaginary;
  if (imaginary === 2) flags |= Flag.Real;
  if (real === 2 && imaginary === 0) {
    flags |= Flag.Real;
    const same = (fx & fy & Flag.NonNegative) | ((fx & fy & Flag.NonPositive) >> 1);
    if (same & Flag.NonNegative) flags |= Flag.NonNegative;
    if ((fx & Flag.NonNegative && fy & Flag.NonPositive) || (fx & Flag.NonPositive && fy & Flag.NonNegative)) {
      flags |= Flag.NonPositive;
    }
  }
  return flags;
}

function powerFlags(flags: number, n: number): number {
  const nonZero = flags & Flag.NonZero || n < 0 ? Flag.NonZero : 0;
  if (flags & Flag.Real) {
    if (n % 2 === 0) return Flag.Real | Flag.NonNegative | nonZero;
    return (flags & (Flag.Real | Flag.NonNegative | Flag.NonPositive)) | nonZero;
  }
  if (flags & Flag.Imaginary) {
    if (n % 2 !== 0) return Flag.Imaginary | nonZero;
    return Flag.Real | (n % 4 === 0 ? Flag.NonNegative : Flag.NonPositive) | nonZero;
  }
  return nonZero;
}

export const square = (g: Graph, x: Node): Node => power(g, x, 2);
export const half = (g: Graph, x: Node): Node => scale(g, invertRational(TWO), x);
export const isZeroNode = (g: Graph, x: Node): boolean => x === g.zero || (g.isNumber(x) && isZero(g.valueOf(x)));
export { ZERO as zeroRational };
