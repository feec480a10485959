import { type AnswerTree, type LabelledValue } from '@/lib/checker/notation/answer-tree';
import { type Expression, type Factor, type Term } from '@/lib/checker/notation/tree';

/**
 * Writes a tree back as text in the answer language, in the one spelling that is never ambiguous: every product sign
 * written, every argument in brackets, every compound operand in brackets. Reading the text as a reference gives a tree
 * of the same meaning; the layout of what the author typed is not kept.
 */
export function printAnswer(tree: AnswerTree): string {
  switch (tree.node) {
    case 'values':
      return `{${tree.entries.map(printValue).join(', ')}}`;
    case 'pairs':
      return tree.pairs.map((pair) => `${printValue(pair.value)}: ${printExpression(pair.state)}`).join('; ');
    case 'quantity':
      return tree.unit === null
        ? printExpression(tree.value)
        : `${operand(tree.value)} ${tree.unit.map(printUnit).join(' ')}`;
    case 'choice':
      return tree.choice;
    default:
      return printExpression(tree);
  }
}

/** Writes an expression as `printAnswer` does. */
export function printExpression(tree: Expression): string {
  switch (tree.node) {
    case 'number':
      return tree.scientific ? `${tree.mantissa}e${tree.exponent}` : tree.mantissa;
    case 'constant':
      return printConstant(tree.name);
    case 'symbol':
      return tree.name;
    case 'group':
      return printExpression(tree.body);
    case 'sum':
      return tree.terms.map(printTerm).join('');
    case 'product':
      return tree.factors.map(printFactor).join('');
    case 'fraction':
      return `${operand(tree.numerator)}/${operand(tree.denominator)}`;
    case 'power':
      return `${operand(tree.base)}^(${printExpression(tree.exponent)})`;
    case 'root':
      return tree.degree === 2
        ? `sqrt(${printExpression(tree.radicand)})`
        : `\\sqrt[${tree.degree}]{${printExpression(tree.radicand)}}`;
    case 'call':
    case 'reference':
      return `${tree.name}(${tree.arguments.map(printExpression).join(', ')})`;
    case 'absolute':
      return `abs(${printExpression(tree.body)})`;
    case 'conjugate':
      return `conj(${printExpression(tree.body)})`;
    case 'adjoint':
      return `(${printExpression(tree.body)})†`;
    case 'transpose':
      return `(${printExpression(tree.body)})^T`;
    case 'operator':
      return `${tree.family === 'pauli' ? 'sigma' : 'S'}_${tree.index}`;
    case 'identity':
      return 'I';
    case 'matrix':
      return `[${tree.rows.map((row) => `[${row.map(printExpression).join(', ')}]`).join(', ')}]`;
    case 'column':
      return `[${tree.entries.map((entry) => `[${printExpression(entry)}]`).join(', ')}]`;
    case 'row':
      return `[[${tree.entries.map(printExpression).join(', ')}]]`;
    case 'ket':
      return `|${tree.state}>`;
    case 'bra':
      return `<${tree.state}|`;
    case 'commutator':
    case 'anticommutator':
      return `${tree.node}(${printExpression(tree.left)}, ${printExpression(tree.right)})`;
    case 'list':
      return printList(tree.bracket, tree.entries.map(printExpression));
  }
}

/** A unit stands after its number with no bracket: only a plain number or a bracket may come before it. */
function printUnit(factor: { prefix: string; unit: string; power: number }): string {
  const symbol = `${factor.prefix}${factor.unit}`;
  return factor.power === 1 ? symbol : `${symbol}^${factor.power < 0 ? `(${factor.power})` : factor.power}`;
}

function printValue(entry: LabelledValue): string {
  return printExpression(entry.value);
}

/** `h` and `e` may be declared as names of something else, so neither is written by its letter. */
function printConstant(name: 'i' | 'pi' | 'hbar' | 'planck' | 'euler'): string {
  switch (name) {
    case 'planck':
      return '(2*pi*hbar)';
    case 'euler':
      return 'exp(1)';
    default:
      return name;
  }
}

function printList(bracket: '(' | '[' | '{' | 'column' | 'none', entries: readonly string[]): string {
  switch (bracket) {
    case '[':
      return `[${entries.join(', ')}]`;
    case '{':
      return `{${entries.join(', ')}}`;
    case 'column':
      return `[${entries.map((entry) => `[${entry}]`).join(', ')}]`;
    case '(':
    case 'none':
      return `(${entries.join(', ')})`;
  }
}

/** A term after the first is set off by blanks; a leading plus is not written. */
function printTerm(term: Term, index: number): string {
  const body = bare(term.body);
  const text = body.node === 'sum' ? `(${printExpression(body)})` : printExpression(body);
  if (index > 0) return ` ${term.sign} ${text}`;
  return term.sign === '+' ? text : `${term.sign}${text}`;
}

function printFactor(factor: Factor, index: number): string {
  const text = operand(factor.body);
  if (index === 0) return text;
  return factor.join === 'over' ? `/${text}` : `*${text}`;
}

/** An operand of a product, quotient or power: in brackets unless it is one piece by itself. */
function operand(tree: Expression): string {
  const inner = bare(tree);
  const text = printExpression(inner);
  switch (inner.node) {
    case 'sum':
    case 'product':
    case 'fraction':
    case 'power':
    case 'adjoint':
    case 'transpose':
      return `(${text})`;
    case 'number':
      return inner.scientific ? `(${text})` : text;
    case 'operator':
      // A sign at the end of a name would run into what follows.
      return inner.index === '+' || inner.index === '-' ? `(${text})` : text;
    default:
      return text;
  }
}

/** The expression within brackets that only group. */
function bare(tree: Expression): Expression {
  return tree.node === 'group' ? bare(tree.body) : tree;
}
