import { TWO } from '../algebra/rational';
import { scale } from '../algebra/scalars';
import { mapNodes, type ValueSlip } from './slip';

/** The answer is twice what it should be. */
export const factorTwo: ValueSlip = {
  type: 'value',
  id: 'factor-two',
  sentence: 'it is twice what it should be',
  change: (value, { context }) => [mapNodes(value, (node) => scale(context.environment.g, TWO, node))],
};
