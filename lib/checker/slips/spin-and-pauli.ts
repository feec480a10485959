import { type TreeSlip } from './slip';
import { everywhere } from './tree-changes';

/** σ stands where S should. */
export const pauliForSpin: TreeSlip = {
  type: 'tree',
  needs: 'spin',
  id: 'pauli-for-spin',
  sentence: 'a Pauli matrix stands where a spin operator should',
  change: (tree) =>
    everywhere(tree, (node) =>
      node.node === 'operator' && node.family === 'spin' ? { ...node, family: 'pauli' } : node,
    ),
};

/** S stands where σ should. */
export const spinForPauli: TreeSlip = {
  type: 'tree',
  needs: 'pauli',
  id: 'spin-for-pauli',
  sentence: 'a spin operator stands where a Pauli matrix should',
  change: (tree) =>
    everywhere(tree, (node) =>
      node.node === 'operator' && node.family === 'pauli' ? { ...node, family: 'spin' } : node,
    ),
};
