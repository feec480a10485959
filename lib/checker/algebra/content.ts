import { type Polynomial } from './polynomial';
import {
  bigGcd,
  bigRational,
  gcd,
  invertRational,
  isNegative,
  multiplyRational,
  negateRational,
  type Rational,
  rational,
} from './rational';

/** A polynomial as content × primitive: integer coefficients without common factor, the first in key order positive. */
export function contentOf(p: Polynomial): { content: Rational; primitive: Polynomial } {
  let first: string | null = null;
  let negative = false;
  for (const [key, { coefficient }] of p) {
    if (first !== null && key > first) continue;
    first = key;
    negative = isNegative(coefficient);
  }
  const magnitude = smallContent(p) ?? bigContent(p);
  const content = negative ? negateRational(magnitude) : magnitude;
  const inverse = invertRational(content);
  const primitive: Polynomial = new Map();
  for (const [key, term] of p) {
    primitive.set(key, { coefficient: multiplyRational(inverse, term.coefficient), monomial: term.monomial });
  }
  return { content, primitive };
}

/** gcd of numerators over lcm of denominators; null where that leaves the small integers. */
function smallContent(p: Polynomial): Rational | null {
  let n = 0;
  let d = 1;
  for (const { coefficient: c } of p.values()) {
    if (c.big) return null;
    n = gcd(n, Math.abs(c.n));
    d *= c.d / gcd(d, c.d);
    if (d > 2 ** 50) return null;
  }
  return rational(n, d);
}

function bigContent(p: Polynomial): Rational {
  let n = 0n;
  let d = 1n;
  for (const { coefficient: c } of p.values()) {
    const numerator = BigInt(c.n);
    const denominator = BigInt(c.d);
    n = bigGcd(n, numerator < 0n ? -numerator : numerator);
    d *= denominator / bigGcd(d, denominator);
  }
  return bigRational(n, d);
}
