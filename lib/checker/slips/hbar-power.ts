import { multiply, power } from '../algebra/scalars';
import { mapNodes, type ValueSlip } from './slip';

/** A power of ħ is missing, or there is one too many. */
export const hbarPower: ValueSlip = {
  type: 'value',
  id: 'hbar-power',
  sentence: 'a power of ħ is missing or too many',
  change: (value, { context }) => {
    const { g, hbar } = context.environment;
    return [-1, 1, -2, 2].map((n) => {
      const factor = power(g, hbar, n);
      return mapNodes(value, (node) => multiply(g, factor, node));
    });
  },
};
