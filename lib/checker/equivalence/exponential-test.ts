import { type Graph, type Node } from '../algebra/graph';
import { exp, multiply, subtract } from '../algebra/scalars';
import { type Decision } from './decide';
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
  decide: (pairs: readonly Pair[]) => Decision,
): Proof | null {
  let weakest: Proof | null = null;
  for (const [x, y] of pairs) {
    const difference = subtract(g, x, y);
    if (!smallEverywhere(difference, points)) return null;
    const proof = proofOfOne(exp(g, multiply(g, g.i, difference))) ?? proofOfOne(exp(g, difference));
    if (!proof) return null;
    if (!weakest || proof.bound > weakest.bound) weakest = proof;
  }
  return weakest;

  function proofOfOne(exponential: Node): Proof | null {
    const decision = decide([[exponential, g.one]]);
    return decision.status === 'equal' ? decision.proof : null;
  }
}

function smallEverywhere(node: Node, points: SamplePoints): boolean {
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
