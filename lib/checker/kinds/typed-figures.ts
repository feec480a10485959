import { type Expression } from '../notation/tree';

/** Significant figures of an answer that is one typed number, with or without a sign; null for anything else. */
export function typedFigures(tree: Expression): number | null {
  switch (tree.node) {
    case 'number':
      return tree.significantFigures;
    case 'group':
      return typedFigures(tree.body);
    case 'sum':
      return tree.terms.length === 1 && tree.terms[0] ? typedFigures(tree.terms[0].body) : null;
    default:
      return null;
  }
}
