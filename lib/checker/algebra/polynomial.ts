import { QuietError } from './quiet-error';
import { type Graph, type Node, Op } from './graph';
import {
  addRational,
  compareRational,
  equalRational,
  isInteger,
  isOne,
  isZero,
  moduloRational,
  multiplyRational,
  negateRational,
  ONE,
  powerRational,
  type Rational,
  rational,
  rationalKey,
  subtractRational,
} from './rational';

/**
 * Sparse polynomials over the rationals in atoms with rational exponents. An atom is a node: a variable, π, i, a number
 * under a root, a sum under a root or in a denominator, a logarithm, or Exp(M) for a monomial M, whose power c is e^{cM}.
 */
export interface Power {
  readonly atom: Node;
  readonly exponent: Rational;
}

/** Product of powers in ascending order of atoms. */
export type Monomial = readonly Power[];

export interface Term {
  readonly coefficient: Rational;
  readonly monomial: Monomial;
}

/** Terms by the key of their monomial; no coefficient is zero. */
export type Polynomial = Map<string, Term>;

/** Thrown where an expanded form would be too large; the caller then keeps the expression as it is. */
export class TooLarge extends QuietError {}

export const MAXIMUM_TERMS = 96;

export function monomialKey(m: Monomial): string {
  let key = '';
  for (const { atom, exponent } of m) key += isOne(exponent) ? `${atom};` : `${atom}^${rationalKey(exponent)};`;
  return key;
}

export function constant(c: Rational): Polynomial {
  return fromMonomial(c, []);
}

export const emptyPolynomial = (): Polynomial => new Map<string, Term>();

export function fromMonomial(coefficient: Rational, monomial: Monomial): Polynomial {
  const polynomial = emptyPolynomial();
  if (!isZero(coefficient)) polynomial.set(monomialKey(monomial), { coefficient, monomial });
  return polynomial;
}

export const fromAtom = (atom: Node, exponent: Rational = ONE): Polynomial => fromMonomial(ONE, [{ atom, exponent }]);

/** Adds c·p into `into`, in place. */
export function accumulate(into: Polynomial, p: Polynomial, c: Rational = ONE): void {
  for (const [key, term] of p) addTerm(into, key, multiplyRational(c, term.coefficient), term.monomial);
  if (into.size > MAXIMUM_TERMS) throw new TooLarge();
}

export function addTerm(into: Polynomial, key: string, c: Rational, monomial: Monomial): void {
  const known = into.get(key);
  if (!known) {
    if (!isZero(c)) into.set(key, { coefficient: c, monomial });
    return;
  }
  const coefficient = addRational(known.coefficient, c);
  if (isZero(coefficient)) into.delete(key);
  else into.set(key, { coefficient, monomial });
}

export function plus(p: Polynomial, q: Polynomial): Polynomial {
  const result = new Map(p);
  accumulate(result, q);
  return result;
}

export function times(g: Graph, p: Polynomial, q: Polynomial, expand: Expand): Polynomial {
  if (p.size * q.size > 4 * MAXIMUM_TERMS) throw new TooLarge();
  g.spend(4 * p.size * q.size);
  const result: Polynomial = new Map();
  for (const x of p.values()) {
    for (const y of q.values()) {
      const c = multiplyRational(x.coefficient, y.coefficient);
      if (x.monomial.length === 0) addTerm(result, monomialKey(y.monomial), c, y.monomial);
      else if (y.monomial.length === 0) addTerm(result, monomialKey(x.monomial), c, x.monomial);
      else accumulate(result, reduce(g, mergeMonomials(x.monomial, y.monomial), expand), c);
    }
  }
  if (result.size > MAXIMUM_TERMS) throw new TooLarge();
  return result;
}

export function negated(p: Polynomial): Polynomial {
  const result: Polynomial = new Map();
  for (const [key, t] of p) result.set(key, { coefficient: negateRational(t.coefficient), monomial: t.monomial });
  return result;
}

/** p to a non-negative integer power. */
export function toPower(g: Graph, p: Polynomial, n: number, expand: Expand): Polynomial {
  if (p.size > 1 && n > 24) throw new TooLarge();
  if (p.size === 1) return powerOfMonomial(g, p, rational(n), expand);
  let result = constant(ONE);
  for (let k = 0; k < n; k++) result = times(g, result, p, expand);
  return result;
}

/** (single term)^n for an integer n, positive or negative. */
export function powerOfMonomial(g: Graph, p: Polynomial, n: Rational, expand: Expand): Polynomial {
  const [term] = p.values();
  if (!term || n.big) throw new TooLarge();
  const c = powerRational(term.coefficient, n.n);
  if (!c) throw new TooLarge();
  const raised = term.monomial.map(({ atom, exponent }) => ({ atom, exponent: multiplyRational(exponent, n) }));
  const reduced = reduce(g, raised, expand);
  return scaled(reduced, c);
}

export function scaled(p: Polynomial, c: Rational): Polynomial {
  const result: Polynomial = new Map();
  accumulate(result, p, c);
  return result;
}

