import { type Node } from '../algebra/graph';
import { fromPauli, identityTimes, addOperators, pauliCoefficients } from '../algebra/operators';
import { type Rational, rational, rationalKey } from '../algebra/rational';
import { rootOfRational } from '../algebra/root-of-rational';
import { multiply, negate, power } from '../algebra/scalars';
import { type AnswerValue } from '../kinds/answer-value';
import { nodesOf } from '../kinds/compare';
import { type Context } from '../kinds/comparison';
import { looksEqual, valuesOf } from './numeric-match';
import { mapNodes } from './slip';

type Compare = (reference: AnswerValue, answer: AnswerValue) => boolean;

/**
 * The key that wrong answers to different draws of one part share: the first that fits of a slip, a constant ratio to
 * the reference, a constant multiple of the identity as difference, a signed permutation of the Pauli coefficients.
 */
export function kinKeyOf(
  context: Context,
  reference: AnswerValue,
  answer: AnswerValue,
  slips: readonly string[],
  compare: Compare,
): string | null {
  const [slip] = slips;
  if (slip !== undefined) return `slip:${slip}`;
  return ratioKey(context, reference, answer, compare) ?? operatorKey(context, reference, answer, compare);
}

/** The same unreadable text, whatever its spaces and capitals. */
export function unreadableKinKey(text: string): string {
  return `text:${text.normalize('NFKC').toLowerCase().replace(/\s+/gu, '').slice(0, 200)}`;
}

function ratioKey(context: Context, reference: AnswerValue, answer: AnswerValue, compare: Compare): string | null {
  const wanted = nodesOf(reference);
  const given = nodesOf(answer);
  if (reference.kind === 'eigenpairs' || wanted.length !== given.length) return null;
  const point = context.points.at(0);
  if (!point) return null;
  point.evaluate(Math.max(...wanted, ...given));
  const k = wanted.findIndex((node) => Math.hypot(point.re[node]!, point.im[node]!) > 1e-9);
  if (k < 0) return null;
  const ratio = divideAt(point, given[k]!, wanted[k]!);
  return constantKey(
    context,
    ratio,
    (factor) => {
      const { g } = context.environment;
      return compare(
        mapNodes(reference, (node) => multiply(g, factor, node)),
        answer,
      );
    },
    'ratio',
  );
}

function divideAt(point: { re: Float64Array; im: Float64Array }, x: Node, y: Node): { re: number; im: number } {
  const square = point.re[y]! ** 2 + point.im[y]! ** 2;
  return {
    re: (point.re[x]! * point.re[y]! + point.im[x]! * point.im[y]!) / square,
    im: (point.im[x]! * point.re[y]! - point.re[x]! * point.im[y]!) / square,
  };
}

/** Recognises ±c, ±ic with c or c² a simple fraction, and confirms it exactly. */
function constantKey(
  context: Context,
  value: { re: number; im: number },
  confirm: (factor: Node) => boolean,
  name: string,
): string | null {
  const { g } = context.environment;
  const size = Math.hypot(value.re, value.im);
  const real = Math.abs(value.im) < 1e-11 * size;
  const imaginary = Math.abs(value.re) < 1e-11 * size;
  if (!(size > 1e-6 && size < 1e6) || (!real && !imaginary)) return null;
  const negative = (real ? value.re : value.im) < 0;
  const fraction = simpleFraction(size);
  const square = fraction ? null : simpleFraction(size * size);
  if (!fraction && !square) return null;
  let factor = fraction ? g.number(fraction) : rootOfRational(g, square!, 2);
  if (imaginary) factor = multiply(g, g.i, factor);
  if (negative) factor = negate(g, factor);
  if (!confirm(factor)) return null;
  const amount = fraction ? rationalKey(fraction) : `sqrt(${rationalKey(square!)})`;
  return `${name}:${negative ? '-' : ''}${imaginary ? 'i*' : ''}${amount}`;
}

/** A fraction with denominator at most 400 that equals x to 12 figures, by its continued fraction. */
function simpleFraction(x: number): Rational | null {
  let [h0, h1, k0, k1] = [0, 1, 1, 0];
  let rest = x;
  for (let step = 0; step < 12; step++) {
    const whole = Math.floor(rest);
    [h0, h1] = [h1, whole * h1 + h0];
    [k0, k1] = [k1, whole * k1 + k0];
    if (k1 > 400 || h1 > 1e6) return null;
    if (Math.abs(h1 / k1 - x) < 1e-12 * x) return rational(h1, k1);
    rest = 1 / (rest - whole);
  }
  return null;
}

function operatorKey(context: Context, reference: AnswerValue, answer: AnswerValue, compare: Compare): string | null {
  if (reference.kind !== 'operator' && reference.kind !== 'pauli') return null;
  if (answer.kind !== 'operator' && answer.kind !== 'pauli') return null;
  const { g } = context.environment;
  const point = context.points.at(0);
  if (!point) return null;
  const wanted = pauliCoefficients(g, reference.matrix);
  const given = pauliCoefficients(g, answer.matrix);
  point.evaluate(Math.max(...wanted, ...given));
  const size = point.re[context.environment.hbar]!;
  for (const n of [0, 1, 2]) {
    const scale = size ** n;
    const difference = {
      re: (point.re[given[0]]! - point.re[wanted[0]]!) / scale,
      im: (point.im[given[0]]! - point.im[wanted[0]]!) / scale,
    };
    const confirm = (c: Node): boolean => {
      const shift = identityTimes(g, multiply(g, c, power(g, context.environment.hbar, n)));
      return compare({ kind: reference.kind, matrix: addOperators(g, reference.matrix, shift) }, answer);
    };
    const shifted = constantKey(context, difference, confirm, n === 0 ? 'identity' : `identity*hbar^${n}`);
    if (shifted !== null) return shifted;
  }
  const seen = valuesOf(point, wanted.slice(1));
  const typed = valuesOf(point, given.slice(1));
  for (const order of permutations) {
    for (let signs = 0; signs < 8; signs++) {
      const turned = {
        re: order.map((k, j) => ((signs >> j) & 1 ? -1 : 1) * seen.re[k]!),
        im: order.map((k, j) => ((signs >> j) & 1 ? -1 : 1) * seen.im[k]!),
      };
      if (!looksEqual('vector', {}, turned, typed)) continue;
      const axes = order.map((k, j) => ((signs >> j) & 1 ? negate(g, wanted[k + 1]!) : wanted[k + 1]!));
      const matrix = fromPauli(g, [wanted[0], axes[0]!, axes[1]!, axes[2]!]);
      if (!compare({ kind: reference.kind, matrix }, answer)) continue;
      const names = order.map((k, j) => `${(signs >> j) & 1 ? '-' : '+'}${'xyz'[k]}`);
      return `axes:${names.join('')}`;
    }
  }
  return null;
}

const permutations: readonly (readonly number[])[] = [
  [0, 1, 2],
  [1, 0, 2],
  [2, 1, 0],
  [0, 2, 1],
  [1, 2, 0],
  [2, 0, 1],
];
