import { adjoint, trace } from '../algebra/operators';
import { MINUS_ONE } from '../algebra/rational';
import { add } from '../algebra/scalars';
import { vanishesAtPoints } from '../kinds/comparison';
import { type RatioSlip, realFactor, type TreeSlip } from './slip';
import { everywhereAndEach } from './tree-changes';

const id = 'commutator-order';
const sentence = 'the commutator is taken in the other order';

/** [B, A] was worked out for [A, B]. */
export const commutatorOrder: TreeSlip = {
  type: 'tree',
  needs: 'commutator',
  id,
  sentence,
  change: (tree) =>
    everywhereAndEach(tree, (node) => {
      if (node.node === 'commutator') return { ...node, left: node.right, right: node.left };
      if (node.node === 'reference' && node.name === 'commutator') {
        return { ...node, arguments: [...node.arguments].reverse() };
      }
      return node;
    }),
};

/**
 * The same where the author wrote the commutator's value: one of two Hermitian operators has no trace and is minus its
 * adjoint, and the other order is its negative.
 */
export const commutatorOrderOfValue: RatioSlip = {
  type: 'ratio',
  id,
  sentence,
  factors: [realFactor(MINUS_ONE)],
  applies: ({ reference, context }) => {
    if (reference.kind !== 'operator' && reference.kind !== 'pauli') return false;
    const { g } = context.environment;
    const conjugate = adjoint(g, reference.matrix);
    const differences = reference.matrix.map((node, k) => add(g, node, conjugate[k]!));
    return [trace(g, reference.matrix), ...differences].every(
      (node) => node === g.zero || vanishesAtPoints(context, node),
    );
  },
};
