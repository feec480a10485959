import { type AnswerTree } from '../notation/answer-tree';
import { type Expression } from '../notation/tree';

/**
 * Whether an answer has been worked out: no commutator, anticommutator, product of a bra with a ket, or exponential of
 * an operator is left standing in it.
 */
export function isEvaluated(tree: AnswerTree): boolean {
  switch (tree.node) {
    case 'values':
      return tree.entries.every(({ value }) => evaluated(value));
    case 'pairs':
      return tree.pairs.every(({ value, state }) => evaluated(value.value) && evaluated(state));
    case 'quantity':
    case 'choice':
      return true;
    default:
      return evaluated(tree);
  }
}

function evaluated(tree: Expression): boolean {
  switch (tree.node) {
    case 'commutator':
    case 'anticommutator':
      return false;
    case 'call':
      return tree.type !== 'operator' && tree.arguments.every(evaluated);
    case 'product':
      return !holdsBraKet(tree.factors.map(({ body }) => body)) && tree.factors.every(({ body }) => evaluated(body));
    case 'sum':
      return tree.terms.every(({ body }) => evaluated(body));
    case 'fraction':
      return evaluated(tree.numerator) && evaluated(tree.denominator);
    case 'power':
      return evaluated(tree.base) && evaluated(tree.exponent);
    case 'root':
      return evaluated(tree.radicand);
    case 'group':
    case 'absolute':
    case 'conjugate':
    case 'adjoint':
    case 'transpose':
      return evaluated(tree.body);
    case 'matrix':
      return tree.rows.every((row) => row.every(evaluated));
    case 'column':
    case 'row':
    case 'list':
      return tree.entries.every(evaluated);
    case 'reference':
      return false;
    case 'number':
    case 'constant':
    case 'symbol':
    case 'operator':
    case 'identity':
    case 'ket':
    case 'bra':
      return true;
  }
}

/** Whether a bra meets a ket on its right, with operators and scalars at most between them. */
function holdsBraKet(factors: readonly Expression[]): boolean {
  let open = false;
  for (const { type } of factors) {
    if (type === 'bra') open = true;
    else if (type === 'ket') {
      if (open) return true;
    } else if (type !== 'operator' && type !== 'scalar') open = false;
  }
  return false;
}
