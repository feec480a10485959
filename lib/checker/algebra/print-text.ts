import { type Expression, type Factor, type Term } from '../notation/tree';

/**
 * Writes a tree as text of the answer language in the spelling that is never ambiguous: every product sign written,
 * arguments and compound operands in brackets.
 */
export function printText(tree: Expression): string {
  switch (tree.node) {
    case 'number':
      return tree.exponent === 0 ? tree.mantissa : `${tree.mantissa}e${tree.exponent}`;
    case 'constant':
      return constants[tree.name];
    case 'symbol':
      return tree.name;
    case 'group':
      return `(${printText(tree.body)})`;
    case 'sum':
      return tree.terms.map(printTerm).join('');
    case 'product':
      return tree.factors.map(printFactor).join('');
    case 'fraction':
      return `${operand(tree.numerator)}/${operand(tree.denominator)}`;
    case 'power':
      return `${operand(tree.base)}^${operand(tree.exponent)}`;
    case 'root':
      return tree.degree === 2
        ? `sqrt(${printText(tree.radicand)})`
        : `(${printText(tree.radicand)})^(1/${tree.degree})`;
    case 'call':
      return `${tree.name}(${tree.arguments.map(printText).join(', ')})`;
    case 'absolute':
      return `abs(${printText(tree.body)})`;
    case 'conjugate':
      return `conj(${printText(tree.body)})`;
    case 'adjoint':
      return `${operand(tree.body)}^dagger`;
    case 'transpose':
      return `${operand(tree.body)}^T`;
    case 'operator':
      return `${tree.family === 'pauli' ? 'sigma' : 'S'}_${tree.index}`;
    case 'identity':
      return 'I';
    case 'matrix':
      return `[${tree.rows.map((row) => `[${row.map(printText).join(', ')}]`).join(', ')}]`;
    case 'column':
      return `[${tree.entries.map((entry) => `[${printText(entry)}]`).join(', ')}]`;
    case 'row':
      return `[[${tree.entries.map(printText).join(', ')}]]`;
    case 'ket':
      return `|${tree.state}>`;
    case 'bra':
      return `<${tree.state}|`;
    case 'commutator':
      return `[${printText(tree.left)}, ${printText(tree.right)}]`;
    case 'anticommutator':
      return `{${printText(tree.left)}, ${printText(tree.right)}}`;
    case 'list':
      return `${tree.bracket === '{' ? '{' : '('}${tree.entries.map(printText).join(', ')}${tree.bracket === '{' ? '}' : ')'}`;
    case 'reference':
      return `${tree.name}(${tree.arguments.map(printText).join(', ')})`;
  }
}

const constants = { i: 'i', pi: 'pi', hbar: 'hbar', planck: 'h', euler: 'exp(1)' } as const;

function printTerm({ sign, body }: Term, k: number): string {
  const text = body.node === 'sum' ? `(${printText(body)})` : printText(body);
  const mark = sign === '±' ? '+-' : sign === '∓' ? '-+' : sign;
  if (k === 0) return sign === '+' ? text : `${mark}${text}`;
  return ` ${mark} ${text}`;
}

function printFactor({ join, body }: Factor, k: number): string {
  const text = body.node === 'product' && k === 0 ? printText(body) : operand(body);
  return k === 0 ? text : `${join === 'over' ? '/' : '*'}${text}`;
}

/** A tree as an operand of a product, quotient or power. */
function operand(tree: Expression): string {
  switch (tree.node) {
    case 'sum':
    case 'product':
    case 'fraction':
    case 'power':
    case 'adjoint':
    case 'transpose':
      return `(${printText(tree)})`;
    case 'number':
      return tree.exponent === 0 ? printText(tree) : `(${printText(tree)})`;
    default:
      return printText(tree);
  }
}
