import { type FormSlip, type TreeSlip } from './slip';
import { everywhereAndEach } from './tree-changes';

const id = 'missing-root';
const sentence = 'a square root is left out';

/** A square root was left out. */
export const missingRoot: FormSlip = { type: 'form', id, sentence, change: 'without-root' };

/** The same on the author's tree, where roots of squares and the uncertainty are still to be seen. */
export const missingRootInTree: TreeSlip = {
  type: 'tree',
  id,
  sentence,
  change: (tree) =>
    everywhereAndEach(tree, (node) => {
      if (node.node === 'root' && node.degree === 2) return node.radicand;
      if (node.node === 'reference' && node.name === 'uncertainty') return { ...node, name: 'variance' };
      return node;
    }),
};
