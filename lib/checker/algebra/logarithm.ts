import { Flag, type Graph, type Node, Op } from './graph';
import { fromPolynomial, normalForm } from './normal-form';
import { type Polynomial } from './polynomial';
import { equalRational, isNegative, negateRational, type Rational, rational } from './rational';
import { primePowers } from './root-of-rational';
import { absolute, canonicalFactor, factorsOf } from './roots';
import { add, DefinedNowhere, exp, multiply, pi, scale } from './scalars';
import { signOf } from './sign';

/** Principal natural logarithm; of products of positive factors the sum of theirs. */
export function ln(g: Graph, x: Node): Node {
  if (x === g.one) return g.zero;
  if (x === g.zero) throw new DefinedNowhere('logarithm of zero');
  if (g.op[x] === Op.Exp && g.has(g.a[x]!, Flag.Real)) return g.a[x]!;
  const form = normalForm(g, x);
  if (!form || form.size === 0) return g.node(Op.Ln, x, 0, realLog(g, x));
  const turn = turnOfUnit(g, form);
  if (turn) return scale(g, turn, multiply(g, g.i, pi(g)));
  const { content, common, rest } = factorsOf(g, form);
  const positive = common.every(
    ({ atom, exponent }) =>
      g.has(atom, Flag.NonNegative) ||
      (g.op[atom] === Op.Exp && g.has(g.a[atom]!, Flag.Real)) ||
      (g.has(atom, Flag.Real) && isEven(exponent)),
  );
  const restNode = rest ? canonicalFactor(g, rest) : null;
  if (!positive || (restNode !== null && signOf(g, restNode) <= 0 && common.length > 0)) {
    return g.node(Op.Ln, x, 0, realLog(g, x));
  }
  if (restNode !== null && signOf(g, restNode) <= 0) return g.node(Op.Ln, fromPolynomial(g, form), 0, realLog(g, x));
  let total = lnOfRational(g, isNegative(content) ? negateRational(content) : content);
  if (isNegative(content)) total = add(g, total, multiply(g, g.i, pi(g)));
  for (const { atom, exponent } of common) {
    const single = g.op[atom] === Op.Exp ? g.a[atom]! : g.node(Op.Ln, absolute(g, atom), 0, Flag.Real);
    total = add(g, total, scale(g, exponent, single));
  }
  return restNode === null ? total : add(g, total, g.node(Op.Ln, restNode, 0, Flag.Real));
}

/** c where the form is e^{iπc} for a twelfth-circle c in (−1, 1], else null. */
function turnOfUnit(g: Graph, form: Polynomial): Rational | null {
  if (form.size > 2) return null;
  for (const { monomial } of form.values()) {
    if (monomial.some(({ atom }) => atom !== g.i && !g.isNumber(atom))) return null;
  }
  for (const twelfth of [12, 2, 3, 4, 6, 8, 9, 10, -2, -3, -4, -6, -8, -9, -10]) {
    const c = rational(twelfth, 12);
    const unit = normalForm(g, exp(g, scale(g, c, multiply(g, g.i, pi(g)))));
    if (unit && equalForms(unit, form)) return c;
  }
  return null;
}

function equalForms(p: Polynomial, q: Polynomial): boolean {
  if (p.size !== q.size) return false;
  for (const [key, term] of p) {
    const other = q.get(key);
    if (!other || !equalRational(other.coefficient, term.coefficient)) return false;
  }
  return true;
}

const isEven = (x: Rational): boolean => !x.big && x.d === 1 && x.n % 2 === 0;

const realLog = (g: Graph, x: Node): number => (g.has(x, Flag.NonNegative) ? Flag.Real : 0);

function lnOfRational(g: Graph, c: Rational): Node {
  if (c.big) return g.node(Op.Ln, g.number(c), 0, Flag.Real);
  let total = g.zero;
  for (const [prime, exponent] of [...primePowers(c.n, 1), ...primePowers(c.d, -1)]) {
    total = add(g, total, scale(g, rational(exponent), g.node(Op.Ln, g.integer(prime), 0, Flag.Real)));
  }
  return total;
}
