import { featuresOf } from './features';
import { type FormSlip, type RatioSlip, type TreeSlip, type Trial } from './slip';
import { everywhereAndEach, numberNode } from './tree-changes';

const id = 'missing-i';
const sentence = 'the imaginary unit is left out or put in';

/** The imaginary unit was left out somewhere. */
export const missingI: FormSlip = { type: 'form', id, sentence, change: 'without-i' };

/** The same on the author's tree, where it may stand before an operator that has its own. */
export const missingIInTree: TreeSlip = {
  type: 'tree',
  needs: 'i',
  id,
  sentence,
  change: (tree) =>
    everywhereAndEach(tree, (node) => (node.node === 'constant' && node.name === 'i' ? numberNode(1n) : node)),
};

/** The imaginary unit was put in, in front of everything, where the reference has none. */
export const extraI: RatioSlip = {
  type: 'ratio',
  id,
  sentence,
  factors: [{ value: () => ({ re: 0, im: 1 }), node: (g) => g.i }],
  applies: ({ referenceTree }: Trial) => !featuresOf(referenceTree).i,
};
