import { type ValueSlip } from './slip';

/** Each state was put to the other's eigenvalue. */
export const statesSwapped: ValueSlip = {
  type: 'value',
  id: 'states-swapped',
  sentence: 'each state stands with the other’s eigenvalue',
  change: (value) => {
    const [first, second] = value.kind === 'eigenpairs' ? value.pairs : [];
    if (!first || !second) return [];
    const pairs = [
      { value: first.value, state: second.state },
      { value: second.value, state: first.state },
    ];
    return [{ kind: 'eigenpairs', pairs }];
  },
};
