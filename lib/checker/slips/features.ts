import { type AnswerTree } from '../notation/answer-tree';
import { visit } from './visit';

/** What of an author's tree the slips of trees look for, found in one pass that builds nothing. */
export interface Features {
  i: boolean;
  root: boolean;
  commutator: boolean;
  pauli: boolean;
  spin: boolean;
}

/** In the arguments of a reference function only operators count: its i and roots are the author's, not the student's. */
export function featuresOf(tree: AnswerTree): Features {
  const features: Features = { i: false, root: false, commutator: false, pauli: false, spin: false };
  visit(tree, (node, inReference) => {
    switch (node.node) {
      case 'constant':
        features.i ||= node.name === 'i' && !inReference;
        break;
      case 'operator':
        features[node.family] = true;
        break;
      case 'root':
        features.root ||= !inReference;
        break;
      case 'power':
        features.root ||= !inReference && (node.exponent.node !== 'number' || node.exponent.decimal);
        break;
      case 'commutator':
        features.commutator = true;
        break;
      case 'reference':
        features.commutator ||= node.name === 'commutator';
        features.root ||= node.name === 'uncertainty' && !inReference;
        break;
      default:
    }
  });
  return features;
}
