import { type Node } from '../algebra/graph';
import { type Tolerance } from '../contract';
import { type AnswerValue } from './answer-value';
import { nodesOf } from './compare';
import { type Comparison, type Context } from './comparison';
import { formatComplex, witnessValues } from './format-witness';
import { typedFigures } from './typed-figures';

/** A value on the edge of a tolerance is within it; this much rounding of doubles is forgiven there. */
const EDGE = 1e-11;

/** Whether |distance| is allowed beside a reference of this size; both in the reference's unit. */
export function isWithin(tolerance: Tolerance, distance: number, reference: number): boolean {
  const size = Math.abs(reference);
  const slack = EDGE * size;
  if (tolerance.relative !== undefined) return distance <= tolerance.relative * size + slack;
  if (tolerance.absolute !== undefined) return distance <= tolerance.absolute + slack;
  if (tolerance.significantFigures !== undefined) {
    return distance <= halfUnitOfFigure(size, tolerance.significantFigures) + slack;
  }
  return distance <= slack;
}

/** Half a unit of the n-th significant figure of a number. */
function halfUnitOfFigure(size: number, n: number): number {
  return size === 0 ? 0 : 0.5 * 10 ** (Math.floor(Math.log10(size) + 1e-12) - n + 1);
}

/** Compares numerically, element by element, within the tolerance the caller gives, at points of the domain. */
export function compareWithin(
  context: Context,
  tolerance: Tolerance,
  reference: AnswerValue,
  answer: AnswerValue,
): Comparison {
  const { significantFigures } = tolerance;
  if (significantFigures !== undefined && answer.kind === 'scalar') {
    const typed = typedFigures(answer.tree);
    if (typed !== null && typed < significantFigures) return tooFewFigures(tolerance, typed, significantFigures);
  }
  const left = nodesOf(reference);
  const right = nodesOf(answer);
  if (left.length !== right.length) {
    return {
      verdict: 'differs',
      evidence: () => ({ test: 'structure', reason: 'the number of values differs' }),
      message: 'The answer does not have as many values as were asked for.',
    };
  }
  let farthest = 0;
  let seen = 0;
  const wanted = context.environment.g.variables.length > 1 ? 8 : 2;
  for (let k = 0; k < 40 && seen < wanted; k++) {
    const point = context.points.at(k);
    if (!point) continue;
    point.evaluate(Math.max(...left, ...right));
    if (![...left, ...right].every((node) => point.isKnown(node))) continue;
    seen++;
    const orders = reference.kind === 'eigenvalues' ? [right, [...right].reverse()] : [right];
    const fits = orders.map((order) => largestGap(order));
    const best = fits.reduce((x, y) => (y.within && !x.within ? y : x));
    farthest = Math.max(farthest, best.relative);
    if (!best.within) {
      return {
        verdict: 'differs',
        evidence: () => ({
          test: 'tolerance',
          tolerance,
          distance: best.relative,
          witness: {
            values: witnessValues(context.environment, point, [...left, ...right]),
            element: '',
            reference: left.map((node) => formatComplex(point.re[node]!, point.im[node]!)).join(', '),
            answer: right.map((node) => formatComplex(point.re[node]!, point.im[node]!)).join(', '),
          },
        }),
        point,
      };
    }
    function largestGap(order: readonly Node[]): { within: boolean; relative: number } {
      let within = true;
      let relative = 0;
      for (let j = 0; j < left.length; j++) {
        const [x, y] = [left[j]!, order[j]!];
        const distance = Math.hypot(point!.re[x]! - point!.re[y]!, point!.im[x]! - point!.im[y]!);
        const size = Math.hypot(point!.re[x]!, point!.im[x]!);
        within &&= isWithin(tolerance, distance, size);
        relative = Math.max(relative, size === 0 ? (distance === 0 ? 0 : Infinity) : distance / size);
      }
      return { within, relative };
    }
  }
  if (seen === 0) {
    return {
      verdict: 'undecided',
      evidence: () => ({ test: 'none', reason: 'no point was found at which both sides are defined' }),
    };
  }
  return {
    verdict: 'agrees',
    evidence: () => ({ test: 'tolerance', tolerance, distance: farthest, points: seen }),
  };
}

export function tooFewFigures(tolerance: Tolerance, typed: number, wanted: number): Comparison {
  return {
    verdict: 'differs',
    evidence: () => ({ test: 'tolerance', tolerance, reason: 'too few significant figures' }),
    message: `${wanted} significant figures were asked for; the answer has ${typed}.`,
  };
}
