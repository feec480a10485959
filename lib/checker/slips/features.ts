import { type AnswerTree } from '../notation/answer-tree';
import { type Expression, type ReferenceNode } from '../notation/tree';

/** What of an author's tree the slips of trees look for, found in one pass that builds nothing. */
export interface Features {
  i: boolean;
  root: boolean;
  commutator: boolean;
  pauli: boolean;
  spin: boolean;
}

export function featuresOf(tree: AnswerTree): Features {
  const features: Features = { i: false, root: false, commutator: false, pauli: false, spin: false };
  switch (tree.node) {
    case 'values':
      for (const { value } of tree.entries) scan(value, features);
      break;
    case 'pairs':
      for (const { value, state } of tree.pairs) {
        scan(value.value, features);
        scan(state, features);
      }
      break;
    case 'quantity':
    case 'choice':
      break;
    default:
      scan(tree, features);
  }
  return features;
}

function scan(tree: Expression, features: Features): void {
  switch (tree.node) {
    case 'constant':
      if (tree.name === 'i') features.i = true;
      return;
    case 'operator':
      features[tree.family] = true;
      return;
    case 'root':
      features.root = true;
      scan(tree.radicand, features);
      return;
    case 'power':
      if (tree.exponent.node !== 'number' || tree.exponent.decimal) features.root = true;
      scan(tree.base, features);
      scan(tree.exponent, features);
      return;
    case 'commutator':
      features.commutator = true;
      scan(tree.left, features);
      scan(tree.right, features);
      return;
    case 'anticommutator':
      scan(tree.left, features);
      scan(tree.right, features);
      return;
    case 'reference':
      if (tree.name === 'commutator') features.commutator = true;
      scanArguments(tree, features);
      if (tree.name === 'uncertainty') features.root = true;
      return;
    case 'call':
      for (const argument of tree.arguments) scan(argument, features);
      return;
    case 'sum':
      for (const { body } of tree.terms) scan(body, features);
      return;
    case 'product':
      for (const { body } of tree.factors) scan(body, features);
      return;
    case 'fraction':
      scan(tree.numerator, features);
      scan(tree.denominator, features);
      return;
    case 'matrix':
      for (const row of tree.rows) for (const entry of row) scan(entry, features);
      return;
    case 'column':
    case 'row':
    case 'list':
      for (const entry of tree.entries) scan(entry, features);
      return;
    case 'group':
    case 'absolute':
    case 'conjugate':
    case 'adjoint':
    case 'transpose':
      scan(tree.body, features);
      return;
    case 'number':
    case 'symbol':
    case 'identity':
    case 'ket':
    case 'bra':
      return;
  }
}

/** In the arguments of a reference function only operators count: its i and roots are the author's, not the student's. */
function scanArguments(tree: ReferenceNode, features: Features): void {
  const { i, root } = features;
  for (const argument of tree.arguments) scan(argument, features);
  features.i = i;
  features.root = root;
}
