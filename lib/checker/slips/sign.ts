import { MINUS_ONE } from '../algebra/rational';
import { type RatioSlip, realFactor } from './slip';

/** The overall sign is wrong. */
export const sign: RatioSlip = {
  type: 'ratio',
  id: 'sign',
  sentence: 'the overall sign is wrong',
  factors: [realFactor(MINUS_ONE)],
};
