import { identityTimes, pauliCoefficients, subtractOperators } from '../algebra/operators';
import { type ValueSlip } from './slip';

/** The multiple of the identity was left out. */
export const missingConstant: ValueSlip = {
  type: 'value',
  id: 'missing-constant',
  sentence: 'the multiple of the identity is left out',
  change: (value, { context }) => {
    if (value.kind !== 'operator' && value.kind !== 'pauli') return [];
    const { g } = context.environment;
    const [a0] = pauliCoefficients(g, value.matrix);
    return [{ kind: value.kind, matrix: subtractOperators(g, value.matrix, identityTimes(g, a0)) }];
  },
};
