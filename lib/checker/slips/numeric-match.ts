import { type CheckOptions } from '../contract';
import { type AnswerValue } from '../kinds/answer-value';

/** Complex values of some elements, in two arrays. */
export interface Values {
  readonly re: readonly number[];
  readonly im: readonly number[];
}

const CLOSE = 1e-9;

/** Arrays of values by node. */
export interface NodeValues {
  readonly re: Float64Array;
  readonly im: Float64Array;
}

/** Values of nodes from arrays by node. */
export function valuesOf(at: NodeValues, nodes: readonly number[]): Values {
  const n = nodes.length;
  const re = new Array<number>(n);
  const im = new Array<number>(n);
  for (let k = 0; k < n; k++) {
    re[k] = at.re[nodes[k]!]!;
    im[k] = at.im[nodes[k]!]!;
  }
  return { re, im };
}

/** Values in a form that the kind's rule compares element by element: of eigenpairs, the operator that has them. */
export function comparable(kind: AnswerValue['kind'], values: Values): Values {
  return kind === 'eigenpairs' && values.re.length === 6 ? operatorOfPairs(values) : values;
}

/**
 * Whether two sets of values look equal under a kind's rule, at one point and in doubles. A filter only: true is to be
 * proved. Eigenpairs are given as `comparable` makes them.
 */
export function looksEqual(kind: AnswerValue['kind'], options: CheckOptions, x: Values, y: Values): boolean {
  if (options.tolerance) return true;
  const n = x.re.length;
  if (n !== y.re.length) return false;
  if (kind === 'eigenvalues') {
    return (near(x, 0, y, 0) && near(x, 1, y, 1)) || (near(x, 0, y, 1) && near(x, 1, y, 0));
  }
  const ray = options.upToPhase || (options.upToScale && kind === 'state');
  if (ray && kind !== 'scalar' && kind !== 'vector' && kind !== 'eigenpairs')
    return sameRay(x, y, !options.upToScale || kind !== 'state');
  const scale = largest(x) + largest(y);
  for (let k = 0; k < n; k++) {
    const distance = Math.abs(x.re[k]! - y.re[k]!) + Math.abs(x.im[k]! - y.im[k]!);
    if (!(distance <= CLOSE * scale)) return false;
  }
  return true;
}

/** Ratio y/x at the largest element of x. */
export function ratioOf(x: Values, y: Values): { readonly re: number; readonly im: number } | null {
  let pivot = 0;
  for (let k = 1; k < x.re.length; k++) if (size(x, k) > size(x, pivot)) pivot = k;
  const square = size(x, pivot) ** 2;
  if (!(square > 0) || x.re.length !== y.re.length) return null;
  return {
    re: (y.re[pivot]! * x.re[pivot]! + y.im[pivot]! * x.im[pivot]!) / square,
    im: (y.im[pivot]! * x.re[pivot]! - y.re[pivot]! * x.im[pivot]!) / square,
  };
}

/** f·x for one complex factor. */
export function scaledBy(x: Values, f: { readonly re: number; readonly im: number }): Values {
  return {
    re: x.re.map((re, k) => re * f.re - x.im[k]! * f.im),
    im: x.re.map((re, k) => re * f.im + x.im[k]! * f.re),
  };
}

const size = (x: Values, k: number): number => Math.hypot(x.re[k]!, x.im[k]!);

function largest(x: Values): number {
  let most = 0;
  for (let k = 0; k < x.re.length; k++) most = Math.max(most, Math.abs(x.re[k]!) + Math.abs(x.im[k]!));
  return most;
}

function near(x: Values, j: number, y: Values, k: number): boolean {
  const distance = Math.abs(x.re[j]! - y.re[k]!) + Math.abs(x.im[j]! - y.im[k]!);
  return distance <= CLOSE * (largest(x) + largest(y));
}

function sameRay(x: Values, y: Values, sameNorm: boolean): boolean {
  const ratio = ratioOf(x, y);
  if (!ratio) return false;
  if (sameNorm && !(Math.abs(Math.hypot(ratio.re, ratio.im) - 1) <= CLOSE)) return false;
  return looksEqual('vector', {}, scaledBy(x, ratio), y);
}

type Complex = readonly [number, number];
const times = (x: Complex, y: Complex): Complex => [x[0] * y[0] - x[1] * y[1], x[0] * y[1] + x[1] * y[0]];
const minus = (x: Complex, y: Complex): Complex => [x[0] - y[0], x[1] - y[1]];
const negative = (x: Complex): Complex => [-x[0], -x[1]];

function over(x: Complex, y: Complex): Complex {
  const square = y[0] * y[0] + y[1] * y[1];
  return [(x[0] * y[0] + x[1] * y[1]) / square, (x[1] * y[0] - x[0] * y[1]) / square];
}

/** VΛV⁻¹ from (λ, v₁, v₂, μ, w₁, w₂). */
function operatorOfPairs({ re, im }: Values): Values {
  const at = (k: number): Complex => [re[k]!, im[k]!];
  const [l, v1, v2, m, w1, w2] = [at(0), at(1), at(2), at(3), at(4), at(5)];
  const d = minus(times(v1, w2), times(v2, w1));
  const entry = (a: Complex, b: Complex, p: Complex, q: Complex): Complex =>
    over(minus(times(l, times(a, b)), times(m, times(p, q))), d);
  const matrix = [
    entry(v1, w2, w1, v2),
    negative(entry(v1, w1, w1, v1)),
    entry(v2, w2, w2, v2),
    negative(entry(v2, w1, w2, v1)),
  ];
  return { re: matrix.map((x) => x[0]), im: matrix.map((x) => x[1]) };
}
