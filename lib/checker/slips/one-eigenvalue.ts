import { type TestSlip } from './slip';

/** One of the two eigenvalues was given. */
export const oneEigenvalue: TestSlip = {
  type: 'test',
  id: 'one-eigenvalue',
  sentence: 'only one of the two values is given',
  fits: ({ reference, answer, compare, answerTree }) => {
    if (reference.kind !== 'eigenvalues' || answer.kind !== 'eigenvalues') return false;
    const [only] = answer.values;
    if (only === undefined) return false;
    if (answer.values.length > 1) return false;
    return reference.values.some((value) => {
      const both = { kind: 'eigenvalues', values: [value, value] } as const;
      return compare(both, { kind: 'eigenvalues', values: [only, only] }) && answerTree.node !== 'choice';
    });
  },
};
