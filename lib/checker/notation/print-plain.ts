/** Trees to a line of words that a screen reader can say, as typed. */
import { type AnswerTree, type Label, type UnitFactor } from './answer-tree';
import { greekNames } from './characters';
import { nameParts } from './scope';
import {
  type CallNode,
  type Expression,
  type FunctionName,
  type ProductNode,
  type StateLabel,
  type Term,
} from './tree';

/** The reading in words: `i h-bar S z`, `minus one half` is said as `minus 1 over 2`. */
export function printPlain(tree: AnswerTree): string {
  switch (tree.node) {
    case 'values':
      return tree.entries.map(({ label, value }) => said(label) + say(value)).join(', and ');
    case 'pairs':
      return tree.pairs
        .map(({ value, state }) => `value ${said(value.label)}${say(value.value)} with state ${say(state)}`)
        .join('; ');
    case 'quantity':
      return tree.unit === null ? `${say(tree.value)}, without a unit` : `${say(tree.value)} ${sayUnit(tree.unit)}`;
    case 'choice':
      return tree.choice;
    default:
      return say(tree);
  }
}

function said(label: Label | null): string {
  if (label === null) return '';
  return `${sayName(label.base, label.index ?? '', 0)} equals `;
}

function say(tree: Expression): string {
  switch (tree.node) {
    case 'number':
      return tree.scientific ? `${tree.mantissa} times 10 to the ${signed(tree.exponent)}` : tree.mantissa;
    case 'constant':
      return constants[tree.name];
    case 'symbol': {
      const parts = nameParts(tree.name);
      return parts === null ? tree.name : sayName(parts.base, parts.index, parts.primes);
    }
    case 'group':
      return enclosed(tree.body);
    case 'sum':
      return saySum(tree.terms);
    case 'product':
      return sayProduct(tree);
    case 'fraction':
      return sayQuotient(
        say(tree.numerator),
        say(tree.denominator),
        isShort(tree.numerator) && isShort(tree.denominator),
      );
    case 'power':
      return tree.placed === 'name' && tree.base.node === 'call'
        ? sayCall(tree.base, sayExponent(tree.exponent))
        : `${say(tree.base)} ${sayExponent(tree.exponent)}`;
    case 'root':
      return `${tree.degree === 2 ? 'square root' : tree.degree === 3 ? 'cube root' : `root of degree ${tree.degree}`} of ${of(tree.radicand, 'root')}`;
    case 'call':
      return sayCall(tree, '');
    case 'absolute':
      return `absolute value of ${of(tree.body, 'absolute value')}`;
    case 'conjugate':
      return `complex conjugate of ${of(tree.body, 'conjugate')}`;
    case 'adjoint':
      return `${say(tree.body)} dagger`;
    case 'transpose':
      return `${say(tree.body)} transposed`;
    case 'operator':
      return `${tree.family === 'pauli' ? 'sigma' : 'S'} ${sayIndex(tree.index)}`;
    case 'identity':
      return tree.written === 'sigma' ? 'sigma 0' : 'identity';
    case 'matrix':
      return `matrix with first row ${entries(tree.rows[0])}, second row ${entries(tree.rows[1])}, end matrix`;
    case 'column':
      return `column ${entries(tree.entries)}, end column`;
    case 'row':
      return `row ${entries(tree.entries)}, end row`;
    case 'ket':
      return `ket ${sayState(tree.state, tree.written)}`;
    case 'bra':
      return `bra ${sayState(tree.state, tree.written)}`;
    case 'commutator':
    case 'anticommutator':
      return `${tree.node} of ${say(tree.left)} and ${say(tree.right)}, end ${tree.node}`;
    case 'list':
      return `list ${entries(tree.entries)}, end list`;
    case 'reference':
      return `${tree.name} of ${entries(tree.arguments)}, end ${tree.name}`;
  }
}

const constants = { i: 'i', pi: 'pi', hbar: 'h-bar', planck: 'h', euler: 'e' } as const;

function entries(expressions: readonly Expression[]): string {
  return expressions.map(say).join(', ');
}

function enclosed(tree: Expression): string {
  return isShort(tree) ? say(tree) : `open bracket ${say(tree)} close bracket`;
}

function of(tree: Expression, what: string): string {
  return isShort(tree) ? say(tree) : `${say(tree)}, end ${what}`;
}

/** Whether an expression is said without doubt about where it ends. */
function isShort(tree: Expression): boolean {
  switch (tree.node) {
    case 'number':
      return !tree.scientific;
    case 'constant':
    case 'symbol':
    case 'operator':
    case 'identity':
    case 'ket':
    case 'bra':
      return true;
    case 'group':
      return isShort(tree.body);
    default:
      return false;
  }
}

