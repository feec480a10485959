import { contentOf } from './content';
import { Flag, type Graph, type Node, Op } from './graph';
import { expandIn, fromPolynomial, isRealPolynomial, monomialNode, normalForm } from './normal-form';
import { fromAtom, fromMonomial, type Polynomial, type Power, scaled, times, TooLarge } from './polynomial';
import {
  compareRational,
  isNegative,
  multiplyRational,
  negateRational,
  ONE,
  type Rational,
  rational,
} from './rational';
import { rootOfRational } from './root-of-rational';
import { add, coefficientOf, exp, multiply, negate, pi, power, scale } from './scalars';
import { signOf } from './sign';
import { squareRootOfPolynomial } from './square-root-of-polynomial';

/**
 * Principal q-th root. Factors whose sign is known are drawn out, perfect squares become absolute values, and what
 * remains is written in a canonical form, so that equal radicands become one node.
 * `anyBranch` lets the caller, whose formula is even in the root, take either square root of everything.
 */
export function root(g: Graph, x: Node, q: number, anyBranch = false): Node {
  if (x === g.zero || x === g.one || q === 1) return x;
  const form = normalForm(g, x);
  if (!form) return rawRoot(g, x, q);
  if (form.size === 0) return g.zero;
  try {
    return rootOfForm(g, form, q, anyBranch);
  } catch (error) {
    if (error instanceof TooLarge) return rawRoot(g, x, q);
    throw error;
  }
}

export const squareRoot = (g: Graph, x: Node): Node => root(g, x, 2);

function rawRoot(g: Graph, x: Node, q: number): Node {
  const flags = g.flags[x]!;
  return g.node(Op.Root, x, q, flags & Flag.NonNegative ? flags : flags & Flag.NonZero);
}

function rootOfForm(g: Graph, form: Polynomial, q: number, anyBranch: boolean): Node {
  const { content, common, rest } = factorsOf(g, form);
  let outside = g.one;
  let inside = g.one;
  let sign = content;
  if (isNegative(content)) sign = negateRational(content);
  let negative = isNegative(content);
  for (const { atom, exponent } of common) {
    const drawn = drawOut(g, { atom, exponent }, q, anyBranch);
    outside = multiply(g, outside, drawn.outside);
    inside = multiply(g, inside, drawn.inside);
  }
  if (rest) {
    const node = q === 2 ? realSquareRoot(g, rest, anyBranch) : null;
    if (node !== null) {
      outside = multiply(g, outside, anyBranch ? node : absolute(g, node));
    } else {
      inside = multiply(g, inside, canonicalFactor(g, rest));
    }
  }
  // A radicand known to be non-positive everywhere is a negative sign times a non-negative one.
  if (inside !== g.one && !g.has(inside, Flag.NonNegative) && signOf(g, inside) < 0) {
    inside = negate(g, inside);
    negative = !negative;
  }
  const number = rootOfRational(g, sign, q);
  const total = multiply(g, number, outside);
  if (!negative) return inside === g.one ? total : multiply(g, total, canonicalRoot(g, inside, q));
  const turns = anyBranch && (!rest || signOf(g, inside) > 0);
  if (q === 2 && (inside === g.one || turns || signOf(g, inside) > 0)) {
    const turned = multiply(g, g.i, total);
    return inside === g.one ? turned : multiply(g, turned, canonicalRoot(g, inside, q));
  }
  if (inside === g.one || signOf(g, inside) > 0) {
    const turn = exp(g, scale(g, rational(1, q), multiply(g, g.i, pi(g))));
    return multiply(g, multiply(g, turn, total), inside === g.one ? g.one : canonicalRoot(g, inside, q));
  }
  // The sign is distributed, so that the radicand is a sum again.
  const turned = normalForm(g, negate(g, inside));
  return multiply(g, total, canonicalRoot(g, turned ? fromPolynomial(g, turned) : negate(g, inside), q));
}

/** A node whose square is the form: a real one, or any with `anyBranch`; null where there is none in the same atoms. */
function realSquareRoot(g: Graph, form: Polynomial, anyBranch: boolean): Node | null {
  const direct = squareRootOfPolynomial(g, form);
  if (direct && (anyBranch || isRealPolynomial(g, direct))) return fromPolynomial(g, direct);
  // −form may be a square where the form is that of an odd function of phases, as 2 − e^{2iθ} − e^{−2iθ} = (2 sin θ)².
  const turned = squareRootOfPolynomial(g, scaled(form, rational(-1)));
  if (!turned) return null;
  const root = times(g, turned, fromAtom(g.i), expandIn(g));
  return anyBranch || isRealPolynomial(g, root) ? fromPolynomial(g, root) : null;
}

