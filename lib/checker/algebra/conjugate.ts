import { Flag, type Graph, type Node, Op } from './graph';
import { HALF, rational } from './rational';
import { absolute, root } from './roots';
import { ln } from './logarithm';
import { add, cos, divide, exp, multiply, negate, power, scale, sin, subtract } from './scalars';

/**
 * Complex conjugate, carried down to the variables (all real). Holds at every point where the value is defined, but on
 * a branch cut that a complex radicand meets only on a set without interior.
 */
export function conjugate(g: Graph, x: Node): Node {
  if (g.has(x, Flag.Real)) return x;
  if (g.has(x, Flag.Imaginary)) return negate(g, x);
  g.spend(2);
  const a = g.a[x]!;
  const b = g.b[x]!;
  switch (g.op[x]) {
    case Op.Add:
      return add(g, conjugate(g, a), conjugate(g, b));
    case Op.Multiply:
      return multiply(g, conjugate(g, a), conjugate(g, b));
    case Op.Power:
      return power(g, conjugate(g, a), b);
    case Op.Root:
      // For a real radicand of either sign: |R|^{2/q} is the square of the modulus.
      if (g.has(a, Flag.Real)) return divide(g, power(g, root(g, absolute(g, a), b), 2), x);
      return root(g, conjugate(g, a), b);
    case Op.Exp:
      return exp(g, conjugate(g, a));
    case Op.Ln:
      if (g.has(a, Flag.Real)) return subtract(g, scale(g, rational(2), ln(g, absolute(g, a))), x);
      return ln(g, conjugate(g, a));
    case Op.Sin:
      return sin(g, conjugate(g, a));
    case Op.Cos:
      return cos(g, conjugate(g, a));
    default:
      return x;
  }
}

/** Real part, marked real. */
export function realPart(g: Graph, x: Node): Node {
  if (g.has(x, Flag.Real)) return x;
  if (g.has(x, Flag.Imaginary)) return g.zero;
  return g.mark(scale(g, HALF, add(g, x, conjugate(g, x))), Flag.Real);
}

/** Imaginary part, marked real. */
export function imaginaryPart(g: Graph, x: Node): Node {
  if (g.has(x, Flag.Real)) return g.zero;
  const difference = subtract(g, x, conjugate(g, x));
  return g.mark(scale(g, rational(-1, 2), multiply(g, g.i, difference)), Flag.Real);
}

/** |x|², marked real and non-negative. */
export function absoluteSquare(g: Graph, x: Node): Node {
  if (g.has(x, Flag.Real)) return power(g, x, 2);
  if (g.has(x, Flag.Imaginary)) return negate(g, power(g, x, 2));
  switch (g.op[x]) {
    case Op.Multiply:
      return multiply(g, absoluteSquare(g, g.a[x]!), absoluteSquare(g, g.b[x]!));
    case Op.Power:
      return power(g, absoluteSquare(g, g.a[x]!), g.b[x]!);
    case Op.Exp:
      return exp(g, scale(g, rational(2), realPart(g, g.a[x]!)));
    case Op.Root:
      return root(g, absoluteSquare(g, g.a[x]!), g.b[x]!);
    default: {
      const flags = Flag.Real | Flag.NonNegative;
      return g.mark(multiply(g, x, conjugate(g, x)), flags);
    }
  }
}

/** |x| of a real or complex x. */
export function modulus(g: Graph, x: Node): Node {
  if (g.has(x, Flag.Real)) return absolute(g, x);
  g.spend(2);
  switch (g.op[x]) {
    case Op.I:
      return g.one;
    case Op.Multiply:
      return multiply(g, modulus(g, g.a[x]!), modulus(g, g.b[x]!));
    case Op.Power:
      return power(g, modulus(g, g.a[x]!), g.b[x]!);
    default:
      return root(g, absoluteSquare(g, x), 2);
  }
}
