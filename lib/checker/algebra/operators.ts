import { absoluteSquare, conjugate } from './conjugate';
import { cosh, sinh } from './functions';
import { type Graph, type Node } from './graph';
import { HALF } from './rational';
import { root } from './roots';
import { add, DefinedNowhere, divide, exp, multiply, negate, power, scale, subtract, sum } from './scalars';

/** A 2×2 matrix, row by row: m11, m12, m21, m22. */
export type Operator = readonly [Node, Node, Node, Node];
/** Two components in the z basis, of a column or of a row. */
export type Components = readonly [Node, Node];
/** Coefficients of 1, σ_x, σ_y, σ_z. */
export type PauliCoefficients = readonly [Node, Node, Node, Node];

export const identityTimes = (g: Graph, c: Node): Operator => [c, g.zero, g.zero, c];

export const addOperators = (g: Graph, x: Operator, y: Operator): Operator => [
  add(g, x[0], y[0]),
  add(g, x[1], y[1]),
  add(g, x[2], y[2]),
  add(g, x[3], y[3]),
];

export const scaleOperator = (g: Graph, c: Node, x: Operator): Operator => [
  multiply(g, c, x[0]),
  multiply(g, c, x[1]),
  multiply(g, c, x[2]),
  multiply(g, c, x[3]),
];

const dot = (g: Graph, a: Node, b: Node, c: Node, d: Node): Node => add(g, multiply(g, a, b), multiply(g, c, d));

export const multiplyOperators = (g: Graph, x: Operator, y: Operator): Operator => [
  dot(g, x[0], y[0], x[1], y[2]),
  dot(g, x[0], y[1], x[1], y[3]),
  dot(g, x[2], y[0], x[3], y[2]),
  dot(g, x[2], y[1], x[3], y[3]),
];

export const subtractOperators = (g: Graph, x: Operator, y: Operator): Operator =>
  addOperators(g, x, [negate(g, y[0]), negate(g, y[1]), negate(g, y[2]), negate(g, y[3])]);

/** xy − yx. */
export const commutator = (g: Graph, x: Operator, y: Operator): Operator =>
  subtractOperators(g, multiplyOperators(g, x, y), multiplyOperators(g, y, x));

/** xy + yx. */
export const anticommutator = (g: Graph, x: Operator, y: Operator): Operator =>
  addOperators(g, multiplyOperators(g, x, y), multiplyOperators(g, y, x));

export const trace = (g: Graph, x: Operator): Node => add(g, x[0], x[3]);
export const determinant = (g: Graph, x: Operator): Node =>
  subtract(g, multiply(g, x[0], x[3]), multiply(g, x[1], x[2]));
export const transpose = (x: Operator): Operator => [x[0], x[2], x[1], x[3]];
export const conjugateOperator = (g: Graph, x: Operator): Operator => [
  conjugate(g, x[0]),
  conjugate(g, x[1]),
  conjugate(g, x[2]),
  conjugate(g, x[3]),
];
export const adjoint = (g: Graph, x: Operator): Operator => transpose(conjugateOperator(g, x));

/** Adjugate over determinant (Cramer 1750). */
export function inverse(g: Graph, x: Operator): Operator {
  const d = determinant(g, x);
  if (d === g.zero) throw new DefinedNowhere('inverse of a singular operator');
  return scaleOperator(g, power(g, d, -1), [x[3], negate(g, x[1]), negate(g, x[2]), x[0]]);
}

/** Integer power; negative ones through the inverse. */
export function operatorPower(g: Graph, x: Operator, n: number): Operator {
  let base = n < 0 ? inverse(g, x) : x;
  let result = identityTimes(g, g.one);
  for (let k = Math.abs(n); k > 0; k = Math.floor(k / 2)) {
    if (k % 2 === 1) result = multiplyOperators(g, result, base);
    base = k > 1 ? multiplyOperators(g, base, base) : base;
  }
  return result;
}

export const applyToKet = (g: Graph, x: Operator, v: Components): Components => [
  dot(g, x[0], v[0], x[1], v[1]),
  dot(g, x[2], v[0], x[3], v[1]),
];

export const applyToBra = (g: Graph, v: Components, x: Operator): Components => [
  dot(g, v[0], x[0], v[1], x[2]),
  dot(g, v[0], x[1], v[1], x[3]),
];

/** Row times column, without conjugation. */
export const contract = (g: Graph, row: Components, column: Components): Node =>
  dot(g, row[0], column[0], row[1], column[1]);

/** Column times row. */
export const outer = (g: Graph, column: Components, row: Components): Operator => [
  multiply(g, column[0], row[0]),
  multiply(g, column[0], row[1]),
  multiply(g, column[1], row[0]),
  multiply(g, column[1], row[1]),
];

export const conjugateComponents = (g: Graph, v: Components): Components => [conjugate(g, v[0]), conjugate(g, v[1])];

/** ⟨v|v⟩. */
export const normSquared = (g: Graph, v: Components): Node => add(g, absoluteSquare(g, v[0]), absoluteSquare(g, v[1]));

/** a0 = ½Tr x, a_k = ½Tr σ_k x. */
export function pauliCoefficients(g: Graph, x: Operator): PauliCoefficients {
  return [
    scale(g, HALF, add(g, x[0], x[3])),
    scale(g, HALF, add(g, x[1], x[2])),
    scale(g, HALF, multiply(g, g.i, subtract(g, x[1], x[2]))),
    scale(g, HALF, subtract(g, x[0], x[3])),
  ];
}

/** a0·1 + a·σ. */
export function fromPauli(g: Graph, [a0, a1, a2, a3]: PauliCoefficients): Operator {
  const ia2 = multiply(g, g.i, a2);
  return [add(g, a0, a3), subtract(g, a1, ia2), add(g, a1, ia2), subtract(g, a0, a3)];
}

/** a0 and one square root s of a·a, so that the eigenvalues are a0 ± s. */
export function centreAndSplitting(g: Graph, x: Operator): { centre: Node; splitting: Node } {
  const [a0, a1, a2, a3] = pauliCoefficients(g, x);
  const square = sum(g, [power(g, a1, 2), power(g, a2, 2), power(g, a3, 2)]);
  return { centre: a0, splitting: root(g, square, 2, true) };
}

/**
 * e^x in closed form: with x = a0 + a·σ and s² = a·a, e^{a0}(cosh s + (sinh s/s) a·σ), which is even in s
 * (from (a·σ)² = a·a; Cohen-Tannoudji, Diu & Laloë, complement A-IV).
 */
export function exponentialOfOperator(g: Graph, x: Operator): Operator {
  const { centre, splitting } = centreAndSplitting(g, x);
  const traceless = subtractOperators(g, x, identityTimes(g, centre));
  const factor = splitting === g.zero ? g.one : divide(g, sinh(g, splitting), splitting);
  const even = identityTimes(g, cosh(g, splitting));
  return scaleOperator(g, exp(g, centre), addOperators(g, even, scaleOperator(g, factor, traceless)));
}
