import { Flag, type Graph, type Node, Op, POSITIVE } from './graph';
import { gcd, isNegative, type Rational } from './rational';
import { multiply, power } from './scalars';

/** Positive rational to the power 1/q, prime by prime. */
export function rootOfRational(g: Graph, c: Rational, q: number): Node {
  if (isNegative(c)) return g.node(Op.Root, g.number(c), q, Flag.NonZero);
  if (c.big) return g.node(Op.Root, g.number(c), q, POSITIVE);
  let node = g.one;
  for (const [prime, exponent] of [...primePowers(c.n, 1), ...primePowers(c.d, -1)]) {
    const whole = Math.floor(exponent / q);
    node = multiply(g, node, power(g, g.integer(prime), whole));
    const rest = exponent - whole * q;
    if (rest === 0) continue;
    const common = gcd(rest, q);
    const degree = q / common;
    node = multiply(g, node, power(g, g.node(Op.Root, g.integer(prime), degree, POSITIVE), rest / common));
  }
  return node;
}

/** Prime powers of n; a cofactor without divisor below the trial limit counts as a prime. */
export function primePowers(n: number, sign: 1 | -1): [number, number][] {
  const powers: [number, number][] = [];
  let rest = n;
  for (let p = 2; p * p <= rest && p < 3000; p += p === 2 ? 1 : 2) {
    let exponent = 0;
    while (rest % p === 0) {
      rest /= p;
      exponent++;
    }
    if (exponent > 0) powers.push([p, sign * exponent]);
  }
  if (rest > 1) {
    const square = Math.round(Math.sqrt(rest));
    if (square * square === rest) powers.push([square, 2 * sign]);
    else powers.push([rest, sign]);
  }
  return powers;
}
