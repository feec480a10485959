import { type RatioSlip } from './slip';

/** The overall sign is wrong. */
export const sign: RatioSlip = {
  type: 'ratio',
  id: 'sign',
  sentence: 'the overall sign is wrong',
  factors: (g) => [g.integer(-1)],
};
