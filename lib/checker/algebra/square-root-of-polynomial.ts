import { type Graph } from './graph';
import { expandIn } from './normal-form';
import {
  addTerm,
  fromMonomial,
  type Monomial,
  monomialKey,
  type Polynomial,
  plus,
  reduce,
  scaled,
  type Term,
  times,
} from './polynomial';
import {
  compareRational,
  invertRational,
  isNegative,
  isZero,
  multiplyRational,
  negateRational,
  type Rational,
  rational,
  subtractRational,
} from './rational';

const HALF_EXPONENT = rational(1, 2);
const MOST_TERMS = 8;

/**
 * s with s² = p, or null where there is none among polynomials in the same atoms (with half exponents).
 * The schoolbook method on terms in lexicographic order; the result is checked by squaring it.
 */
export function squareRootOfPolynomial(g: Graph, p: Polynomial): Polynomial | null {
  // The square of n terms in order has at least 2n − 1.
  if (p.size < 3 || p.size > (MOST_TERMS * (MOST_TERMS + 1)) / 2) return null;
  const mostTerms = Math.min(MOST_TERMS, (p.size + 1) / 2);
  const expand = expandIn(g);
  const leading = leadingTerm(p);
  const c = exactSquareRoot(leading.coefficient);
  if (!c) return null;
  const lead: Term = { coefficient: c, monomial: halved(leading.monomial) };
  const root: Polynomial = fromMonomial(lead.coefficient, lead.monomial);
  let rest = minus(p, times(g, root, root, expand));
  const inverse = invertRational(multiplyRational(rational(2), c));
  const inverseMonomial = lead.monomial.map(({ atom, exponent }) => ({ atom, exponent: negateRational(exponent) }));
  for (let k = 1; k < mostTerms && rest.size > 0; k++) {
    const next = leadingTerm(rest);
    const quotient = reduce(g, mergeSorted(next.monomial, inverseMonomial), expand);
    if (quotient.size !== 1) return null;
    const [term] = scaled(quotient, multiplyRational(next.coefficient, inverse)).values();
    if (!term || compareMonomials(term.monomial, lead.monomial) >= 0) return null;
    const single = fromMonomial(term.coefficient, term.monomial);
    const doubled = plus(scaled(root, rational(2)), single);
    rest = minus(rest, times(g, doubled, single, expand));
    addTerm(root, monomialKey(term.monomial), term.coefficient, term.monomial);
  }
  return rest.size === 0 ? root : null;
}

const minus = (p: Polynomial, q: Polynomial): Polynomial => plus(p, scaled(q, rational(-1)));

const halved = (m: Monomial): Monomial =>
  m.map(({ atom, exponent }) => ({ atom, exponent: multiplyRational(exponent, HALF_EXPONENT) }));

function mergeSorted(x: Monomial, y: Monomial): Monomial {
  const merged = new Map<number, Rational>();
  for (const { atom, exponent } of x) merged.set(atom, exponent);
  for (const { atom, exponent } of y) {
    const known = merged.get(atom);
    merged.set(atom, known ? subtractRational(known, negateRational(exponent)) : exponent);
  }
  return [...merged]
    .filter(([, exponent]) => !isZero(exponent))
    .map(([atom, exponent]) => ({ atom, exponent }))
    .sort((a, b) => a.atom - b.atom);
}

function leadingTerm(p: Polynomial): Term {
  let best: Term | null = null;
  for (const term of p.values()) if (!best || compareMonomials(term.monomial, best.monomial) > 0) best = term;
  return best!;
}

/** Lexicographic order: the first atom in which the exponents differ decides. */
function compareMonomials(x: Monomial, y: Monomial): number {
  let i = 0;
  let j = 0;
  while (i < x.length || j < y.length) {
    const left = x[i];
    const right = y[j];
    if (left && right && left.atom === right.atom) {
      const order = compareRational(left.exponent, right.exponent);
      if (order !== 0) return order;
      i++;
      j++;
    } else if (!right || (left && left.atom < right.atom)) {
      return isNegative(left!.exponent) ? -1 : 1;
    } else {
      return isNegative(right.exponent) ? 1 : -1;
    }
  }
  return 0;
}

/** √c for a rational that is the square of one, else null. */
export function exactSquareRoot(c: Rational): Rational | null {
  if (c.big || c.n < 0) return null;
  const n = Math.round(Math.sqrt(c.n));
  const d = Math.round(Math.sqrt(c.d));
  return n * n === c.n && d * d === c.d && n < 2 ** 26 && d < 2 ** 26 ? rational(n, d) : null;
}
