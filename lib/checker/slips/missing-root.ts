import { type FormSlip } from './slip';
import { everywhereAndEach } from './tree-changes';

/** A square root was left out. */
export const missingRoot: FormSlip = {
  type: 'form',
  id: 'missing-root',
  sentence: 'a square root is left out',
  change: (tree) =>
    everywhereAndEach(tree, (node) => {
      if (node.node === 'root' && node.degree === 2) return node.radicand;
      if (node.node === 'reference' && node.name === 'uncertainty') return { ...node, name: 'variance' };
      return node;
    }),
};
