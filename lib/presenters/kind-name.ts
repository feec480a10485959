import { type AnswerKind } from '@/lib/checker/contract';

const names: Record<AnswerKind, string> = {
  scalar: 'Scalar',
  quantity: 'Quantity with a unit',
  operator: 'Operator',
  pauli: 'Pauli coefficients',
  eigenvalues: 'Eigenvalues',
  state: 'State',
  eigenpairs: 'Eigenvalues with states',
  vector: 'Vector',
  choice: 'Choice',
};

/** What a kind of answer is called for a person. */
export function kindName(kind: AnswerKind): string {
  return names[kind];
}

/** Every kind with its name, in the order in which they are offered. */
export const answerKindNames = Object.entries(names).map(([kind, name]) => ({ kind: kind as AnswerKind, name }));
