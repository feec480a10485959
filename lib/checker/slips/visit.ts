import { type AnswerTree } from '../notation/answer-tree';
import { type Expression } from '../notation/tree';

/** Called with each node, and whether it stands in an argument of a reference function. */
type Visitor = (node: Expression, inReference: boolean) => void;

/** Visits every expression of a tree, parents first. */
export function visit(tree: AnswerTree, visitor: Visitor): void {
  switch (tree.node) {
    case 'values':
      for (const { value } of tree.entries) walk(value, visitor, false);
      return;
    case 'pairs':
      for (const { value, state } of tree.pairs) {
        walk(value.value, visitor, false);
        walk(state, visitor, false);
      }
      return;
    case 'quantity':
      walk(tree.value, visitor, false);
      return;
    case 'choice':
      return;
    default:
      walk(tree, visitor, false);
  }
}

function walk(tree: Expression, visitor: Visitor, inReference: boolean): void {
  visitor(tree, inReference);
  switch (tree.node) {
    case 'root':
      walk(tree.radicand, visitor, inReference);
      return;
    case 'power':
      walk(tree.base, visitor, inReference);
      walk(tree.exponent, visitor, inReference);
      return;
    case 'commutator':
    case 'anticommutator':
      walk(tree.left, visitor, inReference);
      walk(tree.right, visitor, inReference);
      return;
    case 'reference':
      for (const argument of tree.arguments) walk(argument, visitor, true);
      return;
    case 'call':
      for (const argument of tree.arguments) walk(argument, visitor, inReference);
      return;
    case 'sum':
      for (const { body } of tree.terms) walk(body, visitor, inReference);
      return;
    case 'product':
      for (const { body } of tree.factors) walk(body, visitor, inReference);
      return;
    case 'fraction':
      walk(tree.numerator, visitor, inReference);
      walk(tree.denominator, visitor, inReference);
      return;
    case 'matrix':
      for (const row of tree.rows) for (const entry of row) walk(entry, visitor, inReference);
      return;
    case 'column':
    case 'row':
    case 'list':
      for (const entry of tree.entries) walk(entry, visitor, inReference);
      return;
    case 'group':
    case 'absolute':
    case 'conjugate':
    case 'adjoint':
    case 'transpose':
      walk(tree.body, visitor, inReference);
      return;
    case 'number':
    case 'constant':
    case 'symbol':
    case 'operator':
    case 'identity':
    case 'ket':
    case 'bra':
      return;
  }
}
