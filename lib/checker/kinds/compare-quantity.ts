import { type Environment } from '../algebra/environment';
import { NumericPoint } from '../equivalence/numeric';
import { type Tolerance } from '../contract';
import { type QuantityNode, type UnitFactor } from '../notation/answer-tree';
import { type Comparison } from './comparison';
import { formatNumber } from './format-witness';
import { isWithin, tooFewFigures } from './tolerance';
import { typedFigures } from './typed-figures';
import { isHertzAgainstRadian, sameDimension, type UnitValue, unitValue } from './unit-values';

/** What applies where the caller gives none: a value right to three significant figures always agrees. */
export const DEFAULT_TOLERANCE: Tolerance = { relative: 0.005 };

/** A comparison of quantities, with the slips that only quantities have. */
export interface QuantityComparison extends Comparison {
  /** Answer over reference as bare numbers, in the reference's unit where the dimensions agree. */
  readonly slips: readonly string[];
}

const NO_UNIT: UnitValue = { factor: 1, powers: [0, 0, 0, 0, 0, 0, 0], hertz: 0, radian: 0 };
const TURN = 2 * Math.PI;

/** Same dimension and within the tolerance; the same frequency in the other of Hz and rad/s differs and says so. */
export function compareQuantities(
  environment: Environment,
  given: Tolerance | undefined,
  reference: QuantityNode,
  answer: QuantityNode,
): QuantityComparison {
  const tolerance = given ?? DEFAULT_TOLERANCE;
  const wanted = realValue(environment, reference);
  const typed = realValue(environment, answer);
  const wantedUnit = reference.unit ? unitValue(reference.unit) : NO_UNIT;
  const typedUnit = answer.unit ? unitValue(answer.unit) : NO_UNIT;
  if (wanted === null || typed === null || !wantedUnit || !typedUnit) {
    const reason = 'the number or the unit has no value';
    return { verdict: 'undecided', evidence: () => ({ test: 'none', reason }), slips: [] };
  }
  const close = (value: number): boolean => isWithin(tolerance, Math.abs(value - wanted), wanted);
  if (!sameDimension(wantedUnit, typedUnit)) {
    const missing = answer.unit === null;
    const message = missing
      ? `The unit is missing; ${unitText(reference.unit)} was expected or a unit of the same dimension.`
      : `The unit ${unitText(answer.unit)} does not measure what was asked for.`;
    return differing('dimension', message, close(typed) ? ['wrong-unit'] : []);
  }
  const value = (typed * typedUnit.factor) / wantedUnit.factor;
  if (isHertzAgainstRadian(wantedUnit, typedUnit) || isHertzAgainstRadian(typedUnit, wantedUnit)) {
    const cycles = wantedUnit.hertz !== 0;
    const converted = cycles ? value / TURN : value * TURN;
    const [asked, got] = cycles ? ['Hz', 'rad/s'] : ['rad/s', 'Hz'];
    const message = close(converted)
      ? `This is the right frequency, but in ${got} where ${asked} was asked for.`
      : `The answer is in ${got} where ${asked} was asked for.`;
    const slips = close(converted) || close(value) ? ['wrong-unit'] : [];
    return differing('dimension', message, close(value) || close(converted) ? slips : slipsOf(value));
  }
  const figures = tolerance.significantFigures;
  const typedCount = figures === undefined ? null : typedFigures(answer.value);
  if (figures !== undefined && typedCount !== null && typedCount < figures) {
    return { ...tooFewFigures(tolerance, typedCount, figures), slips: [] };
  }
  const distance = wanted === 0 ? Math.abs(value) : Math.abs(value - wanted) / Math.abs(wanted);
  if (close(value)) {
    return { verdict: 'agrees', evidence: () => ({ test: 'tolerance', tolerance, distance }), slips: [] };
  }
  return {
    verdict: 'differs',
    evidence: () => ({
      test: 'tolerance',
      tolerance,
      distance,
      witness: {
        values: {},
        element: '',
        reference: `${formatNumber(wanted)} ${unitText(reference.unit)}`.trim(),
        answer: `${formatNumber(value)} ${unitText(reference.unit)}`.trim(),
      },
    }),
    slips: slipsOf(value),
  };

  function slipsOf(x: number): string[] {
    const slips: string[] = [];
    if (close(-x)) slips.push('sign');
    if (close(2 * x)) slips.push('factor-half');
    if (close(x / 2)) slips.push('factor-two');
    if (close(x * TURN) || close(x / TURN)) slips.push('missing-two-pi');
    const tens = Math.round(Math.log10(Math.abs(x / wanted!)));
    if (x !== 0 && wanted !== 0 && tens !== 0 && Math.abs(tens) <= 30 && close(x / 10 ** tens))
      slips.push('power-of-ten');
    if (close(typed!) && typedUnit!.factor !== wantedUnit!.factor) slips.push('wrong-unit');
    return slips;
  }

  function differing(test: 'dimension', message: string, slips: readonly string[]): QuantityComparison {
    return {
      verdict: 'differs',
      message,
      slips,
      evidence: () => ({
        test,
        witness: {
          values: {},
          element: '',
          reference: `${formatNumber(wanted!)} ${unitText(reference.unit)}`.trim(),
          answer: `${formatNumber(typed!)} ${unitText(answer.unit)}`.trim(),
        },
      }),
    };
  }
}

/** Real value of a quantity's number; null where it has none. */
export function realValue(environment: Environment, quantity: QuantityNode): number | null {
  const value = environment.lower(quantity.value);
  if (value.type !== 'scalar') return null;
  const { g } = environment;
  const point = new NumericPoint(g, new Float64Array(g.variables.length).fill(1));
  point.evaluate(value.node);
  if (!point.isKnown(value.node) || Math.abs(point.im[value.node]!) > 1e-12 * Math.abs(point.re[value.node]!))
    return null;
  return point.re[value.node]!;
}

/** A unit as text: `MHz`, `rad s^-1`. */
export function unitText(unit: readonly UnitFactor[] | null): string {
  if (!unit) return '';
  return unit.map(({ prefix, unit: name, power }) => `${prefix}${name}${power === 1 ? '' : `^${power}`}`).join(' ');
}
