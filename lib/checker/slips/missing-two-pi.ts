import { rational } from '../algebra/rational';
import { multiply, pi, power, scale } from '../algebra/scalars';
import { mapNodes, type ValueSlip } from './slip';

/** A frequency was given for an angular frequency, or the other way round. */
export const missingTwoPi: ValueSlip = {
  type: 'value',
  id: 'missing-two-pi',
  sentence: 'a factor 2π between frequency and angular frequency is missing or too many',
  change: (value, { context }) => {
    const { g } = context.environment;
    if (value.kind === 'state') return [];
    const turn = scale(g, rational(2), pi(g));
    return [power(g, turn, -1), turn].map((factor) => mapNodes(value, (node) => multiply(g, factor, node)));
  },
};
