import { rational } from '../algebra/rational';
import { pi, power, scale } from '../algebra/scalars';
import { type RatioSlip } from './slip';

/** A frequency was given for an angular frequency, or the other way round. */
export const missingTwoPi: RatioSlip = {
  type: 'ratio',
  id: 'missing-two-pi',
  sentence: 'a factor 2π between frequency and angular frequency is missing or too many',
  factors: (g) => {
    const turn = scale(g, rational(2), pi(g));
    return [power(g, turn, -1), turn];
  },
  applies: ({ reference }) => reference.kind !== 'state',
};
