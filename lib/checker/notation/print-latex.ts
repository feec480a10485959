/** Trees to LaTeX, as typed: never evaluated, reordered or simplified. */
import { type AnswerTree, type Label, type UnitFactor } from './answer-tree';
import { latexIndex, latexName, latexState, latexWord } from './print-names';
import { type Expression, type Factor, type ProductNode, type Term } from './tree';

/**
 * LaTeX that typesets a tree, and that reads back to a tree of the same structure. It uses only commands that need no
 * trust. Redundant brackets stay; brackets that the reading implies are written out.
 */
export function printLatex(tree: AnswerTree): string {
  switch (tree.node) {
    case 'values': {
      const entries = tree.entries.map(({ label, value }) => labelText(label) + print(value)).join(',\\ ');
      return tree.bracket === 'none' ? entries : bracketed(tree.bracket, entries);
    }
    case 'pairs':
      return tree.pairs
        .map(({ value, state }) => `${labelText(value.label)}${print(value.value)}:\\ ${print(state)}`)
        .join(';\\quad ');
    case 'quantity':
      return tree.unit === null ? print(tree.value) : `${quantityValue(tree.value)}\\,${unitText(tree.unit)}`;
    case 'choice':
      return `\\text{${escapeText(tree.choice)}}`;
    default:
      return print(tree);
  }
}

function labelText(label: Label | null): string {
  if (label === null) return '';
  const index = label.index === null ? '' : `_{${latexIndex(label.index)}}`;
  return `${latexWord(label.base)}${index}=`;
}

function bracketed(bracket: '(' | '[' | '{', inside: string): string {
  if (bracket === '{') return `\\left\\{${inside}\\right\\}`;
  return bracket === '[' ? `\\left[${inside}\\right]` : `\\left(${inside}\\right)`;
}

function parenthesised(inside: string): string {
  return bracketed('(', inside);
}

/** How tightly a printed expression holds together: sums, then products, then powers, then what needs no brackets. */
function rank(tree: Expression): 0 | 1 | 2 | 3 {
  switch (tree.node) {
    case 'sum':
      return 0;
    case 'product':
      return 1;
    case 'number':
      return tree.scientific ? 1 : 3;
    case 'list':
      return tree.bracket === 'none' ? 0 : 3;
    case 'power':
    case 'call':
    case 'adjoint':
    case 'transpose':
    case 'fraction':
    case 'root':
      return 2;
    case 'conjugate':
      return 3;
    default:
      return 3;
  }
}

function print(tree: Expression): string {
  switch (tree.node) {
    case 'number':
      return tree.scientific ? `${tree.mantissa}\\times 10^{${tree.exponent}}` : tree.mantissa;
    case 'constant':
      return constants[tree.name];
    case 'symbol':
      return latexName(tree.name);
    case 'group':
      return bracketed(tree.bracket === '[' ? '[' : '(', print(tree.body));
    case 'sum':
      return sumText(tree.terms);
    case 'product':
      return productText(tree);
    case 'fraction':
      return `\\frac{${open(tree.numerator)}}{${open(tree.denominator)}}`;
    case 'power':
      return tree.placed === 'name' && tree.base.node === 'call'
        ? callText(tree.base, `^{${print(tree.exponent)}}`)
        : `${base(tree.base)}^{${print(tree.exponent)}}`;
    case 'root':
      return `\\sqrt${tree.degree === 2 ? '' : `[${tree.degree}]`}{${print(tree.radicand)}}`;
    case 'call':
      return callText(tree, '');
    case 'absolute':
      return `\\left|${print(tree.body)}\\right|`;
    case 'conjugate':
      return `\\overline{${print(tree.body)}}`;
    case 'adjoint':
      return `${base(tree.body)}^{\\dagger}`;
    case 'transpose':
      return `${base(tree.body)}^{\\mathrm{T}}`;
    case 'operator': {
      const letter = tree.family === 'pauli' ? '\\sigma' : 'S';
      return `${tree.hat ? `\\hat{${letter}}` : letter}_{${tree.index}}`;
    }
    case 'identity':
      return identities[tree.written];
    case 'matrix':
      return environment(tree.rows.map((row) => row.map(print).join('&')));
    case 'column':
      return environment(tree.entries.map(print));
    case 'row':
      return environment([tree.entries.map(print).join('&')]);
    case 'ket':
      return `|${latexState(tree.written)}\\rangle`;
    case 'bra':
      return `\\langle ${latexState(tree.written)}|`;
    case 'commutator':
      return bracketed('[', `${print(tree.left)},\\,${print(tree.right)}`);
    case 'anticommutator':
      return bracketed('{', `${print(tree.left)},\\,${print(tree.right)}`);
    case 'list':
      return listText(tree.bracket, tree.entries.map(print));
    case 'reference':
      return `\\operatorname{${tree.name}}${parenthesised(tree.arguments.map(print).join(',\\,'))}`;
  }
}

const constants = { i: 'i', pi: '\\pi', hbar: '\\hbar', planck: 'h', euler: '\\mathrm{e}' } as const;
const identities = { I: 'I', one: '\\mathbb{1}', sigma: '\\sigma_{0}' } as const;

function environment(rows: readonly string[]): string {
  return `\\begin{pmatrix}${rows.join('\\\\')}\\end{pmatrix}`;
}

function listText(bracket: '(' | '[' | '{' | 'column' | 'none', entries: readonly string[]): string {
  if (bracket === 'column') return environment(entries);
  return bracket === 'none' ? entries.join(',\\ ') : bracketed(bracket, entries.join(',\\,'));
}