/** How an atom with a whole positive power is written out: the polynomial of its base, or null to leave it. */
export type Expand = (atom: Node) => Polynomial | null;

export function mergeMonomials(x: Monomial, y: Monomial): Power[] {
  const merged: Power[] = [];
  let i = 0;
  let j = 0;
  while (i < x.length || j < y.length) {
    const left = x[i];
    const right = y[j];
    if (left && right && left.atom === right.atom) {
      const exponent = addRational(left.exponent, right.exponent);
      if (!isZero(exponent)) merged.push({ atom: left.atom, exponent });
      i++;
      j++;
    } else if (!right || (left && left.atom < right.atom)) {
      merged.push(left!);
      i++;
    } else {
      merged.push(right);
      j++;
    }
  }
  return merged;
}

/** Normal form of a product of powers: i² = −1, roots of numbers below their whole power, roots of unity, sums expanded. */
export function reduce(g: Graph, powers: readonly Power[], expand: Expand): Polynomial {
  let c: Rational = ONE;
  const kept: Power[] = [];
  let pending: Polynomial[] | null = null;
  for (const power of powers) {
    const { atom, exponent } = power;
    switch (g.op[atom]) {
      case Op.I: {
        const turns = moduloRational(exponent, 4);
        const whole = isInteger(turns) && !turns.big ? turns.n : -1;
        if (whole < 0) kept.push(power);
        else {
          if (whole >= 2) c = negateRational(c);
          if (whole % 2 === 1) kept.push({ atom, exponent: ONE });
        }
        break;
      }
      case Op.Number: {
        const fraction = moduloRational(exponent, 1);
        const whole = subtractRational(exponent, fraction);
        const factor = whole.big ? null : powerRational(g.valueOf(atom), whole.n);
        if (!factor) throw new TooLarge();
        c = multiplyRational(c, factor);
        if (!isZero(fraction)) kept.push({ atom, exponent: fraction });
        break;
      }
      case Op.Exp: {
        const unity = rootOfUnity(g, atom, exponent);
        if (unity) (pending ??= []).push(unity);
        else kept.push(power);
        break;
      }
      case Op.Abs:
      case Op.Symbol:
      case Op.Add:
      case Op.Multiply:
      case Op.Sin:
      case Op.Cos: {
        if (exponent.big) throw new TooLarge();
        const step = g.op[atom] === Op.Abs || g.op[atom] === Op.Symbol ? 2 : 1;
        const whole = Math.floor(exponent.n / exponent.d / step) * step;
        const base = whole >= step ? expand(atom) : null;
        if (!base) kept.push(power);
        else {
          // The base of a variable or absolute value stands for its square, any other for the atom itself.
          (pending ??= []).push(toPower(g, base, whole / step, expand));
          const rest = subtractRational(exponent, rational(whole));
          if (!isZero(rest)) kept.push({ atom, exponent: rest });
        }
        break;
      }
      default:
        kept.push(power);
    }
  }
  let result = fromMonomial(c, kept);
  if (pending) for (const factor of pending) result = times(g, result, factor, expand);
  return result;
}

/** e^{iπc} where it is ±1, ±i or lies on a twelfth or an eighth of the circle; ±e^{iπc} with c in (0, 1) else. */
function rootOfUnity(g: Graph, atom: Node, exponent: Rational): Polynomial | null {
  const base = g.a[atom]!;
  if (g.op[base] !== Op.Multiply || g.a[base] !== g.i || g.op[g.b[base]!] !== Op.Pi) return null;
  const turn = moduloRational(exponent, 2);
  const twelfths = turn.big || 12 % turn.d !== 0 ? -1 : turn.n * (12 / turn.d);
  const cosine = cosineTable(g, twelfths);
  const sine = twelfths < 0 ? null : cosineTable(g, (twelfths + 18) % 24);
  if (!cosine || !sine) {
    const past = compareRational(turn, ONE) >= 0;
    if (!past && equalRational(turn, exponent)) return null;
    return fromMonomial(rational(past ? -1 : 1), [{ atom, exponent: past ? subtractRational(turn, ONE) : turn }]);
  }
  const result = new Map(cosine);
  for (const t of sine.values()) {
    const monomial = mergeMonomials(t.monomial, [{ atom: g.i, exponent: ONE }]);
    addTerm(result, monomialKey(monomial), t.coefficient, monomial);
  }
  return result;
}

function cosineTable(g: Graph, twelfths: number): Polynomial | null {
  let angle = twelfths > 12 ? 24 - twelfths : twelfths;
  const sign = angle > 6 ? -1 : 1;
  if (sign < 0) angle = 12 - angle;
  const root = (p: number): Polynomial =>
    fromMonomial(rational(sign, 2), [{ atom: g.integer(p), exponent: rational(1, 2) }]);
  if (twelfths < 0) return null;
  if (angle === 0) return constant(rational(sign));
  if (angle === 2) return root(3);
  if (angle === 3) return root(2);
  if (angle === 4) return constant(rational(sign, 2));
  return angle === 6 ? new Map() : null;
}
