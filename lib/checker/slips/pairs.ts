import { conjugate } from '../algebra/conjugate';
import { transpose } from '../algebra/operators';
import { type AnswerValue } from '../kinds/answer-value';
import { doubleAngle, halfAngle } from './angles';
import { factorPairs, factorsWithChanges } from './factors';
import { missingI } from './missing-i';
import { type Ratios } from './ratios';
import { sineCosine } from './sine-cosine';
import { mapNodes, type FormSlip, type TreeSlip, type Trial } from './slip';
import { quietly, type SlipSearch } from './slip-search';
import { pauliForSpin, spinForPauli } from './spin-and-pauli';

const changesOfForm: readonly FormSlip[] = [missingI, halfAngle, doubleAngle, sineCosine];
const changesOfTree: readonly TreeSlip[] = [pauliForSpin, spinForPauli];

/**
 * The commonest two slips at once, named with a plus sign in catalogue order: `sign+factor-two`. A slip that explains
 * the answer alone is not paired.
 */
export function pairsOfSlips(search: SlipSearch, alone: readonly string[]): string[] {
  const { trial } = search;
  const found = new Set<string>();
  for (const pair of search.ratios.isConstant ? factorPairs : []) {
    if (!search.ratios.mayBe(pair.value(search.hbar)) || found.has(pair.id)) continue;
    if (pair.slips.some((slip) => alone.includes(slip.id) || slip.applies?.(trial) === false)) continue;
    if (quietly(() => search.isFactor(trial.reference, pair))) found.add(pair.id);
  }
  const tryChanged = (id: string, ratios: Ratios, changed: () => AnswerValue): void => {
    for (const factor of ratios.isConstant ? factorsWithChanges : []) {
      const name = `${factor.id}+${id}`;
      if (!ratios.mayBe(factor.value(search.hbar)) || alone.includes(factor.id) || found.has(name)) continue;
      if (quietly(() => search.isFactor(changed(), factor))) found.add(name);
    }
  };
  for (const [id, value] of changesOfValue(trial)) {
    if (!alone.includes(id)) tryChanged(id, search.ratiosOf(value), () => value);
  }
  for (const { id, change } of changesOfForm) {
    if (alone.includes(id)) continue;
    for (const form of search.changedForms(change)) tryChanged(id, form.ratios, () => search.build(form));
  }
  for (const slip of changesOfTree) {
    if (alone.includes(slip.id)) continue;
    for (const { value, ratios } of search.changedTrees(slip)) tryChanged(slip.id, ratios, () => value);
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
