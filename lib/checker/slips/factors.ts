import { factorHalf } from './factor-half';
import { factorTwo } from './factor-two';
import { hbarPower } from './hbar-power';
import { extraI } from './missing-i';
import { missingTwoPi } from './missing-two-pi';
import { multiply } from '../algebra/scalars';
import { sign } from './sign';
import { type Factor, type RatioSlip } from './slip';

/** A factor with the name of the slip, or pair of slips, that it is. */
export interface NamedFactor extends Factor {
  readonly id: string;
  readonly slips: readonly RatioSlip[];
}

const named = (slip: RatioSlip): NamedFactor[] =>
  slip.factors.map((factor) => ({ ...factor, id: slip.id, slips: [slip] }));

/** Factors that also go with another change. */
export const factorsWithChanges: readonly NamedFactor[] = [sign, factorHalf, factorTwo, hbarPower].flatMap(named);

/** Products of two factors of different slips; the commonest only, in catalogue order. */
export const factorPairs: readonly NamedFactor[] = (
  [
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
  ] as const
).flatMap(([first, second]) =>
  first.factors.flatMap((x) =>
    second.factors.map((y): NamedFactor => ({
      id: `${first.id}+${second.id}`,
      slips: [first, second],
      value: (hbar) => {
        const [u, v] = [x.value(hbar), y.value(hbar)];
        return { re: u.re * v.re - u.im * v.im, im: u.re * v.im + u.im * v.re };
      },
      node: (g, hbar) => multiply(g, x.node(g, hbar), y.node(g, hbar)),
    })),
  ),
);
