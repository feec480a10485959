import { type AnswerTree, type LabelledValue } from '@/lib/checker/notation/answer-tree';
import { type Expression, type MatrixNode } from '@/lib/checker/notation/tree';

/** What stands in place of a name: scalar expressions by the name of the symbol. */
export type Replacements = ReadonlyMap<string, Expression>;

/**
 * The same answer with every named symbol replaced by its expression, as a whole: `n*omega` with n = −3 is (−3)·ω, and
 * `x^n` has all of −3 as its exponent. Nothing is evaluated. Spans of replaced pieces are those of their own text.
 */
export function substituteAnswer(tree: AnswerTree, replacements: Replacements): AnswerTree {
  const value = (entry: LabelledValue): LabelledValue => ({ ...entry, value: substitute(entry.value, replacements) });
  switch (tree.node) {
    case 'values':
      return { ...tree, entries: tree.entries.map(value) };
    case 'pairs':
      return {
        ...tree,
        pairs: tree.pairs.map((pair) => ({
          ...pair,
          value: value(pair.value),
          state: substitute(pair.state, replacements),
        })),
      };
    case 'quantity':
      return { ...tree, value: substitute(tree.value, replacements) };
    case 'choice':
      return tree;
    default:
      return substitute(tree, replacements);
  }
}

/** The same expression with every named symbol replaced, as `substituteAnswer` does. */
export function substitute(tree: Expression, replacements: Replacements): Expression {
  const inside = (part: Expression) => substitute(part, replacements);
  const pair = (parts: readonly [Expression, Expression]) => [inside(parts[0]), inside(parts[1])] as const;
  switch (tree.node) {
    case 'symbol':
      return replaced(tree, replacements);
    case 'number':
    case 'constant':
    case 'operator':
    case 'identity':
    case 'ket':
    case 'bra':
      return tree;
    case 'sum':
      return { ...tree, terms: tree.terms.map((term) => ({ ...term, body: inside(term.body) })) };
    case 'product':
      return { ...tree, factors: tree.factors.map((factor) => ({ ...factor, body: inside(factor.body) })) };
    case 'fraction':
      return { ...tree, numerator: inside(tree.numerator), denominator: inside(tree.denominator) };
    case 'power':
      return { ...tree, base: inside(tree.base), exponent: inside(tree.exponent) };
    case 'root':
      return { ...tree, radicand: inside(tree.radicand) };
    case 'call':
      return { ...tree, arguments: tree.arguments.map(inside) };
    case 'reference':
      return { ...tree, arguments: tree.arguments.map(inside) };
    case 'group':
    case 'absolute':
    case 'conjugate':
    case 'adjoint':
    case 'transpose':
      return { ...tree, body: inside(tree.body) };
    case 'matrix': {
      const rows: MatrixNode['rows'] = [pair(tree.rows[0]), pair(tree.rows[1])];
      return { ...tree, rows };
    }
    case 'column':
    case 'row':
      return { ...tree, entries: pair(tree.entries) };
    case 'commutator':
    case 'anticommutator':
      return { ...tree, left: inside(tree.left), right: inside(tree.right) };
    case 'list':
      return { ...tree, entries: tree.entries.map(inside) };
  }
}

function replaced(symbol: Extract<Expression, { node: 'symbol' }>, replacements: Replacements): Expression {
  const replacement = replacements.get(symbol.name);
  if (replacement === undefined) return symbol;
  return { node: 'group', bracket: '(', type: replacement.type, span: symbol.span, body: replacement };
}
