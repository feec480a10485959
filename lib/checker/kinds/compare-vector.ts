import { imaginaryPart } from '../algebra/conjugate';
import { type Node } from '../algebra/graph';
import { type Comparison, compareElements, type Context } from './comparison';

/** Equal component by component; a component that is not real differs from a real reference by itself. */
export function compareVectors(context: Context, reference: readonly Node[], answer: readonly Node[]): Comparison {
  const { g } = context.environment;
  const compared = compareElements(
    context,
    reference.map((node, k) => ({ pair: [node, answer[k]!] as const, label: `component ${k + 1}`, place: [k + 1] })),
  );
  if (compared.verdict !== 'agrees') return compared;
  const real = compareElements(
    context,
    answer.map((node, k) => ({
      pair: [g.zero, imaginaryPart(g, node)] as const,
      label: `imaginary part of component ${k + 1}`,
      place: [k + 1],
    })),
  );
  if (real.verdict === 'agrees') return compared;
  return real.verdict === 'differs' ? { ...real, message: 'A component is not real.' } : real;
}
