/** The structure of a tree as text, without spans, grouping and the style it was written in. */
import { type AnswerTree } from './answer-tree';
import { type Expression } from './tree';

/**
 * A text that is the same for two trees exactly when they are the same expression written in different styles:
 * brackets that only group, `\frac` or `/`, `·` or nothing, `0.50` or `0.5`, columns side by side or one above the other.
 * Nothing is evaluated or reordered.
 */
export function structureOf(tree: AnswerTree): string {
  switch (tree.node) {
    case 'values':
      return `values(${tree.entries.map(({ value }) => expression(value)).join(', ')})`;
    case 'pairs':
      return `pairs(${tree.pairs.map(({ value, state }) => `${expression(value.value)}: ${expression(state)}`).join('; ')})`;
    case 'quantity': {
      const unit = tree.unit?.map((factor) => `${factor.prefix}${factor.unit}^${factor.power}`).join(' ');
      return `quantity(${expression(tree.value)}, ${unit ?? 'none'})`;
    }
    case 'choice':
      return `choice(${JSON.stringify(tree.choice)})`;
    default:
      return expression(tree);
  }
}

function expression(tree: Expression): string {
  switch (tree.node) {
    case 'number':
      return decimalText(tree.numerator, tree.denominator);
    case 'constant':
      return tree.name;
    case 'symbol':
      return `'${tree.name}`;
    case 'group':
      return expression(tree.body);
    case 'sum':
      return `(sum ${tree.terms.map(({ sign, body }) => `${sign} ${expression(body)}`).join(' ')})`;
    case 'product': {
      let text = '';
      for (const { join, body } of tree.factors) {
        const factor = expression(body);
        text = text === '' ? factor : `(${join === 'over' ? '/' : '*'} ${text} ${factor})`;
      }
      return text;
    }
    case 'fraction':
      return `(/ ${expression(tree.numerator)} ${expression(tree.denominator)})`;
    case 'power':
      return `(^ ${expression(tree.base)} ${expression(tree.exponent)})`;
    case 'root':
      return `(root${tree.degree} ${expression(tree.radicand)})`;
    case 'call':
      return `(${tree.name === 'log' ? 'ln' : tree.name} ${tree.arguments.map(expression).join(' ')})`;
    case 'absolute':
    case 'conjugate':
    case 'adjoint':
    case 'transpose':
      return `(${tree.node} ${expression(tree.body)})`;
    case 'operator':
      return `${tree.family}_${tree.index}`;
    case 'identity':
      return 'identity';
    case 'matrix':
      return `[${tree.rows.map((row) => row.map(expression).join(' ')).join('; ')}]`;
    case 'column':
      return `[${tree.entries.map(expression).join('; ')}]`;
    case 'row':
      return `[${tree.entries.map(expression).join(' ')}]`;
    case 'ket':
      return `|${tree.state}>`;
    case 'bra':
      return `<${tree.state}|`;
    case 'commutator':
    case 'anticommutator':
      return `(${tree.node} ${expression(tree.left)} ${expression(tree.right)})`;
    case 'list':
      return `list(${tree.entries.map(expression).join(', ')})`;
    case 'reference':
      return `${tree.name}(${tree.arguments.map(expression).join(', ')})`;
  }
}

/** A decimal's value without a written style: digits and a power of ten. */
function decimalText(numerator: bigint, denominator: bigint): string {
  let digits = numerator.toString();
  let power = 1 - denominator.toString().length;
  while (digits.length > 1 && digits.endsWith('0')) {
    digits = digits.slice(0, -1);
    power += 1;
  }
  return digits === '0' ? '0' : power === 0 ? digits : `${digits}e${power}`;
}
