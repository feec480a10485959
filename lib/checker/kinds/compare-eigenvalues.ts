import { type Node } from '../algebra/graph';
import { add, multiply } from '../algebra/scalars';
import { type Comparison, compareElements, type Context } from './comparison';
import { formatValue } from './format-witness';

/**
 * Equal as multisets at every point: two pairs are so exactly where their sums and their products are equal, whatever
 * the branch of a root. One value differs from two.
 */
export function compareEigenvalues(context: Context, reference: readonly Node[], answer: readonly Node[]): Comparison {
  const { g } = context.environment;
  const [r1, r2] = reference;
  const [a1, a2] = answer;
  if (r1 === undefined || r2 === undefined || a1 === undefined || a2 === undefined || answer.length !== 2) {
    return {
      verdict: 'differs',
      evidence: () => ({ test: 'structure', reason: 'two values were asked for' }),
      message: `Two eigenvalues were asked for; the answer gives ${answer.length === 1 ? 'one' : answer.length}.`,
    };
  }
  return compareElements(
    context,
    [
      { pair: [add(g, r1, r2), add(g, a1, a2)], label: 'sum', place: [] },
      { pair: [multiply(g, r1, r2), multiply(g, a1, a2)], label: 'product', place: [] },
    ],
    (point) => {
      for (const node of [r1, r2, a1, a2]) point.evaluate(node);
      const show = (x: Node, y: Node): string => `{${formatValue(point, x)}, ${formatValue(point, y)}}`;
      return { reference: show(r1, r2), answer: show(a1, a2) };
    },
  );
}
