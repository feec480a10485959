import { pauliCoefficients } from '../algebra/operators';
import { scalarTree } from '../algebra/to-tree';
import { type AnswerValue } from './answer-value';
import { type Context } from './comparison';
import { type AnswerTree, type LabelledValue } from '../notation/answer-tree';
import { type Expression } from '../notation/tree';

const span = { start: 0, end: 0 };

/** The normal form of a value as a tree of its kind. */
export function normalTree({ environment }: Context, value: AnswerValue): AnswerTree {
  const { g } = environment;
  const tree = (node: number): Expression => scalarTree(g, node);
  switch (value.kind) {
    case 'scalar':
      return tree(value.node);
    case 'pauli': {
      const entries = pauliCoefficients(g, value.matrix).map(tree);
      return { span, type: 'list', node: 'list', bracket: '(', entries };
    }
    case 'operator': {
      const [a, b, c, d] = value.matrix;
      return {
        span,
        type: 'operator',
        node: 'matrix',
        rows: [
          [tree(a), tree(b)],
          [tree(c), tree(d)],
        ],
      };
    }
    case 'state':
      return column(tree(value.components[0]), tree(value.components[1]));
    case 'vector':
      return { span, type: 'list', node: 'list', bracket: '(', entries: value.components.map(tree) };
    case 'eigenvalues':
      return { span, node: 'values', bracket: '{', entries: value.values.map((node) => labelled(tree(node))) };
    case 'eigenpairs':
      return {
        span,
        node: 'pairs',
        pairs: value.pairs.map((pair) => ({
          span,
          value: labelled(tree(pair.value)),
          state: column(tree(pair.state[0]), tree(pair.state[1])),
        })),
      };
  }
}

const column = (first: Expression, second: Expression): Expression => ({
  span,
  type: 'ket',
  node: 'column',
  entries: [first, second],
});

const labelled = (value: Expression): LabelledValue => ({ span, label: null, value });
