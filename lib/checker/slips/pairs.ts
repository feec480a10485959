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
  for (const pair of factorPairs(trial, alone)) {
    if (found.has(pair.id) || pair.slips.some((slip) => slip.applies?.(trial) === false)) continue;
    if (quietly(() => search.isFactor(trial.reference, search.ratios, pair))) found.add(pair.id);
  }
  const isOpen = ({ id }: { readonly id: string }): boolean => !alone.includes(id);
  const factors = factorsWithChanges(trial).filter(isOpen);
  const tryChanged = (id: string, ratios: Ratios, changed: () => AnswerValue): void => {
    for (const factor of factors) {
      const name = `${factor.id}+${id}`;
      if (!found.has(name) && ratios.mayBe(factor) && quietly(() => search.isFactor(changed(), ratios, factor))) {
        found.add(name);
      }
    }
  };
  for (const [id, value] of changesOfValue(trial)) {
    if (isOpen({ id })) tryChanged(id, search.ratiosOf(value), () => value);
  }
  for (const slip of changesOfForm.filter(isOpen)) {
    for (const form of search.changedForms(slip.change)) tryChanged(slip.id, form.ratios, () => search.build(form));
  }
  for (const slip of changesOfTree.filter(isOpen)) {
    if (!search.holds(slip.needs)) continue;
    for (const tree of slip.change(trial.referenceTree)) {
      const value = search.treeValue(tree);
      tryChanged(slip.id, search.ratiosOf(value), () => value);
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