/** Sums stay expanded in the radicand, so that the same function is the same node however it was factored. */
function canonicalRoot(g: Graph, inside: Node, q: number): Node {
  if (inside === g.i && q === 2) {
    return multiply(g, add(g, g.one, g.i), rootOfRational(g, rational(1, 2), 2));
  }
  const flags = g.flags[inside]!;
  const nonNegative = flags & Flag.NonNegative || signOf(g, inside) > 0;
  return g.node(
    Op.Root,
    inside,
    q,
    nonNegative ? (flags & Flag.NonZero) | Flag.Real | Flag.NonNegative : flags & Flag.NonZero,
  );
}

export function canonicalFactor(g: Graph, p: Polynomial): Node {
  const node = fromPolynomial(g, p);
  const sign = signOf(g, node);
  if (sign > 0) g.mark(node, Flag.Real | Flag.NonNegative);
  else if (sign < 0) g.mark(node, Flag.Real | Flag.NonPositive);
  return node;
}

/** Content, common monomial and primitive rest (null for 1) of a form. Phases e^{iθ} are not drawn out. */
export function factorsOf(g: Graph, form: Polynomial): { content: Rational; common: Power[]; rest: Polynomial | null } {
  if (form.size === 1) {
    const [only] = form.values();
    if (only) return { content: only.coefficient, common: [...only.monomial], rest: null };
  }
  const { content, primitive } = contentOf(form);
  const common = commonPowers(g, primitive);
  if (common.length === 0) return { content, common, rest: primitive };
  const inverse = common.map(({ atom, exponent }) => ({ atom, exponent: negateRational(exponent) }));
  const rest = times(g, primitive, fromMonomial(ONE, inverse), expandIn(g));
  return { content, common, rest };
}

/** The powers that divide every term; negative ones clear denominators. */
function commonPowers(g: Graph, form: Polynomial): Power[] {
  const least = new Map<Node, Rational>();
  const seen = new Map<Node, number>();
  for (const { monomial } of form.values()) {
    for (const { atom, exponent } of monomial) {
      const known = least.get(atom);
      if (!known || compareRational(exponent, known) < 0) least.set(atom, exponent);
      seen.set(atom, (seen.get(atom) ?? 0) + 1);
    }
  }
  const common: Power[] = [];
  for (const [atom, exponent] of least) {
    if (atom === g.i || (g.op[atom] === Op.Exp && !g.has(g.a[atom]!, Flag.Real))) continue;
    if (seen.get(atom) === form.size || isNegative(exponent)) common.push({ atom, exponent });
  }
  return common.sort((x, y) => x.atom - y.atom);
}

function drawOut(g: Graph, { atom, exponent }: Power, q: number, anyBranch: boolean): { outside: Node; inside: Node } {
  const share = multiplyRational(exponent, rational(1, q));
  const all = (): Node => monomialNode(g, [{ atom, exponent: share }]);
  if (anyBranch || g.has(atom, Flag.NonNegative)) return { outside: all(), inside: g.one };
  if (g.op[atom] === Op.Exp && g.has(g.a[atom]!, Flag.Real)) return { outside: all(), inside: g.one };
  const inside = monomialNode(g, [{ atom, exponent }]);
  if (q !== 2 || !g.has(atom, Flag.Real) || exponent.big || exponent.d !== 1) return { outside: g.one, inside };
  const pairs = Math.floor(exponent.n / 2);
  const odd = exponent.n - 2 * pairs;
  const outside = pairs === 0 ? g.one : power(g, pairs % 2 === 0 ? atom : absolute(g, atom), pairs);
  return { outside, inside: odd === 0 ? g.one : atom };
}

/** |x| of a real x. */
export function absolute(g: Graph, x: Node): Node {
  const sign = signOf(g, x);
  if (sign > 0) return x;
  if (sign < 0) return negate(g, x);
  const c = coefficientOf(g, x);
  if (isNegative(c)) return absolute(g, negate(g, x));
  switch (g.op[x]) {
    case Op.Multiply:
      // A real product may have factors that are not.
      if (!g.has(g.a[x]!, Flag.Real) || !g.has(g.b[x]!, Flag.Real)) break;
      return multiply(g, absolute(g, g.a[x]!), absolute(g, g.b[x]!));
    case Op.Power:
      if (!g.has(g.a[x]!, Flag.Real)) break;
      return power(g, absolute(g, g.a[x]!), g.b[x]!);
    case Op.Add: {
      const form = normalForm(g, x);
      if (!form || form.size === 0) break;
      const { content, primitive } = contentOf(form);
      const node = fromPolynomial(g, primitive);
      const size = isNegative(content) ? negateRational(content) : content;
      if (node === x) break;
      if (g.op[node] === Op.Add) return scale(g, size, absoluteNode(g, node));
      return scale(g, size, absolute(g, g.mark(node, Flag.Real)));
    }
    default:
  }
  return absoluteNode(g, x);
}

function absoluteNode(g: Graph, x: Node): Node {
  return g.node(Op.Abs, x, 0, Flag.Real | Flag.NonNegative | (g.flags[x]! & Flag.NonZero));
}
