import { adjoint, trace } from '../algebra/operators';
import { add, negate } from '../algebra/scalars';
import { vanishesAtPoints } from '../kinds/comparison';
import { type FormSlip, mapNodes, type ValueSlip } from './slip';
import { everywhereAndEach } from './tree-changes';

/** [B, A] was worked out for [A, B]. */
export const commutatorOrder: FormSlip = {
  type: 'form',
  id: 'commutator-order',
  sentence: 'the commutator is taken in the other order',
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
export const commutatorOrderOfValue: ValueSlip = {
  type: 'value',
  id: 'commutator-order',
  sentence: commutatorOrder.sentence,
  change: (value, { context }) => {
    if (value.kind !== 'operator' && value.kind !== 'pauli') return [];
    const { g } = context.environment;
    const conjugate = adjoint(g, value.matrix);
    const differences = value.matrix.map((node, k) => add(g, node, conjugate[k]!));
    const isCommutator = [trace(g, value.matrix), ...differences].every(
      (node) => node === g.zero || vanishesAtPoints(context, node),
    );
    return isCommutator ? [mapNodes(value, (node) => negate(g, node))] : [];
  },
};
