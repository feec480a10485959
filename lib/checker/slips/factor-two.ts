import { TWO } from '../algebra/rational';
import { type RatioSlip, realFactor } from './slip';

/** The answer is twice what it should be. */
export const factorTwo: RatioSlip = {
  type: 'ratio',
  id: 'factor-two',
  sentence: 'it is twice what it should be',
  factors: [realFactor(TWO)],
};
