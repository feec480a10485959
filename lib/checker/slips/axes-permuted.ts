import { fromPauli, pauliCoefficients } from '../algebra/operators';
import { type Trial, type ValueSlip } from './slip';
import { looksEqual, valuesOf } from './numeric-match';

type Order = readonly [number, number, number];

/** The five permutations of (x, y, z) that are not the identity. */
const permutations: readonly Order[] = [
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
  change: (value, trial) => {
    const { g } = trial.context.environment;
    const { answer } = trial;
    if (value.kind === 'vector') {
      if (answer.kind !== 'vector') return [];
      const { components } = value;
      const orders = fitting(trial, components, answer.components);
      return orders.map((order) => ({ kind: 'vector', components: order.map((k) => components[k]!) }));
    }
    if (value.kind !== 'operator' && value.kind !== 'pauli') return [];
    if (answer.kind !== 'operator' && answer.kind !== 'pauli') return [];
    const [a0, ...axes] = pauliCoefficients(g, value.matrix);
    const [, ...given] = pauliCoefficients(g, answer.matrix);
    return fitting(trial, axes, given).map(([x, y, z]) => ({
      kind: value.kind,
      matrix: fromPauli(g, [a0, axes[x]!, axes[y]!, axes[z]!]),
    }));
  },
};

/** The permutations that look right at the trial's point; of operators up to a phase all. */
function fitting({ point, context }: Trial, wanted: readonly number[], given: readonly number[]): readonly Order[] {
  if (context.options.upToPhase || context.options.tolerance) return permutations;
  point.evaluate(Math.max(...wanted, ...given));
  const answer = valuesOf(point, given);
  return permutations.filter((order) =>
    looksEqual(
      'vector',
      {},
      valuesOf(
        point,
        order.map((k) => wanted[k]!),
      ),
      answer,
    ),
  );
}
