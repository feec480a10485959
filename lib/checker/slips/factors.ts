import { type Node } from '../algebra/graph';
import { multiply } from '../algebra/scalars';
import { factorHalf } from './factor-half';
import { factorTwo } from './factor-two';
import { hbarPower } from './hbar-power';
import { extraI } from './missing-i';
import { missingTwoPi } from './missing-two-pi';
import { sign } from './sign';
import { type RatioSlip, type Trial } from './slip';

/** A constant factor between reference and answer, as a node and as its value at the trial's point. */
export interface Factor {
  readonly id: string;
  readonly node: () => Node;
  readonly re: number;
  readonly im: number;
}

/** Factors that also go with a change of the form. */
const withChanges: readonly RatioSlip[] = [sign, factorHalf, factorTwo, hbarPower];

/** Two factors at once; the commonest only. */
const together: readonly (readonly [RatioSlip, RatioSlip])[] = [
  [sign, factorHalf],
  [sign, factorTwo],
  [sign, hbarPower],
  [sign, extraI],
  [sign, missingTwoPi],
  [factorHalf, hbarPower],
  [factorTwo, hbarPower],
  [factorHalf, extraI],
  [factorTwo, extraI],
  [factorHalf, missingTwoPi],
  [factorTwo, missingTwoPi],
  [hbarPower, extraI],
  [hbarPower, missingTwoPi],
];

/** The factors of one slip. */
export function factorsOf(slip: RatioSlip, { context, point }: Trial): Factor[] {
  const { g, hbar } = context.environment;
  return slip.factors(g, hbar).map((node) => {
    point.evaluate(node);
    return { id: slip.id, node: () => node, re: point.re[node]!, im: point.im[node]! };
  });
}

/** The factors that go with a change of the form. */
export const factorsWithChanges = (trial: Trial): Factor[] => withChanges.flatMap((slip) => factorsOf(slip, trial));

/** Products of two factors of different slips, neither of which explains the answer alone. */
export function factorPairs(
  trial: Trial,
  alone: readonly string[],
): (Factor & { readonly slips: readonly RatioSlip[] })[] {
  const { g } = trial.context.environment;
  const known = new Map<RatioSlip, Factor[]>();
  const get = (slip: RatioSlip): Factor[] => {
    const factors = known.get(slip) ?? factorsOf(slip, trial);
    known.set(slip, factors);
    return factors;
  };
  const pairs: (Factor & { slips: readonly RatioSlip[] })[] = [];
  for (const [first, second] of together) {
    if (alone.includes(first.id) || alone.includes(second.id)) continue;
    for (const x of get(first)) {
      for (const y of get(second)) {
        pairs.push({
          id: `${first.id}+${second.id}`,
          slips: [first, second],
          node: () => multiply(g, x.node(), y.node()),
          re: x.re * y.re - x.im * y.im,
          im: x.re * y.im + x.im * y.re,
        });
      }
    }
  }
  return pairs;
}
