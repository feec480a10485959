import { conjugate } from '../algebra/conjugate';
import { conjugateComponents } from '../algebra/operators';
import { mapNodes, type ValueSlip } from './slip';

/** The complex conjugate was given. */
export const conjugated: ValueSlip = {
  type: 'value',
  id: 'conjugated',
  sentence: 'it is the complex conjugate',
  change: (value, { context }) => {
    const { g } = context.environment;
    if (value.kind === 'vector') return [];
    if (value.kind === 'eigenpairs') {
      const pairs = value.pairs.map((pair) => ({ value: pair.value, state: conjugateComponents(g, pair.state) }));
      return [{ kind: 'eigenpairs', pairs }];
    }
    return [mapNodes(value, (node) => conjugate(g, node))];
  },
};
