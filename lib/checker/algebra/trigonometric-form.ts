import { Flag, type Graph, type Node, Op } from './graph';
import { expandIn, fromPolynomial } from './normal-form';
import { addTerm, emptyPolynomial, fromAtom, monomialKey, type Polynomial, plus, scaled, times } from './polynomial';
import { isNegative, type Rational, rational, rationalKey, subtractRational } from './rational';
import { add, cos, multiply, scale, sin } from './scalars';

const ZERO_EXPONENT = rational(0);

/**
 * A normal form written in sines and cosines of one angle after another, sin θ cos φ where the plain form has
 * sin(θ+φ) and sin(θ−φ); null where it holds no or too many phases.
 */
export function trigonometricForm(g: Graph, form: Polynomial): Node | null {
  const phases = new Set<Node>();
  for (const { monomial } of form.values()) {
    for (const { atom } of monomial) if (isPhase(g, atom)) phases.add(atom);
  }
  if (phases.size < 2 || phases.size > 4) return null;
  return byPhases(g, form, [...phases]);
}

const isPhase = (g: Graph, atom: Node): boolean => g.op[atom] === Op.Exp && g.has(g.a[atom]!, Flag.Imaginary);

/** Σ e^{ikθ}P_k = P_0 + Σ_{k>0} (P_k + P_{−k}) cos kθ + i(P_k − P_{−k}) sin kθ. */
function byPhases(g: Graph, form: Polynomial, phases: readonly Node[]): Node {
  const [phase, ...others] = phases;
  if (phase === undefined || form.size === 0) return fromPolynomial(g, form);
  const parts = new Map<string, { exponent: Rational; up: Polynomial; down: Polynomial }>();
  for (const { coefficient, monomial } of form.values()) {
    const power = monomial.find(({ atom }) => atom === phase)?.exponent ?? ZERO_EXPONENT;
    const negative = isNegative(power);
    const exponent = negative ? subtractRational(ZERO_EXPONENT, power) : power;
    const key = rationalKey(exponent);
    const part = parts.get(key) ?? { exponent, up: emptyPolynomial(), down: emptyPolynomial() };
    const rest = monomial.filter(({ atom }) => atom !== phase);
    addTerm(negative ? part.down : part.up, monomialKey(rest), coefficient, rest);
    parts.set(key, part);
  }
  const angle = scale(g, rational(-1), multiply(g, g.i, g.a[phase]!));
  let total = g.zero;
  for (const [key, { exponent, up, down }] of parts) {
    if (key === '0') {
      total = add(g, total, byPhases(g, up, others));
      continue;
    }
    const even = plus(up, down);
    const odd = times(g, plus(up, scaled(down, rational(-1))), fromAtom(g.i), expandIn(g));
    const multiple = scale(g, exponent, angle);
    if (even.size > 0) total = add(g, total, multiply(g, byPhases(g, even, others), cos(g, multiple)));
    if (odd.size > 0) total = add(g, total, multiply(g, byPhases(g, odd, others), sin(g, multiple)));
  }
  return total;
}
