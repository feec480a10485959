import { type Graph, type Node, Op } from '../algebra/graph';
import { nodesUnder, rebuild } from '../algebra/rebuild';
import { negate } from '../algebra/scalars';
import { type Decision } from './decide';
import { type Proof } from './proof';
import { type Pair } from './size-bound';

/** Cases double with every absolute value. */
const MOST_ABSOLUTE_VALUES = 3;

/**
 * An exponential hides that it is even in |a|. Where a ≥ 0, |a| is a, and −a elsewhere: two sides that are equal with
 * either in the place of every absolute value are equal everywhere.
 */
export function sameOnEverySign(
  g: Graph,
  pairs: readonly Pair[],
  decide: (pairs: readonly Pair[]) => Decision,
): Proof | null {
  const roots = pairs.flat();
  const absolutes = [...nodesUnder(g, roots)].filter((node) => g.op[node] === Op.Abs);
  if (absolutes.length === 0 || absolutes.length > MOST_ABSOLUTE_VALUES) return null;
  let weakest: Proof | null = null;
  const cases = 2 ** absolutes.length;
  for (let signs = 0; signs < cases; signs++) {
    const built = rebuild(g, roots, (node, rebuilt) => {
      const k = absolutes.indexOf(node);
      if (k < 0) return null;
      const inside = rebuilt(g.a[node]!);
      return (signs >> k) & 1 ? negate(g, inside) : inside;
    });
    const get = (node: Node): Node => built.get(node) ?? node;
    const decision = decide(pairs.map(([x, y]): Pair => [get(x), get(y)]));
    if (decision.status !== 'equal') return null;
    const bound = cases * decision.proof.bound;
    if (!weakest || bound > weakest.bound) weakest = { ...decision.proof, bound, branches: cases };
  }
  return weakest;
}
