import { rational } from '../algebra/rational';
import { pi, power, scale } from '../algebra/scalars';
import { type RatioSlip } from './slip';

/** A frequency was given for an angular frequency, or the other way round. */
export const missingTwoPi: RatioSlip = {
  type: 'ratio',
  id: 'missing-two-pi',
  sentence: 'a factor 2π between frequency and angular frequency is missing or too many',
  factors: [-1, 1].map((n) => ({
    value: () => ({ re: (2 * Math.PI) ** n, im: 0 }),
    node: (g) => power(g, scale(g, rational(2), pi(g)), n),
  })),
  applies: ({ reference }) => reference.kind !== 'state',
};
