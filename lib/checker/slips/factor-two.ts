import { type RatioSlip } from './slip';

/** The answer is twice what it should be. */
export const factorTwo: RatioSlip = {
  type: 'ratio',
  id: 'factor-two',
  sentence: 'it is twice what it should be',
  factors: (g) => [g.integer(2)],
};
