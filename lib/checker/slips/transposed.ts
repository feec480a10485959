import { transpose } from '../algebra/operators';
import { type ValueSlip } from './slip';

/** Rows and columns were exchanged. */
export const transposed: ValueSlip = {
  type: 'value',
  id: 'transposed',
  sentence: 'rows and columns are exchanged',
  change: (value) =>
    value.kind === 'operator' || value.kind === 'pauli' ? [{ kind: value.kind, matrix: transpose(value.matrix) }] : [],
};
