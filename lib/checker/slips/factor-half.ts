import { HALF } from '../algebra/rational';
import { type RatioSlip, realFactor } from './slip';

/** The answer is half of what it should be. */
export const factorHalf: RatioSlip = {
  type: 'ratio',
  id: 'factor-half',
  sentence: 'it is half of what it should be',
  factors: [realFactor(HALF)],
};
