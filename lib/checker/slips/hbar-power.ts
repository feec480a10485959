import { power } from '../algebra/scalars';
import { type RatioSlip } from './slip';

/** A power of ħ is missing, or there is one too many. */
export const hbarPower: RatioSlip = {
  type: 'ratio',
  id: 'hbar-power',
  sentence: 'a power of ħ is missing or too many',
  factors: (g, hbar) => [-1, 1, -2, 2].map((n) => power(g, hbar, n)),
};
