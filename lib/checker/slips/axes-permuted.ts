import { fromPauli, pauliCoefficients } from '../algebra/operators';
import { type ValueSlip } from './slip';

/** The five permutations of (x, y, z) that are not the identity. */
const permutations: readonly (readonly [number, number, number])[] = [
  [1, 0, 2],
  [2, 1, 0],
  [0, 2, 1],
  [1, 2, 0],
  [2, 0, 1],
];

/** The axes x, y, z were permuted. */
export const axesPermuted: ValueSlip = {
  type: 'value',
  id: 'axes-permuted',
  sentence: 'the axes x, y and z are permuted',
  change: (value, { context }) => {
    const { g } = context.environment;
    if (value.kind === 'vector') {
      const { components } = value;
      return permutations.map((order) => ({ kind: 'vector', components: order.map((k) => components[k]!) }));
    }
    if (value.kind !== 'operator' && value.kind !== 'pauli') return [];
    const [a0, ...axes] = pauliCoefficients(g, value.matrix);
    return permutations.map(([x, y, z]) => ({
      kind: value.kind,
      matrix: fromPauli(g, [a0, axes[x]!, axes[y]!, axes[z]!]),
    }));
  },
};
