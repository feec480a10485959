import { half, subtract } from '../algebra/scalars';
import { type ValueSlip } from './slip';

/** The eigenvalues were put about zero instead of about their centre. */
export const centredEigenvalues: ValueSlip = {
  type: 'value',
  id: 'centred-eigenvalues',
  sentence: 'the values lie about zero instead of about their centre',
  change: (value, { context }) => {
    const { g } = context.environment;
    const [first, second] = value.kind === 'eigenvalues' ? value.values : [];
    if (first === undefined || second === undefined) return [];
    const splitting = half(g, subtract(g, first, second));
    return [{ kind: 'eigenvalues', values: [splitting, subtract(g, g.zero, splitting)] }];
  },
};
