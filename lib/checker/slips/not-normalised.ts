import { compareStates } from '../kinds/compare-state';
import { compareEigenpairs } from '../kinds/compare-eigenpairs';
import { compareScalars } from '../kinds/compare-scalar';
import { normSquared } from '../algebra/operators';
import { type TestSlip } from './slip';

/** The right ray, but not of the norm asked for. */
export const notNormalised: TestSlip = {
  type: 'test',
  id: 'not-normalised',
  sentence: 'the direction is right, the norm is not',
  fits: ({ reference, answer, context }) => {
    const relaxed = { ...context, options: { ...context.options, upToScale: true, requireNormalised: false } };
    if (reference.kind === 'eigenpairs' && answer.kind === 'eigenpairs') {
      return compareEigenpairs(relaxed, reference.pairs, answer.pairs).verdict === 'agrees';
    }
    if (reference.kind !== 'state' || answer.kind !== 'state') return false;
    if (compareStates(relaxed, reference.components, answer.components).verdict !== 'agrees') return false;
    const { g } = context.environment;
    const wanted = context.options.requireNormalised ? g.one : normSquared(g, reference.components);
    return compareScalars(context, wanted, normSquared(g, answer.components)).verdict === 'differs';
  },
};
