import { Flag, type Graph, type Node } from './graph';
import { HALF, MINUS_ONE, rational } from './rational';
import { root, squareRoot } from './roots';
import { ln } from './logarithm';
import { add, cos, divide, exp, multiply, negate, pi, power, scale, sin, subtract } from './scalars';

/**
 * Functions built from exp, ln, sin, cos and roots by their principal definitions (DLMF §4.23, §4.28, §4.37).
 */
export const tan = (g: Graph, x: Node): Node => divide(g, sin(g, x), cos(g, x));
export const sec = (g: Graph, x: Node): Node => power(g, cos(g, x), -1);
export const csc = (g: Graph, x: Node): Node => power(g, sin(g, x), -1);
export const cot = (g: Graph, x: Node): Node => divide(g, cos(g, x), sin(g, x));

export function cosh(g: Graph, x: Node): Node {
  if (g.has(x, Flag.Imaginary)) return cos(g, multiply(g, g.i, x));
  const both = add(g, exp(g, x), exp(g, negate(g, x)));
  return scale(g, HALF, both);
}

export function sinh(g: Graph, x: Node): Node {
  if (g.has(x, Flag.Imaginary)) return negate(g, multiply(g, g.i, sin(g, multiply(g, g.i, x))));
  return scale(g, HALF, subtract(g, exp(g, x), exp(g, negate(g, x))));
}

export const tanh = (g: Graph, x: Node): Node => divide(g, sinh(g, x), cosh(g, x));

const minusITimes = (g: Graph, x: Node): Node => scale(g, MINUS_ONE, multiply(g, g.i, x));

/** −i ln(√(1−x²) + ix). */
export function asin(g: Graph, x: Node): Node {
  const cosine = squareRoot(g, subtract(g, g.one, power(g, x, 2)));
  return minusITimes(g, ln(g, add(g, cosine, multiply(g, g.i, x))));
}

/** π/2 − asin x. */
export const acos = (g: Graph, x: Node): Node => subtract(g, scale(g, HALF, pi(g)), asin(g, x));

/** (i/2)(ln(1−ix) − ln(1+ix)); for real x the angle of 1+ix. */
export function atan(g: Graph, x: Node): Node {
  if (g.has(x, Flag.Real)) return atan2(g, x, g.one);
  const ix = multiply(g, g.i, x);
  return multiply(g, scale(g, HALF, g.i), subtract(g, ln(g, subtract(g, g.one, ix)), ln(g, add(g, g.one, ix))));
}

/** Angle of x + iy in (−π, π], for real x and y, not both zero. */
export function atan2(g: Graph, y: Node, x: Node): Node {
  const length = squareRoot(g, add(g, power(g, x, 2), power(g, y, 2)));
  const direction = divide(g, add(g, x, multiply(g, g.i, y)), length);
  const logarithm = ln(g, direction);
  // Of a number of modulus 1: that makes every product with it known to be real or imaginary.
  if (logarithm !== g.zero) g.mark(logarithm, Flag.Imaginary);
  return minusITimes(g, logarithm);
}

/** ln(x + √(x²+1)). */
export const asinh = (g: Graph, x: Node): Node => ln(g, add(g, x, squareRoot(g, add(g, power(g, x, 2), g.one))));

/** ln(x + √(x+1)√(x−1)). */
export const acosh = (g: Graph, x: Node): Node =>
  ln(g, add(g, x, multiply(g, squareRoot(g, add(g, x, g.one)), squareRoot(g, subtract(g, x, g.one)))));

/** ½(ln(1+x) − ln(1−x)). */
export const atanh = (g: Graph, x: Node): Node =>
  scale(g, HALF, subtract(g, ln(g, add(g, g.one, x)), ln(g, subtract(g, g.one, x))));

/** Principal power b^e: integers and fractions exactly, else exp(e ln b). */
export function generalPower(g: Graph, base: Node, exponent: Node): Node {
  if (g.isNumber(exponent)) {
    const e = g.valueOf(exponent);
    if (!e.big && e.d === 1) return power(g, base, e.n);
    if (!e.big && e.d <= 99) return power(g, root(g, base, e.d), e.n);
  }
  if (base === g.number(rational(-1))) return exp(g, multiply(g, multiply(g, g.i, pi(g)), exponent));
  return exp(g, multiply(g, exponent, ln(g, base)));
}