/** The inside of something that holds it together already, such as a fraction: outer round brackets go. */
function open(tree: Expression): string {
  return tree.node === 'group' && tree.bracket !== '[' ? print(tree.body) : print(tree);
}

/** What a power is put on. */
function base(tree: Expression): string {
  const named = tree.node === 'call' && tree.written === 'name' && tree.name !== 'exp';
  if (rank(tree) === 3 || named) return print(tree);
  return parenthesised(print(tree));
}

const signs = { '+': '+', '-': '-', '±': '\\pm ', '∓': '\\mp ' } as const;

function sumText(terms: readonly Term[]): string {
  let text = '';
  for (const { sign, body } of terms) {
    const term = body.node === 'sum' ? parenthesised(print(body)) : print(body);
    text += text === '' && sign === '+' ? term : signs[sign] + term;
  }
  return text;
}

/**
 * The first quotient of a product as a fraction, later ones and those of a fraction with a slash; a written sign wherever leaving it out would
 * read differently.
 */
function productText({ factors }: ProductNode): string {
  const slash = factors.findIndex(({ join }) => join === 'over');
  let text = '';
  let from = 0;
  const top = factors.slice(0, Math.max(0, slash));
  if (slash > 0 && top.every(({ body }) => body.node !== 'fraction')) {
    const numerator = top.length === 1 && top[0] ? open(top[0].body) : runText('', top, 0, factors);
    const divisor = factors[slash]?.body;
    text = `\\frac{${numerator}}{${divisor ? open(divisor) : ''}}`;
    from = slash + 1;
  }
  return runText(text, factors.slice(from), from, factors);
}

function runText(begun: string, part: readonly Factor[], offset: number, all: readonly Factor[]): string {
  let text = begun;
  part.forEach(({ join, body }, position) => {
    const before = all[offset + position - 1]?.body;
    const previousOver = position > 0 && part[position - 1]?.join === 'over';
    const literal = join === 'over' && body.node === 'number' && isPowerOfTen(part[position + 1]?.body);
    const factor = literal ? parenthesised(print(body)) : factorText(body, join, text === '');
    if (text === '') text = factor;
    else if (join === 'over') text += `/${factor}`;
    else if (join === 'times' || previousOver || needsSign(before, factor)) text += `\\cdot ${factor}`;
    else if (before?.node === 'bra' && body.node === 'ket') text += factor.slice(1);
    else text += ` ${factor}`;
  });
  return text;
}

/** A power of ten after a divisor would be read as part of its number. */
function isPowerOfTen(tree: Expression | undefined): boolean {
  return tree?.node === 'power' && tree.base.node === 'number' && tree.base.mantissa === '10';
}

function factorText(body: Expression, join: Factor['join'], isFirst: boolean): string {
  const isScientific = body.node === 'number' && body.scientific;
  if (isScientific && join !== 'over') return print(body);
  const level = rank(body);
  return level === 0 || (level === 1 && !(isFirst && join !== 'over')) ? parenthesised(print(body)) : print(body);
}

/** Whether two factors side by side would be read as something else: a number after anything, a fraction after one. */
function needsSign(before: Expression | undefined, factor: string): boolean {
  if (/^[\d.]/.test(factor)) return true;
  return before?.node === 'number' && factor.startsWith('\\frac');
}

function callText(tree: Extract<Expression, { node: 'call' }>, exponent: string): string {
  const [first] = tree.arguments;
  if (tree.written === 'power' && first) return `\\mathrm{e}^{${print(first)}}`;
  const inside = parenthesised(tree.arguments.map(print).join(',\\,'));
  if (tree.written === 'inverse') return `\\${tree.name.slice(1)}^{-1}${inside}`;
  return `${functions[tree.name] ?? `\\${tree.name}`}${exponent}${inside}`;
}

const functions: Readonly<Partial<Record<string, string>>> = {
  asin: '\\arcsin',
  acos: '\\arccos',
  atan: '\\arctan',
  atan2: '\\operatorname{atan2}',
  asinh: '\\operatorname{arsinh}',
  acosh: '\\operatorname{arcosh}',
  atanh: '\\operatorname{artanh}',
  Re: '\\operatorname{Re}',
  Im: '\\operatorname{Im}',
};

function quantityValue(value: Expression): string {
  return value.node === 'sum' && value.terms.length > 1 ? parenthesised(print(value)) : print(value);
}

/** Units upright; one divisor with a slash, more with negative powers. */
function unitText(unit: readonly UnitFactor[]): string {
  const divided = unit.filter(({ power }) => power < 0).length;
  let text = '';
  for (const { prefix, unit: symbol, power } of unit) {
    const name = `\\mathrm{${prefix === 'u' ? '\\mu ' : prefix}${unitSymbol(symbol)}}`;
    const over = divided === 1 && power < 0 && text !== '';
    const exponent = over ? -power : power;
    text += `${text === '' ? '' : over ? '/' : '\\,'}${name}${exponent === 1 ? '' : `^{${exponent}}`}`;
  }
  return text;
}

function unitSymbol(unit: string): string {
  return unit === 'ohm' ? '\\Omega ' : unit === 'deg' ? 'deg' : unit;
}

function escapeText(text: string): string {
  return text.replace(/[\\{}$%#&_^~]/g, (character) => textEscapes[character] ?? character);
}

const textEscapes: Readonly<Record<string, string>> = {
  '\\': '\\textbackslash ',
  '{': '\\{',
  '}': '\\}',
  $: '\\$',
  '%': '\\%',
  '#': '\\#',
  '&': '\\&',
  _: '\\_',
  '^': '\\textasciicircum ',
  '~': '\\textasciitilde ',
};
