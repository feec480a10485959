import { QuietError } from './quiet-error';
import { type Graph, type Node } from './graph';
import { type Components, identityTimes, type Operator } from './operators';

/** An eigenvalue with one of its states. */
export interface Eigenpair {
  readonly value: Node;
  readonly state: Components;
}

/** The value of an expression: scalar nodes in the shape of its type. */
export type Value =
  | { readonly type: 'scalar'; readonly node: Node }
  | { readonly type: 'operator'; readonly matrix: Operator }
  | { readonly type: 'ket'; readonly components: Components }
  | { readonly type: 'bra'; readonly components: Components }
  | { readonly type: 'list'; readonly entries: readonly Node[] }
  | { readonly type: 'pairs'; readonly pairs: readonly Eigenpair[] };

export const scalarValue = (node: Node): Value => ({ type: 'scalar', node });
export const operatorValue = (matrix: Operator): Value => ({ type: 'operator', matrix });
export const ketValue = (components: Components): Value => ({ type: 'ket', components });
export const braValue = (components: Components): Value => ({ type: 'bra', components });
export const listValue = (entries: readonly Node[]): Value => ({ type: 'list', entries });

/** Thrown where an expression asks for something that has no meaning or lies outside what is worked out. */
export class Unsupported extends QuietError {}

/** Thrown where a reference function's condition does not hold; the message is for the author. */
export class ReferenceProblem extends QuietError {}

export function asScalar(value: Value): Node {
  if (value.type !== 'scalar') throw new Unsupported('a scalar was expected');
  return value.node;
}

/** An operator, or a scalar as that multiple of the identity. */
export function asOperator(g: Graph, value: Value): Operator {
  if (value.type === 'operator') return value.matrix;
  if (value.type === 'scalar') return identityTimes(g, value.node);
  throw new Unsupported('an operator was expected');
}

export function asKet(value: Value): Components {
  if (value.type !== 'ket') throw new Unsupported('a state was expected');
  return value.components;
}

export function asList(value: Value): readonly Node[] {
  if (value.type !== 'list') throw new Unsupported('a list was expected');
  return value.entries;
}
