import { type Expression } from '../notation/tree';
import { type FormSlip, type TreeSlip } from './slip';
import { everywhereAndEach } from './tree-changes';

const id = 'missing-root';
const sentence = 'a square root is left out';

/** A square root was left out. */
export const missingRoot: FormSlip = { type: 'form', id, sentence, change: 'without-root' };

/** The same on the author's tree, where roots of squares and the uncertainty are still to be seen. */
export const missingRootInTree: TreeSlip = {
  type: 'tree',
  needs: 'root',
  id,
  sentence,
  change: (tree) =>
    everywhereAndEach(tree, (node) => {
      if (node.node === 'root' && node.degree === 2) return node.radicand;
      if (node.node === 'power' && node.type === 'scalar' && isHalf(node.exponent)) return node.base;
      if (node.node === 'reference' && node.name === 'uncertainty') return { ...node, name: 'variance' };
      return node;
    }),
};

/** Whether an exponent is written as one half. */
function isHalf(tree: Expression): boolean {
  switch (tree.node) {
    case 'group':
      return isHalf(tree.body);
    case 'number':
      return 2n * tree.numerator === tree.denominator;
    case 'fraction':
      return isNumber(tree.numerator, 1n) && isNumber(tree.denominator, 2n);
    case 'product': {
      const [first, second] = tree.factors;
      return (
        tree.factors.length === 2 && second?.join === 'over' && isNumber(first?.body, 1n) && isNumber(second.body, 2n)
      );
    }
    default:
      return false;
  }
}

const isNumber = (tree: Expression | undefined, n: bigint): boolean =>
  tree?.node === 'number' && tree.numerator === n * tree.denominator;
