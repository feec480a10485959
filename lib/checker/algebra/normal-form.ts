import { Flag, type Graph, type Node, Op, POSITIVE } from './graph';
import {
  accumulate,
  constant,
  fromAtom,
  fromMonomial,
  type Monomial,
  monomialKey,
  type Polynomial,
  plus,
  powerOfMonomial,
  reduce,
  scaled,
  type Term,
  times,
  TooLarge,
  toPower,
} from './polynomial';
import {
  addRational,
  equalRational,
  HALF,
  multiplyRational,
  negateRational,
  ONE,
  type Rational,
  rational,
} from './rational';
import { add, coefficientOf, cos, exp, multiply, power, scale, sin, withoutCoefficient } from './scalars';
import { contentOf } from './content';

/**
 * Expanded normal form of a scalar over atoms, trigonometric functions written as exponentials; null where it would be
 * too large. Equal normal forms are equal functions; the converse is not promised.
 */
export function normalForm(g: Graph, node: Node): Polynomial | null {
  try {
    return toPolynomial(g, node);
  } catch (error) {
    if (error instanceof TooLarge) return null;
    throw error;
  }
}

/** As normalForm, but throws TooLarge. */
export function toPolynomial(g: Graph, node: Node): Polynomial {
  const known = g.memo.get(node) as Polynomial | null | undefined;
  if (known) return known;
  if (known === null) throw new TooLarge();
  g.memo.set(node, null);
  const result = build(g, node);
  g.memo.set(node, result);
  return result;
}

const expandIn =
  (g: Graph) =>
  (atom: Node): Polynomial | null => {
    switch (g.op[atom]) {
      case Op.Add:
      case Op.Multiply:
      case Op.Sin:
      case Op.Cos:
        return toPolynomial(g, atom);
      case Op.Abs: {
        const inside = toPolynomial(g, g.a[atom]!);
        return times(g, inside, inside, expandIn(g));
      }
      case Op.Symbol: {
        const replaced = g.squares.get(g.a[atom]!);
        return replaced === undefined ? null : toPolynomial(g, replaced);
      }
      default:
        return null;
    }
  };

function build(g: Graph, node: Node): Polynomial {
  const a = g.a[node]!;
  const b = g.b[node]!;
  switch (g.op[node]) {
    case Op.Number:
      return constant(g.valueOf(node));
    case Op.Add:
      return plus(toPolynomial(g, a), toPolynomial(g, b));
    case Op.Multiply:
      return times(g, toPolynomial(g, a), toPolynomial(g, b), expandIn(g));
    case Op.Power: {
      const base = toPolynomial(g, a);
      if (base.size <= 1) return powerOfMonomial(g, base, rational(b), expandIn(g));
      if (b > 0) return toPower(g, base, b, expandIn(g));
      return powerOfMonomial(g, asAtom(g, base), rational(b), expandIn(g));
    }
    case Op.Root:
      return reduce(g, [{ atom: a, exponent: rational(1, b) }], expandIn(g));
    case Op.Exp:
      return exponential(g, toPolynomial(g, a), ONE);
    case Op.Sin:
    case Op.Cos: {
      const phase = times(g, toPolynomial(g, a), fromAtom(g.i), expandIn(g));
      const result = scaled(exponential(g, phase, ONE), HALF);
      const sine = g.op[node] === Op.Sin;
      accumulate(result, exponential(g, phase, rational(-1)), sine ? rational(-1, 2) : HALF);
      return sine ? times(g, result, fromMonomial(rational(-1), [{ atom: g.i, exponent: ONE }]), expandIn(g)) : result;
    }
    default:
      return fromAtom(node);
  }
}

/** A sum as content × monomial × atom, the atom being its primitive part as one node. */
export function asAtom(g: Graph, p: Polynomial): Polynomial {
  const { content, primitive } = contentOf(p);
  const node = fromPolynomial(g, primitive);
  const coefficient = multiplyRational(content, coefficientOf(g, node));
  let atom = withoutCoefficient(g, node);
  const imaginary = g.op[atom] === Op.Multiply && g.a[atom] === g.i;
  if (imaginary) atom = g.b[atom]!;
  const powers = imaginary ? [{ atom: g.i, exponent: ONE }] : [];
  powers.push({ atom, exponent: ONE });
  powers.sort((x, y) => x.atom - y.atom);
  return fromMonomial(coefficient, powers);
}

