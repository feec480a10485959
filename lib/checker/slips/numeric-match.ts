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

const size = (x: Values, k: number): number => Math.sqrt(x.re[k]! * x.re[k]! + x.im[k]! * x.im[k]!);

function largest(x: Values): number {
  let most = 0;
  for (let k = 0; k < x.re.length; k++) most = Math.max(most, Math.abs(x.re[k]!) + Math.abs(x.im[k]!));
  return most;
}

function near(x: Values, j: number, y: Values, k: number): boolean {
  const distance = Math.abs(x.re[j]! - y.re[k]!) + Math.abs(x.im[j]! - y.im[k]!);
  return distance <= CLOSE * (largest(x) + largest(y));
}

/** Two vectors are multiples of each other where x_j y_k = x_k y_j. */
function sameRay(x: Values, y: Values, sameNorm: boolean): boolean {
  let pivot = 0;
  let norms = 0;
  for (let k = 0; k < x.re.length; k++) {
    if (size(x, k) > size(x, pivot)) pivot = k;
    norms += size(x, k) ** 2 - size(y, k) ** 2;
  }
  const scale = largest(x) * largest(y);
  if (sameNorm && !(Math.abs(norms) <= CLOSE * (largest(x) + largest(y)) ** 2)) return false;
  const [a, b] = [at(x, pivot), at(y, pivot)];
  for (let k = 0; k < x.re.length; k++) {
    const cross = minus(times(at(x, k), b), times(at(y, k), a));
    if (!(Math.abs(cross[0]) + Math.abs(cross[1]) <= CLOSE * scale)) return false;
  }
  return true;
}

const at = (x: Values, k: number): Complex => [x.re[k]!, x.im[k]!];

type Complex = readonly [number, number];
const times = (x: Complex, y: Complex): Complex => [x[0] * y[0] - x[1] * y[1], x[0] * y[1] + x[1] * y[0]];
const minus = (x: Complex, y: Complex): Complex => [x[0] - y[0], x[1] - y[1]];
const negative = (x: Complex): Complex => [-x[0], -x[1]];

function over(x: Complex, y: Complex): Complex {
  const square = y[0] * y[0] + y[1] * y[1];
  return [(x[0] * y[0] + x[1] * y[1]) / square, (x[1] * y[0] - x[0] * y[1]) / square];
}

/** VΛV⁻¹ from (λ, v₁, v₂, μ, w₁, w₂). */
function operatorOfPairs(values: Values): Values {
  const [l, v1, v2] = [at(values, 0), at(values, 1), at(values, 2)];
  const [m, w1, w2] = [at(values, 3), at(values, 4), at(values, 5)];
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
