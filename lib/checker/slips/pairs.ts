import { factorHalf } from './factor-half';
import { factorTwo } from './factor-two';
import { conjugated } from './conjugated';
import { hbarPower } from './hbar-power';
import { extraI } from './missing-i';
import { missingTwoPi } from './missing-two-pi';
import { sign } from './sign';
import { type Trial, type ValueSlip } from './slip';
import { transposed } from './transposed';

/** The commonest two slips at once. */
const pairs: readonly (readonly [ValueSlip, ValueSlip])[] = [
  [sign, factorHalf],
  [sign, factorTwo],
  [sign, hbarPower],
  [sign, conjugated],
  [sign, transposed],
  [sign, missingTwoPi],
  [factorHalf, hbarPower],
  [factorTwo, hbarPower],
  [factorHalf, extraI],
  [factorTwo, extraI],
  [factorHalf, conjugated],
  [factorTwo, conjugated],
  [hbarPower, extraI],
  [hbarPower, conjugated],
];

/** The pairs that fit, named with a plus sign in catalogue order: `sign+factor-two`. */
export function pairsOfSlips(trial: Trial): string[] {
  const found: string[] = [];
  for (const [first, second] of pairs) {
    const fits = first
      .change(trial.reference, trial)
      .some((value) => second.change(value, trial).some((changed) => trial.compare(changed, trial.answer)));
    if (fits) found.push(`${first.id}+${second.id}`);
  }
  return found;
}
