import { halfAngle, doubleAngle } from './angles';
import { axesPermuted } from './axes-permuted';
import { centredEigenvalues } from './centred-eigenvalues';
import { commutatorOrder, commutatorOrderOfValue } from './commutator-order';
import { conjugated } from './conjugated';
import { factorHalf } from './factor-half';
import { factorTwo } from './factor-two';
import { hbarPower } from './hbar-power';
import { missingConstant } from './missing-constant';
import { extraI, missingI, missingIInTree } from './missing-i';
import { missingRoot, missingRootInTree } from './missing-root';
import { missingTwoPi } from './missing-two-pi';
import { notNormalised } from './not-normalised';
import { oneEigenvalue } from './one-eigenvalue';
import { roundedDecimal } from './rounded-decimal';
import { sign } from './sign';
import { sineCosine } from './sine-cosine';
import { type Slip } from './slip';
import { pauliForSpin, spinForPauli } from './spin-and-pauli';
import { statesSwapped } from './states-swapped';
import { transposed } from './transposed';

/**
 * The catalogue in its order; power-of-ten and wrong-unit, which only quantities have, stand at its end in
 * kinds/compare-quantity. Entries with the same id are one slip.
 */
export const catalogue: readonly Slip[] = [
  sign,
  factorHalf,
  factorTwo,
  hbarPower,
  missingI,
  missingIInTree,
  extraI,
  conjugated,
  transposed,
  commutatorOrder,
  commutatorOrderOfValue,
  halfAngle,
  doubleAngle,
  sineCosine,
  missingTwoPi,
  roundedDecimal,
  axesPermuted,
  missingRoot,
  missingRootInTree,
  missingConstant,
  oneEigenvalue,
  centredEigenvalues,
  statesSwapped,
  notNormalised,
  pauliForSpin,
  spinForPauli,
];
