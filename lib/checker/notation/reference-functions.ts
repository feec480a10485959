/** The arguments and the value type of each reference function. */
import { type ReferenceName, type ValueType } from './tree';

/**
 * What an argument must be: `operator` also takes a scalar (a multiple of the identity), `density` a state or an
 * operator, `vector` a list of three scalars.
 */
export type Slot = 'scalar' | 'operator' | 'state' | 'density' | 'vector' | 'any';

export interface Signature {
  readonly slots: readonly Slot[];
  readonly type: ValueType;
}

const operator: Slot = 'operator';

/** Signatures by name; definitions are in section 8 of the answer language. */
export const referenceSignatures: Readonly<Record<ReferenceName, Signature>> = {
  commutator: { slots: [operator, operator], type: 'operator' },
  anticommutator: { slots: [operator, operator], type: 'operator' },
  eigenvalues: { slots: [operator], type: 'list' },
  eigenpairs: { slots: [operator], type: 'pairs' },
  trace: { slots: [operator], type: 'scalar' },
  determinant: { slots: [operator], type: 'scalar' },
  adjoint: { slots: [operator], type: 'operator' },
  pauli: { slots: [operator], type: 'list' },
  expectation: { slots: [operator, 'density'], type: 'scalar' },
  variance: { slots: [operator, 'density'], type: 'scalar' },
  uncertainty: { slots: [operator, 'density'], type: 'scalar' },
  probability: { slots: ['state', 'density'], type: 'scalar' },
  projector: { slots: ['state'], type: 'operator' },
  density: { slots: ['state'], type: 'operator' },
  bloch: { slots: ['density'], type: 'list' },
  purity: { slots: ['density'], type: 'scalar' },
  entropy: { slots: ['density'], type: 'scalar' },
  spinor: { slots: ['scalar', 'scalar'], type: 'ket' },
  rotation: { slots: ['vector', 'scalar'], type: 'operator' },
  propagator: { slots: [operator, 'scalar'], type: 'operator' },
  evolve: { slots: [operator, 'scalar', 'state'], type: 'ket' },
  heisenberg: { slots: [operator, operator, 'scalar'], type: 'operator' },
  larmor: { slots: ['scalar', 'vector'], type: 'operator' },
  rabi: { slots: ['scalar', 'scalar', 'scalar'], type: 'scalar' },
  thermal: { slots: [operator, 'scalar'], type: 'operator' },
};

const slotNames: Readonly<Record<Slot, string>> = {
  scalar: 'a scalar',
  operator: 'an operator',
  state: 'a state',
  density: 'a state or a density operator',
  vector: 'a list of three components',
  any: 'an expression',
};

/** A slot in words, with its article. */
export function nameOfSlot(slot: Slot): string {
  return slotNames[slot];
}

/** Whether a value of this type, and of this length if it is a list, fits a slot. */
export function fitsSlot(slot: Slot, type: ValueType, length: number): boolean {
  switch (slot) {
    case 'any':
      return true;
    case 'scalar':
      return type === 'scalar';
    case 'operator':
      return type === 'operator' || type === 'scalar';
    case 'state':
      return type === 'ket';
    case 'density':
      return type === 'ket' || type === 'operator';
    case 'vector':
      return type === 'list' && length === 3;
  }
}
