import { negate } from '../algebra/scalars';
import { mapNodes, type ValueSlip } from './slip';

/** The overall sign is wrong. */
export const sign: ValueSlip = {
  type: 'value',
  id: 'sign',
  sentence: 'the overall sign is wrong',
  change: (value, { context }) => [mapNodes(value, (node) => negate(context.environment.g, node))],
};
