import { type Graph } from '../algebra/graph';
import { exp, multiply, subtract } from '../algebra/scalars';
import { modularTest } from './modular';
import { type Proof } from './proof';
import { type SamplePoints } from './sample-points';
import { type Pair } from './size-bound';

/**
 * Logarithms and angles hide relations from the modular test; their exponentials show them. Where x − y is real and
 * e^{x−y} = 1 exactly, x = y. Where it is imaginary, or an angle, x − y is a multiple of 2πi (of 2π), and a numeric value far below that
 * at every point says which.
 */
export function sameByExponential(
  g: Graph,
  pairs: readonly Pair[],
  points: SamplePoints,
  seed: number,
): Omit<Proof, 'points'> | null {
  let weakest: Omit<Proof, 'points'> | null = null;
  for (const [x, y] of pairs) {
    const difference = subtract(g, x, y);
    const turned = multiply(g, g.i, difference);
    const outcome = [
      modularTest(g, [[exp(g, difference), g.one]], seed),
      modularTest(g, [[exp(g, turned), g.one]], seed),
    ].find((o) => o.status === 'zero');
    if (outcome?.status !== 'zero') return null;
    if (!smallEverywhere(g, difference, points)) return null;
    if (!weakest || outcome.bound > weakest.bound) weakest = outcome;
  }
  return weakest;
}

function smallEverywhere(g: Graph, node: number, points: SamplePoints): boolean {
  let seen = 0;
  for (let k = 0; k < 24; k++) {
    const point = points.at(k);
    if (!point) continue;
    point.evaluate(node);
    if (!point.isKnown(node)) continue;
    if (Math.hypot(point.re[node]!, point.im[node]!) + point.error[node]! > 0.1) return false;
    seen++;
  }
  return seen > 0;
}
