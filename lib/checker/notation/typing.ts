/** The types of combined expressions. A refusal is a diagnostic code with its sentence. */
import { type DiagnosticCode } from '../diagnostics';
import { type Expression, type ReferenceName, type ValueType } from './tree';

export interface Refusal {
  readonly code: DiagnosticCode;
  readonly message: string;
  readonly hint?: string;
}

export type Typed = ValueType | Refusal;

/** Whether a combination was refused. */
export function isRefusal(typed: Typed): typed is Refusal {
  return typeof typed !== 'string';
}

const names: Readonly<Record<ValueType, string>> = {
  scalar: 'a scalar',
  operator: 'an operator',
  ket: 'a state',
  bra: 'a bra',
  list: 'a list of values',
  pairs: 'a list of pairs',
};

/** A type in words, with its article. */
export function nameOfType(type: ValueType): string {
  return names[type];
}

/** The type of a sum of two terms; a scalar beside an operator means that multiple of the identity. */
export function sumType(left: ValueType, right: ValueType): Typed {
  if (left === right) {
    return left === 'pairs' ? { code: 'sum-type', message: 'Lists of pairs cannot be added.' } : left;
  }
  if ((left === 'scalar' && right === 'operator') || (left === 'operator' && right === 'scalar')) return 'operator';
  return { code: 'sum-type', message: `${capital(names[left])} and ${names[right]} cannot be added.` };
}

/** The type of a product of two factors in this order. */
export function productType(left: ValueType, right: ValueType): Typed {
  if (left === 'pairs' || right === 'pairs') return { code: 'product-type', message: 'Pairs cannot be multiplied.' };
  if (left === 'scalar') return right;
  if (right === 'scalar') return left;
  if (left === 'list' || right === 'list') {
    const message = 'A list can only be multiplied by a scalar.';
    return { code: 'product-type', message, hint: 'Write a state as a column, [a; b].' };
  }
  if (left === 'operator') {
    if (right !== 'bra') return right;
    return {
      code: 'product-type',
      message: 'An operator stands to the left of a bra.',
      hint: 'Write the bra first: <+|A.',
    };
  }
  if (left === 'bra') {
    if (right === 'operator') return 'bra';
    if (right === 'ket') return 'scalar';
    return { code: 'two-bras', message: 'Two bras stand side by side.' };
  }
  if (right === 'bra') return 'operator';
  if (right === 'ket') {
    const message = 'Two kets stand side by side.';
    return { code: 'two-kets', message, hint: 'For an inner product write <a|b>, for a projector |a><b|.' };
  }
  return {
    code: 'product-type',
    message: 'An operator stands to the right of a ket.',
    hint: 'Write the operator first: A|+>.',
  };
}

/** The type of something divided by a divisor. */
export function quotientType(dividend: ValueType, divisor: ValueType): Typed {
  if (divisor === 'scalar') return productType(dividend, 'scalar');
  if (divisor === 'operator') {
    return {
      code: 'operator-division',
      message: 'An operator cannot be divided by.',
      hint: 'Write the inverse, A^-1.',
    };
  }
  return { code: 'operator-division', message: `${capital(names[divisor])} cannot be divided by.` };
}

/** The type of a power. */
export function powerType(base: Expression, exponent: Expression): Typed {
  if (exponent.type !== 'scalar') {
    const message = `${capital(names[exponent.type])} cannot be an exponent, except of e.`;
    return { code: 'power-type', message };
  }
  if (base.type === 'scalar') return 'scalar';
  if (base.type === 'operator') {
    if (!isFractional(exponent)) return 'operator';
    return { code: 'operator-function', message: 'The root of an operator is not read here.' };
  }
  return { code: 'power-type', message: `${capital(names[base.type])} has no powers.` };
}

/** The type of a function of one argument other than exp. */
export function scalarFunctionType(name: string, argument: ValueType): Typed {
  if (argument === 'scalar') return 'scalar';
  const what = name === 'sqrt' ? 'A square root' : name === 'abs' ? 'An absolute value' : `The function ${name}`;
  const code = argument === 'operator' ? 'operator-function' : 'bad-argument';
  const hint = argument === 'operator' ? 'Write out the matrix.' : undefined;
  return { code, message: `${what} of ${names[argument]} is not read here.`, hint };
}

/** The type of an adjoint or transpose. */
export function turnedType(type: ValueType): Typed {
  if (type === 'ket') return 'bra';
  if (type === 'bra') return 'ket';
  if (type === 'scalar' || type === 'operator') return type;
  return { code: 'power-type', message: `${capital(names[type])} has no adjoint.` };
}

/** The number of entries of an expression of type list; three or four for the reference functions that give lists. */
export function listLength(expression: Expression): number {
  switch (expression.node) {
    case 'list':
      return expression.entries.length;
    case 'group':
    case 'conjugate':
      return listLength(expression.body);
    case 'fraction':
      return listLength(expression.numerator);
    case 'sum':
      return expression.terms[0] ? listLength(expression.terms[0].body) : 0;
    case 'product': {
      const factor = expression.factors.find(({ body }) => body.type === 'list');
      return factor ? listLength(factor.body) : 0;
    }
    case 'reference':
      return lengths[expression.name] ?? 0;
    default:
      return 0;
  }
}

const lengths: Readonly<Partial<Record<ReferenceName, number>>> = { eigenvalues: 2, pauli: 4, bloch: 3 };

/** The expression inside any grouping brackets. */
export function withoutGroups(expression: Expression): Expression {
  let inner = expression;
  while (inner.node === 'group') inner = inner.body;
  return inner;
}

/** Whether an expression is the literal zero. */
export function isLiteralZero(expression: Expression): boolean {
  const inner = withoutGroups(expression);
  return inner.node === 'number' && inner.numerator === 0n;
}

function isFractional(exponent: Expression): boolean {
  let inner = withoutGroups(exponent);
  if (inner.node === 'sum' && inner.terms.length === 1 && inner.terms[0]) inner = withoutGroups(inner.terms[0].body);
  if (inner.node === 'number') return inner.numerator % inner.denominator !== 0n;
  const parts =
    inner.node === 'fraction'
      ? [inner.numerator, inner.denominator]
      : inner.node === 'product' && inner.factors.length === 2 && inner.factors[1]?.join === 'over'
        ? inner.factors.map(({ body }) => body)
        : [];
  const [top, bottom] = parts.map(withoutGroups);
  if (top?.node !== 'number' || bottom?.node !== 'number') return false;
  return (top.numerator * bottom.denominator) % (top.denominator * bottom.numerator || 1n) !== 0n;
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