/** e^{c·p} as a product of powers of Exp(M) over the monomials M of p. */
function exponential(g: Graph, p: Polynomial, c: Rational): Polynomial {
  const powers: { atom: Node; exponent: Rational }[] = [];
  for (const term of p.values()) {
    const exponent = multiplyRational(c, term.coefficient);
    const [only] = term.monomial;
    if (term.monomial.length === 1 && only && g.op[only.atom] === Op.Ln && equalRational(only.exponent, ONE)) {
      powers.push({ atom: g.a[only.atom]!, exponent });
    } else {
      const monomial = monomialNode(g, term.monomial);
      const flags = g.flags[monomial]! & Flag.Real ? POSITIVE : Flag.NonZero;
      powers.push({ atom: g.node(Op.Exp, monomial, 0, flags), exponent });
    }
  }
  powers.sort((x, y) => x.atom - y.atom);
  const distinct: typeof powers = [];
  for (const next of powers) {
    const last = distinct[distinct.length - 1];
    if (last?.atom === next.atom) {
      distinct[distinct.length - 1] = { atom: last.atom, exponent: addRational(last.exponent, next.exponent) };
    } else distinct.push(next);
  }
  return reduce(g, distinct, expandIn(g));
}

/** The node of a product of powers; exponentials are gathered into one. */
export function monomialNode(g: Graph, monomial: Monomial): Node {
  let node = g.one;
  let exponent = g.zero;
  for (const power of monomial) {
    if (g.op[power.atom] === Op.Exp) exponent = add(g, exponent, scale(g, power.exponent, g.a[power.atom]!));
    else node = multiply(g, node, powerNode(g, power.atom, power.exponent));
  }
  return exponent === g.zero ? node : multiply(g, node, exp(g, exponent));
}

function powerNode(g: Graph, atom: Node, exponent: Rational): Node {
  if (exponent.big) throw new TooLarge();
  if (exponent.d === 1) return power(g, atom, exponent.n);
  const flags = g.flags[atom]!;
  const known = flags & Flag.NonNegative ? flags & (Flag.Real | Flag.NonNegative | Flag.NonZero) : flags & Flag.NonZero;
  return power(g, g.node(Op.Root, atom, exponent.d, known), exponent.n);
}

/** The node of a normal form, terms in a fixed order, conjugate exponentials joined into sines and cosines. */
export function fromPolynomial(g: Graph, p: Polynomial): Node {
  const keys = [...p.keys()].sort();
  const done = new Set<string>();
  let total = g.zero;
  for (const key of keys) {
    const term = p.get(key)!;
    if (done.has(key)) continue;
    done.add(key);
    const partner = partnerOf(g, p, term);
    if (partner && !done.has(partner.key)) {
      done.add(partner.key);
      const angle = phaseOf(g, term.monomial);
      const rest = monomialNode(
        g,
        term.monomial.filter(({ atom }) => !isPhase(g, atom)),
      );
      const twice = scale(g, multiplyRational(term.coefficient, rational(2)), rest);
      const wave = partner.same ? cos(g, angle) : multiply(g, g.i, sin(g, angle));
      total = add(g, total, multiply(g, twice, wave));
    } else {
      total = add(g, total, scale(g, term.coefficient, monomialNode(g, term.monomial)));
    }
  }
  return isRealPolynomial(g, p) ? g.mark(total, Flag.Real) : total;
}

const isPhase = (g: Graph, atom: Node): boolean => g.op[atom] === Op.Exp && g.has(g.a[atom]!, Flag.Imaginary);

/** θ where the exponentials of a monomial make e^{iθ}. */
function phaseOf(g: Graph, monomial: Monomial): Node {
  let angle = g.zero;
  for (const { atom, exponent } of monomial) {
    if (!isPhase(g, atom)) continue;
    angle = add(g, angle, scale(g, negateRational(exponent), multiply(g, g.i, g.a[atom]!)));
  }
  return angle;
}

function partnerOf(g: Graph, p: Polynomial, term: Term): { key: string; same: boolean } | null {
  if (!term.monomial.some(({ atom }) => isPhase(g, atom))) return null;
  const key = monomialKey(conjugatePhases(g, term.monomial));
  const other = p.get(key);
  if (!other) return null;
  if (equalRational(other.coefficient, term.coefficient)) return { key, same: true };
  return equalRational(other.coefficient, negateRational(term.coefficient)) ? { key, same: false } : null;
}

const conjugatePhases = (g: Graph, monomial: Monomial): Monomial =>
  monomial.map((x) => (isPhase(g, x.atom) ? { atom: x.atom, exponent: negateRational(x.exponent) } : x));

/** Whether a normal form is its own complex conjugate at every point of the domain. */
export function isRealPolynomial(g: Graph, p: Polynomial): boolean {
  const conjugate: Polynomial = new Map();
  for (const term of p.values()) {
    let sign = ONE;
    for (const { atom, exponent } of term.monomial) {
      if (atom === g.i) sign = negateRational(sign);
      else if (isPhase(g, atom)) continue;
      else if (!g.has(atom, Flag.Real) || (exponent.d !== 1 && !g.has(atom, Flag.NonNegative))) return false;
    }
    const flipped = conjugatePhases(g, term.monomial);
    accumulate(conjugate, reduce(g, flipped, expandIn(g)), multiplyRational(sign, term.coefficient));
  }
  if (conjugate.size !== p.size) return false;
  for (const [key, term] of p) {
    const other = conjugate.get(key);
    if (!other || !equalRational(other.coefficient, term.coefficient)) return false;
  }
  return true;
}

export { expandIn };
