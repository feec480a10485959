import { type AnswerTree } from '../notation/answer-tree';
import { type Expression } from '../notation/tree';

/** Rewrites one node, its children already rewritten; the same node where there is nothing to change. */
export type Rewrite = (tree: Expression) => Expression;

/** A tree with every expression in it rewritten from the leaves up. */
export function rewriteAll(tree: AnswerTree, rewrite: Rewrite): AnswerTree {
  switch (tree.node) {
    case 'values':
      return { ...tree, entries: tree.entries.map((entry) => ({ ...entry, value: deep(entry.value, rewrite) })) };
    case 'pairs':
      return {
        ...tree,
        pairs: tree.pairs.map((pair) => ({
          ...pair,
          value: { ...pair.value, value: deep(pair.value.value, rewrite) },
          state: deep(pair.state, rewrite),
        })),
      };
    case 'quantity':
    case 'choice':
      return tree;
    default:
      return deep(tree, rewrite);
  }
}

/** Where a change applies at more places than this, it is tried everywhere at once only. */
const MOST_PLACES = 3;

/** The tree with the change made everywhere; none where it applies nowhere. */
export function everywhere(tree: AnswerTree, rewrite: Rewrite): AnswerTree[] {
  let changed = false;
  const result = rewriteAll(tree, (node) => {
    const other = rewrite(node);
    changed ||= other !== node;
    return other;
  });
  return changed ? [result] : [];
}

/**
 * The trees with the change made everywhere, then with it made at each single place where it applies, if they are few.
 * Empty where it applies nowhere.
 */
export function everywhereAndEach(tree: AnswerTree, rewrite: Rewrite): AnswerTree[] {
  let count = 0;
  const all = rewriteAll(tree, (node) => {
    const changed = rewrite(node);
    if (changed !== node) count++;
    return changed;
  });
  if (count === 0) return [];
  const results = [all];
  for (let place = 0; count > 1 && count <= MOST_PLACES && place < count; place++) {
    let at = -1;
    results.push(
      rewriteAll(tree, (node) => {
        const changed = rewrite(node);
        if (changed === node) return node;
        at++;
        return at === place ? changed : node;
      }),
    );
  }
  return results;
}

function deep(tree: Expression, rewrite: Rewrite): Expression {
  const inside = (child: Expression): Expression => deep(child, rewrite);
  switch (tree.node) {
    case 'group':
    case 'absolute':
    case 'conjugate':
    case 'adjoint':
    case 'transpose':
      return rewrite({ ...tree, body: inside(tree.body) });
    case 'sum':
      return rewrite({ ...tree, terms: tree.terms.map((term) => ({ ...term, body: inside(term.body) })) });
    case 'product':
      return rewrite({ ...tree, factors: tree.factors.map((factor) => ({ ...factor, body: inside(factor.body) })) });
    case 'fraction':
      return rewrite({ ...tree, numerator: inside(tree.numerator), denominator: inside(tree.denominator) });
    case 'power':
      return rewrite({ ...tree, base: inside(tree.base), exponent: inside(tree.exponent) });
    case 'root':
      return rewrite({ ...tree, radicand: inside(tree.radicand) });
    case 'call':
    case 'reference':
      return rewrite({ ...tree, arguments: tree.arguments.map(inside) });
    case 'matrix': {
      const [[a, b], [c, d]] = tree.rows;
      return rewrite({
        ...tree,
        rows: [
          [inside(a), inside(b)],
          [inside(c), inside(d)],
        ],
      });
    }
    case 'column':
    case 'row':
      return rewrite({ ...tree, entries: [inside(tree.entries[0]), inside(tree.entries[1])] });
    case 'list':
      return rewrite({ ...tree, entries: tree.entries.map(inside) });
    case 'commutator':
    case 'anticommutator':
      return rewrite({ ...tree, left: inside(tree.left), right: inside(tree.right) });
    case 'number':
    case 'constant':
    case 'symbol':
    case 'operator':
    case 'identity':
    case 'ket':
    case 'bra':
      return rewrite(tree);
  }
}

const span = { start: 0, end: 0 };

/** The whole number n as a tree. */
export function numberNode(n: bigint): Expression {
  return {
    span,
    type: 'scalar',
    node: 'number',
    numerator: n,
    denominator: 1n,
    mantissa: n.toString(),
    exponent: 0,
    decimal: false,
    decimals: 0,
    significantFigures: 1,
    scientific: false,
  };
}

/** n·x or x/n. */
export function timesNumber(x: Expression, n: bigint, over: boolean): Expression {
  return {
    span,
    type: x.type,
    node: 'product',
    factors: [
      { join: 'unwritten', body: x },
      { join: over ? 'over' : 'times', body: numberNode(n) },
    ],
  };
}
