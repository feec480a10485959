import { nodesOf } from '../kinds/compare';
import { type AnswerTree } from '../notation/answer-tree';
import { type NumberNode } from '../notation/tree';
import { answerValue } from '../kinds/answer-value';
import { type NumericPoint } from '../equivalence/numeric';
import { type TestSlip, type Trial } from './slip';
import { rewriteAll } from './tree-changes';
import { visit } from './visit';

/** An exact number was replaced by a decimal that rounds to it. */
export const roundedDecimal: TestSlip = {
  type: 'test',
  id: 'rounded-decimal',
  sentence: 'a rounded decimal stands for an exact value',
  fits: (trial) => {
    const decimals = decimalsOf(trial.answerTree);
    if (decimals.length === 0 || decimals.length > 4) return false;
    const wanted = nodesOf(trial.reference);
    if (shiftsFit(trial, decimals, wanted)) return true;
    return trial.reference.kind === 'eigenvalues' && shiftsFit(trial, decimals, [...wanted].reverse());
  },
};

/** Distinct decimals of a tree, each of which may be a rounded value. */
function decimalsOf(tree: AnswerTree): NumberNode[] {
  const found = new Map<string, NumberNode>();
  visit(tree, (node) => {
    if (node.node === 'number' && node.decimal && node.decimals > 0) found.set(node.mantissa, node);
  });
  return [...found.values()];
}

/**
 * Whether moving the decimals by at most half a unit of their last place makes the answer the reference: the small
 * shifts are found by linear least squares at one point and must serve at another.
 */
function shiftsFit(trial: Trial, decimals: readonly NumberNode[], wanted: readonly number[]): boolean {
  const { context, answer } = trial;
  const given = nodesOf(answer);
  if (wanted.length !== given.length) return false;
  const shifted = decimals.map((decimal) => nodesOf(shiftedAnswer(trial, decimal)));
  const equations: { row: number[]; right: number; size: number }[] = [];
  let seen = 0;
  for (let k = 0; k < 12 && seen < 2; k++) {
    const point = context.points.at(k);
    if (!point) continue;
    point.evaluate(Math.max(...wanted, ...given, ...shifted.flat()));
    if (![...wanted, ...given].every((node) => point.isKnown(node))) continue;
    seen++;
    for (let j = 0; j < wanted.length; j++) {
      for (const part of ['re', 'im'] as const) {
        const base = point[part][given[j]!]!;
        const row = shifted.map((nodes, d) => (point[part][nodes[j]!]! - base) / halfUnit(decimals[d]!));
        equations.push({ row, right: point[part][wanted[j]!]! - base, size: magnitude(point, wanted[j]!) });
      }
    }
  }
  if (seen === 0) return false;
  const shifts = leastSquares(equations, decimals.length);
  if (!shifts || shifts.some((shift, d) => Math.abs(shift) > 1.0001 * halfUnit(decimals[d]!))) return false;
  return equations.every(({ row, right, size }) => {
    const reached = row.reduce((sum, slope, d) => sum + slope * shifts[d]!, 0);
    const movement = row.reduce((sum, slope, d) => sum + Math.abs(slope) * halfUnit(decimals[d]!), 0);
    return Math.abs(reached - right) <= 0.01 * movement + 1e-13 * size;
  });
}

const magnitude = (point: NumericPoint, node: number): number => Math.hypot(point.re[node]!, point.im[node]!);

/** Half a unit of the last typed place. */
function halfUnit(decimal: NumberNode): number {
  return 0.5 * 10 ** (decimal.exponent - decimal.decimals);
}

/** The answer with one decimal moved up by half a unit of its last place. */
function shiftedAnswer({ context, request, answerTree }: Trial, decimal: NumberNode): ReturnType<typeof answerValue> {
  const scale = 2n * 10n ** BigInt(Math.max(0, decimal.decimals - decimal.exponent));
  const moved = rewriteAll(answerTree, (node) =>
    node.node === 'number' && node.mantissa === decimal.mantissa
      ? { ...node, numerator: node.numerator * scale + node.denominator, denominator: node.denominator * scale }
      : node,
  );
  return answerValue(context.environment, request.kind, moved);
}

/** Solves the normal equations; null where they are singular. */
function leastSquares(equations: readonly { row: number[]; right: number }[], n: number): number[] | null {
  const matrix = Array.from({ length: n }, () => new Array<number>(n + 1).fill(0));
  for (const { row, right } of equations) {
    for (let a = 0; a < n; a++) {
      for (let b = 0; b < n; b++) matrix[a]![b]! += row[a]! * row[b]!;
      matrix[a]![n]! += row[a]! * right;
    }
  }
  for (let a = 0; a < n; a++) {
    const pivot = matrix[a]![a]!;
    if (!(Math.abs(pivot) > 1e-24)) return null;
    for (let b = 0; b < n; b++) {
      if (b === a) continue;
      const factor = matrix[b]![a]! / pivot;
      for (let c = a; c <= n; c++) matrix[b]![c]! -= factor * matrix[a]![c]!;
    }
  }
  return matrix.map((row, a) => row[n]! / row[a]!);
}
