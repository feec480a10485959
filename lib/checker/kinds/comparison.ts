import { type Environment } from '../algebra/environment';
import { type Node } from '../algebra/graph';
import { type CheckOptions, type Evidence, type EvidenceTest, type Witness } from '../contract';
import { type Decision, decideEqual, differsAt } from '../equivalence/decide';
import { type NumericPoint } from '../equivalence/numeric';
import { type SamplePoints } from '../equivalence/sample-points';
import { type Pair } from '../equivalence/size-bound';
import { formatValue, witnessValues } from './format-witness';

/** What comparing needs of the check it is part of. */
export interface Context {
  readonly environment: Environment;
  readonly points: SamplePoints;
  readonly seed: number;
  readonly options: CheckOptions;
}

/** The outcome of comparing two values of one kind. */
export interface Comparison {
  readonly verdict: 'agrees' | 'differs' | 'undecided';
  /** Put together when asked for: most comparisons of changed references are not shown. */
  readonly evidence: () => Evidence;
  /** A sentence of its own where the usual one would not do. */
  readonly message?: string;
  /** The point of the witness. */
  readonly point?: NumericPoint;
}

/** Two nodes that must be equal, and where they stand in the answer. */
export interface Element {
  readonly pair: Pair;
  readonly label: string;
  /** Row and column, or component, from 1; empty for a scalar. */
  readonly place: readonly number[];
}

/** How a witness shows the two sides, where the pairs themselves would say little. */
export type Describe = (point: NumericPoint) => { readonly reference: string; readonly answer: string };

/** Compares element by element; the first of each pair is the reference's. */
export function compareElements(context: Context, elements: readonly Element[], describe?: Describe): Comparison {
  const { environment, points, seed } = context;
  const pairs = elements.map((element) => element.pair);
  const decision = decideEqual(environment.g, pairs, points, seed);
  return fromDecision(context, decision, elements, describe);
}

function fromDecision(
  context: Context,
  decision: Decision,
  elements: readonly Element[],
  describe: Describe | undefined,
): Comparison {
  switch (decision.status) {
    case 'equal': {
      const { bound, fields, degree, branches, points } = decision.proof;
      const exact = decision.test === 'normal form';
      return {
        verdict: 'agrees',
        evidence: () =>
          exact ? { test: decision.test } : { test: decision.test, bound, fields, degree, branches, points },
      };
    }
    case 'different': {
      const { unsolved } = context.environment;
      if (unsolved) return { verdict: 'undecided', evidence: () => ({ test: 'none', reason: unsolved }) };
      return {
        verdict: 'differs',
        evidence: () => differing(context, decision, elements, describe),
        point: decision.point,
      };
    }
    case 'undecided':
      return { verdict: 'undecided', evidence: () => ({ test: 'none', reason: decision.reason }) };
  }
}

function differing(
  context: Context,
  decision: Extract<Decision, { status: 'different' }>,
  elements: readonly Element[],
  describe: Describe | undefined,
): Evidence {
  const { point } = decision;
  const first = elements[decision.pair]!;
  const wrong = elements.filter(
    ({ pair: [x, y] }, k) => k === decision.pair || (x !== y && !decision.precise && differsAt(point, x, y)),
  );
  const places = wrong.map((element) => element.place).filter((place) => place.length > 0);
  const sides = decision.precise
    ? decision.precise
    : describe
      ? describe(point)
      : { reference: formatValue(point, first.pair[0]), answer: formatValue(point, first.pair[1]) };
  const witness: Witness = {
    values: witnessValues(context.environment, point, first.pair),
    element: describe && !decision.precise ? '' : first.label,
    ...sides,
  };
  const test: EvidenceTest = decision.precise ? 'high-precision witness' : 'witness';
  return places.length > 0 ? { test, witness, elements: places } : { test, witness };
}

/** Both must hold; the first that does not decides. */
export function both(first: Comparison, second: () => Comparison): Comparison {
  if (first.verdict === 'differs') return first;
  const next = second();
  if (next.verdict !== 'agrees') return next;
  if (first.verdict !== 'agrees') return first;
  return (first.evidence().bound ?? 0) > (next.evidence().bound ?? 0) ? first : next;
}

/** Whether a value is the zero function, as far as sample points show: no point where it is clearly not zero. */
export function vanishesAtPoints(context: Context, node: Node): boolean {
  for (let k = 0; k < 6; k++) {
    const point = context.points.at(k);
    if (!point) continue;
    point.evaluate(node);
    if (!point.isKnown(node)) continue;
    if (Math.hypot(point.re[node]!, point.im[node]!) > 4 * point.error[node]!) return false;
  }
  return true;
}
