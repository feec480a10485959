import { multiply } from '../algebra/scalars';
import { type AnswerTree } from '../notation/answer-tree';
import { type FormSlip, mapNodes, type ValueSlip } from './slip';
import { everywhereAndEach, numberNode } from './tree-changes';

/** The imaginary unit was left out somewhere. */
export const missingI: FormSlip = {
  type: 'form',
  id: 'missing-i',
  sentence: 'the imaginary unit is left out or put in',
  change: (tree: AnswerTree) =>
    everywhereAndEach(tree, (node) => (node.node === 'constant' && node.name === 'i' ? numberNode(1n) : node)),
};

/** The imaginary unit was put in, or left out in front of everything. */
export const extraI: ValueSlip = {
  type: 'value',
  id: 'missing-i',
  sentence: missingI.sentence,
  change: (value, { context }) => {
    const { g } = context.environment;
    return [g.i, multiply(g, g.integer(-1), g.i)].map((factor) => mapNodes(value, (node) => multiply(g, factor, node)));
  },
};
