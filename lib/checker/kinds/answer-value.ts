import { type Environment } from '../algebra/environment';
import { type Node } from '../algebra/graph';
import { type Components, fromPauli, type Operator } from '../algebra/operators';
import { asKet, asOperator, asScalar, type Eigenpair, Unsupported } from '../algebra/value';
import { type AnswerKind } from '../contract';
import { type AnswerTree, type PairEntry } from '../notation/answer-tree';
import { type Expression, type Term } from '../notation/tree';

/** The value of an answer or reference, in the shape of its kind. */
export type AnswerValue =
  | { readonly kind: 'scalar'; readonly node: Node; readonly tree: Expression }
  | { readonly kind: 'operator' | 'pauli'; readonly matrix: Operator }
  | { readonly kind: 'eigenvalues'; readonly values: readonly Node[] }
  | { readonly kind: 'state'; readonly components: Components }
  | { readonly kind: 'eigenpairs'; readonly pairs: readonly Eigenpair[] }
  | { readonly kind: 'vector'; readonly components: readonly Node[] };

/** Turns a tree into values of the environment's graph. Throws what lowering throws. */
export function answerValue(environment: Environment, kind: AnswerKind, tree: AnswerTree): AnswerValue {
  switch (kind) {
    case 'scalar':
      return { kind, node: asScalar(environment.lower(expression(tree))), tree: expression(tree) };
    case 'operator':
      return { kind, matrix: asOperator(environment.g, environment.lower(expression(tree))) };
    case 'pauli':
      return { kind, matrix: pauliOperator(environment, expression(tree)) };
    case 'eigenvalues':
      return { kind, values: eigenvalues(environment, tree) };
    case 'state':
      return { kind, components: asKet(environment.lower(expression(tree))) };
    case 'eigenpairs':
      return { kind, pairs: eigenpairs(environment, tree) };
    case 'vector': {
      const value = environment.lower(expression(tree));
      if (value.type !== 'list' || value.entries.length !== 3) throw new Unsupported('three components were expected');
      return { kind, components: value.entries };
    }
    case 'quantity':
    case 'choice':
      throw new Unsupported('this kind has no value of symbols');
  }
}

function expression(tree: AnswerTree): Expression {
  switch (tree.node) {
    case 'values':
    case 'pairs':
    case 'quantity':
    case 'choice':
      throw new Unsupported('this is not an expression');
    default:
      return tree;
  }
}

/** (a0, a1, a2, a3), or any operator. */
function pauliOperator(environment: Environment, tree: Expression): Operator {
  const value = environment.lower(tree);
  if (value.type !== 'list') return asOperator(environment.g, value);
  const [a0, a1, a2, a3] = value.entries;
  if (a0 === undefined || a1 === undefined || a2 === undefined || a3 === undefined || value.entries.length !== 4) {
    throw new Unsupported('four coefficients were expected');
  }
  return fromPauli(environment.g, [a0, a1, a2, a3]);
}

function eigenvalues(environment: Environment, tree: AnswerTree): Node[] {
  if (tree.node !== 'values') {
    const value = environment.lower(expression(tree));
    if (value.type === 'list') return [...value.entries];
    if (value.type === 'scalar') return [value.node];
    throw new Unsupported('two values were expected');
  }
  const values: Node[] = [];
  for (const { value } of tree.entries) {
    values.push(asScalar(environment.lower(value, 1)));
    if (hasPlusMinus(value)) values.push(asScalar(environment.lower(value, -1)));
  }
  return values;
}

function eigenpairs(environment: Environment, tree: AnswerTree): Eigenpair[] {
  if (tree.node !== 'pairs') {
    const value = environment.lower(expression(tree));
    if (value.type !== 'pairs') throw new Unsupported('two pairs were expected');
    return [...value.pairs];
  }
  const pairs: Eigenpair[] = [];
  const add = (entry: PairEntry, sign: 1 | -1): void => {
    const value = asScalar(environment.lower(entry.value.value, sign));
    pairs.push({ value, state: asKet(environment.lower(entry.state, sign)) });
  };
  for (const entry of tree.pairs) {
    add(entry, 1);
    if (hasPlusMinus(entry.value.value) || hasPlusMinus(entry.state)) add(entry, -1);
  }
  return pairs;
}

/** Whether a tree holds ± or ∓. */
export function hasPlusMinus(tree: Expression): boolean {
  switch (tree.node) {
    case 'sum':
      return tree.terms.some(({ sign, body }: Term) => sign === '±' || sign === '∓' || hasPlusMinus(body));
    case 'product':
      return tree.factors.some(({ body }) => hasPlusMinus(body));
    case 'fraction':
      return hasPlusMinus(tree.numerator) || hasPlusMinus(tree.denominator);
    case 'power':
      return hasPlusMinus(tree.base) || hasPlusMinus(tree.exponent);
    case 'group':
    case 'absolute':
    case 'conjugate':
    case 'adjoint':
    case 'transpose':
      return hasPlusMinus(tree.body);
    case 'root':
      return hasPlusMinus(tree.radicand);
    case 'call':
    case 'reference':
      return tree.arguments.some(hasPlusMinus);
    case 'matrix':
      return tree.rows.some((row) => row.some(hasPlusMinus));
    case 'column':
    case 'row':
    case 'list':
      return tree.entries.some(hasPlusMinus);
    case 'commutator':
    case 'anticommutator':
      return hasPlusMinus(tree.left) || hasPlusMinus(tree.right);
    case 'number':
    case 'constant':
    case 'symbol':
    case 'operator':
    case 'identity':
    case 'ket':
    case 'bra':
      return false;
  }
}
