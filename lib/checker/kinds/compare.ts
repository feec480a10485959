import { type AnswerValue } from './answer-value';
import { compareEigenpairs } from './compare-eigenpairs';
import { compareEigenvalues } from './compare-eigenvalues';
import { compareOperators } from './compare-operator';
import { compareScalars } from './compare-scalar';
import { compareStates } from './compare-state';
import { compareVectors } from './compare-vector';
import { type Comparison, type Context } from './comparison';

/** Compares two values of one kind, exactly. */
export function compareValues(context: Context, reference: AnswerValue, answer: AnswerValue): Comparison {
  switch (reference.kind) {
    case 'scalar':
      if (answer.kind === 'scalar') return compareScalars(context, reference.node, answer.node);
      break;
    case 'operator':
    case 'pauli':
      if (answer.kind === 'operator' || answer.kind === 'pauli') {
        return compareOperators(context, reference.matrix, answer.matrix);
      }
      break;
    case 'eigenvalues':
      if (answer.kind === 'eigenvalues') return compareEigenvalues(context, reference.values, answer.values);
      break;
    case 'state':
      if (answer.kind === 'state') return compareStates(context, reference.components, answer.components);
      break;
    case 'eigenpairs':
      if (answer.kind === 'eigenpairs') return compareEigenpairs(context, reference.pairs, answer.pairs);
      break;
    case 'vector':
      if (answer.kind === 'vector') return compareVectors(context, reference.components, answer.components);
  }
  return {
    verdict: 'undecided',
    evidence: () => ({ test: 'none', reason: 'reference and answer are of different kinds' }),
  };
}

/** The scalar nodes of a value, in a fixed order. */
export function nodesOf(value: AnswerValue): readonly number[] {
  switch (value.kind) {
    case 'scalar':
      return [value.node];
    case 'operator':
    case 'pauli':
      return value.matrix;
    case 'eigenvalues':
      return value.values;
    case 'state':
    case 'vector':
      return value.components;
    case 'eigenpairs':
      return value.pairs.flatMap((pair) => [pair.value, ...pair.state]);
  }
}
