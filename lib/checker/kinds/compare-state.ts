import { type Components, normSquared } from '../algebra/operators';
import { multiply } from '../algebra/scalars';
import { both, type Comparison, compareElements, type Context, type Describe, vanishesAtPoints } from './comparison';
import { formatValue } from './format-witness';

/**
 * Component by component, or up to a phase or scale: two non-zero vectors are multiples of each other exactly where
 * a₁r₂ = a₂r₁, by a phase where their norms are equal too. The zero vector never agrees.
 */
export function compareStates(context: Context, reference: Components, answer: Components): Comparison {
  const { environment, options } = context;
  const { g } = environment;
  const norm = normSquared(g, answer);
  if (norm === g.zero || vanishesAtPoints(context, norm)) {
    const message = 'The zero vector is not a state.';
    return { verdict: 'differs', evidence: () => ({ test: 'structure', reason: 'the zero vector' }), message };
  }
  const first =
    options.upToScale || options.upToPhase
      ? compareRays(context, reference, answer)
      : direct(context, reference, answer);
  if (!options.requireNormalised) return first;
  return both(first, () => {
    const unit = compareElements(context, [{ pair: [g.one, norm], label: 'norm', place: [] }]);
    return unit.verdict === 'differs' ? { ...unit, message: 'The state is not normalised.' } : unit;
  });
}

function direct(context: Context, reference: Components, answer: Components): Comparison {
  return compareElements(context, [
    { pair: [reference[0], answer[0]], label: 'component 1', place: [1] },
    { pair: [reference[1], answer[1]], label: 'component 2', place: [2] },
  ]);
}

function compareRays(context: Context, reference: Components, answer: Components): Comparison {
  const { g } = context.environment;
  const describe: Describe = (point) => {
    for (const node of [...reference, ...answer]) point.evaluate(node);
    const show = (v: Components): string => `(${formatValue(point, v[0])}, ${formatValue(point, v[1])})`;
    return { reference: show(reference), answer: show(answer) };
  };
  const cross = {
    pair: [multiply(g, reference[1], answer[0]), multiply(g, reference[0], answer[1])] as const,
    label: 'ratio of the components',
    place: [],
  };
  if (context.options.upToScale) return compareElements(context, [cross], describe);
  const norms = {
    pair: [normSquared(g, reference), normSquared(g, answer)] as const,
    label: 'norm',
    place: [],
  };
  return compareElements(context, [cross, norms], describe);
}
