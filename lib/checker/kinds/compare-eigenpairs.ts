import { type Graph } from '../algebra/graph';
import { normSquared, type Operator } from '../algebra/operators';
import { add, divide, multiply, subtract } from '../algebra/scalars';
import { type Eigenpair } from '../algebra/value';
import { both, type Comparison, compareElements, type Context, vanishesAtPoints } from './comparison';
import { compareEigenvalues } from './compare-eigenvalues';

/**
 * Two pairs (λ, v) with independent states are the eigenpairs of exactly one operator VΛV⁻¹. Values and rays match in
 * either order, a degenerate pair by its span, exactly where those operators are equal.
 */
export function compareEigenpairs(
  context: Context,
  reference: readonly Eigenpair[],
  answer: readonly Eigenpair[],
): Comparison {
  const { environment, options } = context;
  const { g } = environment;
  const [r1, r2] = reference;
  const [a1, a2] = answer;
  if (!r1 || !r2 || !a1 || !a2 || answer.length !== 2)
    return shape('two pairs were asked for', 'Two pairs of a value and a state were asked for.');
  if (vanishesAtPoints(context, determinantOf(g, a1, a2))) {
    return shape('dependent states', 'The two states are multiples of each other, or one is zero.');
  }
  const values = compareEigenvalues(context, [r1.value, r2.value], [a1.value, a2.value]);
  const operators = both(values, () => {
    const x = operatorOf(g, r1, r2);
    const y = operatorOf(g, a1, a2);
    const labels = ['row 1, column 1', 'row 1, column 2', 'row 2, column 1', 'row 2, column 2'];
    const states = compareElements(
      context,
      x.map((node, k) => ({
        pair: [node, y[k]!] as const,
        label: `operator with these eigenpairs, ${labels[k]}`,
        place: [],
      })),
    );
    return states.verdict === 'differs'
      ? { ...states, message: 'The values agree; the states do not belong to them.' }
      : states;
  });
  if (!options.requireNormalised) return operators;
  return both(operators, () => {
    const unit = compareElements(
      context,
      [a1, a2].map(({ state }, k) => ({
        pair: [g.one, normSquared(g, state)] as const,
        label: `norm of state ${k + 1}`,
        place: [],
      })),
    );
    return unit.verdict === 'differs' ? { ...unit, message: 'A state is not normalised.' } : unit;
  });
}

function shape(reason: string, message: string): Comparison {
  return { verdict: 'differs', evidence: () => ({ test: 'structure', reason }), message };
}

function determinantOf(g: Graph, p: Eigenpair, q: Eigenpair): number {
  return subtract(g, multiply(g, p.state[0], q.state[1]), multiply(g, p.state[1], q.state[0]));
}

/** VΛV⁻¹ for V = (v | w). */
function operatorOf(g: Graph, p: Eigenpair, q: Eigenpair): Operator {
  const [v1, v2] = p.state;
  const [w1, w2] = q.state;
  const d = determinantOf(g, p, q);
  const entry = (a: number, b: number, c: number, e: number): number =>
    divide(g, add(g, multiply(g, p.value, multiply(g, a, b)), multiply(g, q.value, multiply(g, c, e))), d);
  const minus = (x: number): number => subtract(g, g.zero, x);
  return [
    entry(v1, w2, minus(w1), v2),
    entry(minus(v1), w1, w1, v1),
    entry(v2, w2, minus(w2), v2),
    entry(minus(v2), w1, w2, v1),
  ];
}