const signs = { '+': 'plus', '-': 'minus', '±': 'plus or minus', '∓': 'minus or plus' } as const;

function saySum(terms: readonly Term[]): string {
  let text = '';
  for (const { sign, body } of terms) {
    const term = body.node === 'sum' ? `open bracket ${say(body)} close bracket` : say(body);
    if (text === '') text = sign === '+' ? term : `${signs[sign]} ${term}`;
    else text += ` ${signs[sign]} ${term}`;
  }
  return text;
}

function sayQuotient(top: string, bottom: string, short: boolean): string {
  return short ? `${top} over ${bottom}` : `fraction ${top} over ${bottom} end fraction`;
}

function sayProduct({ factors }: ProductNode): string {
  let text = '';
  let short = true;
  factors.forEach(({ join, body }, index) => {
    const factor = body.node === 'sum' ? `open bracket ${say(body)} close bracket` : say(body);
    if (index === 0) {
      text = factor;
      short = isShort(body);
    } else if (join === 'over') {
      text = sayQuotient(text, factor, short && isShort(body));
      short = false;
    } else {
      text += join === 'times' ? ` times ${factor}` : ` ${factor}`;
      short = false;
    }
  });
  return text;
}

function sayExponent(exponent: Expression): string {
  if (exponent.node === 'number' && exponent.mantissa === '2' && !exponent.scientific) return 'squared';
  if (exponent.node === 'number' && exponent.mantissa === '3' && !exponent.scientific) return 'cubed';
  return isShort(exponent) ? `to the ${say(exponent)}` : `to the ${say(exponent)}, end exponent`;
}

const functionNames: Readonly<Partial<Record<FunctionName, string>>> = {
  sin: 'sine',
  cos: 'cosine',
  tan: 'tangent',
  sec: 'secant',
  csc: 'cosecant',
  cot: 'cotangent',
  sinh: 'hyperbolic sine',
  cosh: 'hyperbolic cosine',
  tanh: 'hyperbolic tangent',
  asin: 'inverse sine',
  acos: 'inverse cosine',
  atan: 'inverse tangent',
  atan2: 'two-argument inverse tangent',
  asinh: 'inverse hyperbolic sine',
  acosh: 'inverse hyperbolic cosine',
  atanh: 'inverse hyperbolic tangent',
  exp: 'exponential',
  ln: 'natural logarithm',
  log: 'natural logarithm',
  Re: 'real part',
  Im: 'imaginary part',
};

function sayCall(tree: CallNode, exponent: string): string {
  const [first] = tree.arguments;
  if (tree.written === 'power' && first) return `e ${sayExponent(first)}`;
  const name = functionNames[tree.name] ?? tree.name;
  const inside = tree.arguments.length === 1 && first ? of(first, name) : `${entries(tree.arguments)}, end ${name}`;
  return `${name}${exponent === '' ? '' : ` ${exponent}`} of ${inside}`;
}

function sayName(base: string, index: string, primes: number): string {
  const letters = base === 'ħ' ? 'h-bar' : capitalGreek(base);
  const prime = ' prime'.repeat(primes);
  return index === '' ? letters + prime : `${letters} ${sayIndex(index)}${prime}`;
}

function capitalGreek(base: string): string {
  const name = greekNames.get(base);
  if (name === undefined) return /^[A-Z]$/.test(base) ? `capital ${base}` : base;
  return /^[A-Z]/.test(name) ? `capital ${name.toLowerCase()}` : name;
}

const indexWords: ReadonlyMap<string, string> = new Map([
  ['+', 'plus'],
  ['-', 'minus'],
  ['±', 'plus or minus'],
  ['∓', 'minus or plus'],
  ['↑', 'up'],
  ['↓', 'down'],
  ['ħ', 'h-bar'],
  ['ℓ', 'l'],
]);

function sayIndex(index: string): string {
  return indexWords.get(index) ?? greekNames.get(index) ?? index;
}

function sayState(state: StateLabel, written: string): string {
  switch (written) {
    case '↑':
    case 'up':
      return 'up';
    case '↓':
    case 'down':
      return 'down';
    case '0':
    case '1':
      return written;
    case '+':
      return 'plus';
    case '-':
      return 'minus';
    default:
      return `${state.startsWith('+') ? 'plus' : 'minus'} ${state.slice(1)}`;
  }
}

function signed(exponent: number): string {
  return exponent < 0 ? `minus ${-exponent}` : String(exponent);
}

function sayUnit(unit: readonly UnitFactor[]): string {
  return unit
    .map(({ prefix, unit: symbol, power }) => {
      const name = `${prefix === 'u' ? 'micro ' : prefix}${symbol}`;
      if (power === 1) return name;
      return power === -1 ? `per ${name}` : `${name} to the ${signed(power)}`;
    })
    .join(' ');
}
