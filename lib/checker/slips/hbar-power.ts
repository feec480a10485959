import { power } from '../algebra/scalars';
import { type RatioSlip } from './slip';

/** A power of ħ is missing, or there is one too many. */
export const hbarPower: RatioSlip = {
  type: 'ratio',
  id: 'hbar-power',
  sentence: 'a power of ħ is missing or too many',
  factors: [-1, 1, -2, 2].map((n) => ({
    value: (hbar) => ({ re: hbar ** n, im: 0 }),
    node: (g, hbar) => power(g, hbar, n),
  })),
};
