import { type Node } from '../algebra/graph';
import { conjugate } from '../algebra/conjugate';
import { transpose } from '../algebra/operators';
import { multiply } from '../algebra/scalars';
import { type AnswerValue, answerValue } from '../kinds/answer-value';
import { nodesOf } from '../kinds/compare';
import { doubleAngle, halfAngle } from './angles';
import { factorHalf } from './factor-half';
import { factorTwo } from './factor-two';
import { type SlipSearch } from './find-slips';
import { hbarPower } from './hbar-power';
import { extraI, missingI } from './missing-i';
import { missingTwoPi } from './missing-two-pi';
import { scaledBy, type Values, valuesOf } from './numeric-match';
import { sign } from './sign';
import { sineCosine } from './sine-cosine';
import { mapNodes, type FormSlip, type RatioSlip, type TreeSlip, type Trial } from './slip';
import { pauliForSpin, spinForPauli } from './spin-and-pauli';

/** Pairs of constant factors. */
const ratioPairs: readonly (readonly [RatioSlip, RatioSlip])[] = [
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

const changesOfForm: readonly FormSlip[] = [missingI, halfAngle, doubleAngle, sineCosine];
const changesOfTree: readonly TreeSlip[] = [pauliForSpin, spinForPauli];
const factors: readonly RatioSlip[] = [sign, factorHalf, factorTwo, hbarPower];

/**
 * The commonest two slips at once, named with a plus sign in catalogue order: `sign+factor-two`. A slip that explains
 * the answer alone is not paired.
 */
export function pairsOfSlips(trial: Trial, search: SlipSearch, alone: readonly string[]): string[] {
  const { reference, answer, compare, context } = trial;
  const { g, hbar } = context.environment;
  const found = new Set<string>();
  const isOpen = (slip: { readonly id: string }): boolean => !alone.includes(slip.id);
  const times = (value: AnswerValue, factor: Node): AnswerValue => mapNodes(value, (node) => multiply(g, factor, node));
  for (const [first, second] of ratioPairs) {
    if (!isOpen(first) || !isOpen(second)) continue;
    const products = first.factors(g, hbar).flatMap((x) => second.factors(g, hbar).map((y) => multiply(g, x, y)));
    const fitting = products.filter((factor) => factor !== g.one && search.ratios.mayBe(factor));
    if (fitting.length === 0 || second.applies?.(trial) === false) continue;
    if (fitting.some((factor) => compare(times(reference, factor), answer))) found.add(`${first.id}+${second.id}`);
  }
  const open = factors
    .filter(isOpen)
    .flatMap((slip) => slip.factors(g, hbar).map((factor) => ({ id: slip.id, factor })));
  const scaled = (values: Values): { id: string; factor: Node }[] =>
    open.filter(({ factor }) => looksScaled(trial, search, values, factor));
  const tryChanged = (id: string, changed: AnswerValue): void => {
    const nodes = nodesOf(changed);
    trial.point.evaluate(Math.max(...nodes));
    for (const match of scaled(valuesOf(trial.point, nodes))) {
      if (compare(times(changed, match.factor), answer)) found.add(`${match.id}+${id}`);
    }
  };
  for (const [id, changed] of changesOfValue(trial)) if (isOpen({ id })) tryChanged(id, changed);
  for (const form of changesOfForm.filter(isOpen)) {
    for (const changed of search.changedForms(form.change, (values) => scaled(values).length > 0)) {
      tryChanged(form.id, changed);
    }
  }
  for (const slip of changesOfTree.filter(isOpen)) {
    for (const tree of slip.change(trial.referenceTree)) {
      tryChanged(slip.id, answerValue(context.environment, trial.request.kind, tree));
    }
  }
  return [...found];
}

/** The complex conjugate, and of operators the transpose. */
function changesOfValue({ reference, context }: Trial): [string, AnswerValue][] {
  if (reference.kind === 'vector' || reference.kind === 'eigenpairs') return [];
  const changes: [string, AnswerValue][] = [
    ['conjugated', mapNodes(reference, (node) => conjugate(context.environment.g, node))],
  ];
  if (reference.kind === 'operator' || reference.kind === 'pauli') {
    changes.push(['transposed', { kind: reference.kind, matrix: transpose(reference.matrix) }]);
  }
  return changes;
}

function looksScaled({ point }: Trial, search: SlipSearch, values: Values, factor: Node): boolean {
  point.evaluate(factor);
  return search.looksRight(scaledBy(values, { re: point.re[factor]!, im: point.im[factor]! }));
}
