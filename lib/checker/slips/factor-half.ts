import { HALF } from '../algebra/rational';
import { scale } from '../algebra/scalars';
import { mapNodes, type ValueSlip } from './slip';

/** The answer is half of what it should be. */
export const factorHalf: ValueSlip = {
  type: 'value',
  id: 'factor-half',
  sentence: 'it is half of what it should be',
  change: (value, { context }) => [mapNodes(value, (node) => scale(context.environment.g, HALF, node))],
};
