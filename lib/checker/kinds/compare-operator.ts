import { absoluteSquare } from '../algebra/conjugate';
import { type Node } from '../algebra/graph';
import { type Operator } from '../algebra/operators';
import { multiply, sum } from '../algebra/scalars';
import { type Comparison, compareElements, type Context, type Element, vanishesAtPoints } from './comparison';
import { formatValue } from './format-witness';

/** Entry by entry, or up to a factor of modulus 1 with `upToPhase`. */
export function compareOperators(context: Context, reference: Operator, answer: Operator): Comparison {
  if (context.options.upToPhase) return compareUpToPhase(context, reference, answer);
  return compareElements(context, entryElements(reference, answer));
}

const places: readonly (readonly [number, number])[] = [
  [1, 1],
  [1, 2],
  [2, 1],
  [2, 2],
];

function entryElements(reference: Operator, answer: Operator): Element[] {
  return places.map(([row, column], k) => ({
    pair: [reference[k]!, answer[k]!],
    label: `row ${row}, column ${column}`,
    place: [row, column],
  }));
}

/**
 * A = e^{iα}R for some α exactly where every A_j R_k = A_k R_j and Σ|A|² = Σ|R|². With R_k not the zero function the
 * products with that one k are enough.
 */
function compareUpToPhase(context: Context, reference: Operator, answer: Operator): Comparison {
  const { g } = context.environment;
  const pivot = reference.findIndex((entry) => !vanishesAtPoints(context, entry));
  if (pivot < 0) return compareElements(context, entryElements(reference, answer));
  const cross: Element[] = places
    .map(([row, column], k): Element => {
      const left = multiply(g, reference[k]!, answer[pivot]!);
      const right = multiply(g, answer[k]!, reference[pivot]!);
      return { pair: [left, right], label: `row ${row}, column ${column}`, place: [row, column] };
    })
    .filter((_, k) => k !== pivot);
  const size = (m: Operator): Node =>
    sum(
      g,
      m.map((entry) => absoluteSquare(g, entry)),
    );
  const norms: Element = { pair: [size(reference), size(answer)], label: 'norm', place: [] };
  return compareElements(context, [norms, ...cross], (point) => {
    for (const node of [...reference, ...answer]) point.evaluate(node);
    const show = (m: Operator): string => {
      const [a, b, c, d] = m.map((node) => formatValue(point, node));
      return `[[${a}, ${b}], [${c}, ${d}]]`;
    };
    return { reference: show(reference), answer: show(answer) };
  });
}
