/** Numbers: decimal literals with their exact value, powers of ten, vulgar and mixed fractions. */
import { vulgarFractions } from './characters';
import { type Cursor } from './cursor';
import { maximumExponent } from './limits';
import { type Token } from './token';
import { type Expression, type FractionNode, type NumberNode } from './tree';

/** The literal of a mantissa and a power of ten. */
export function numberNode(
  start: number,
  end: number,
  mantissa: string,
  exponent: number,
  scientific: boolean,
): NumberNode {
  const point = mantissa.indexOf('.');
  const decimals = point < 0 ? 0 : mantissa.length - point - 1;
  const digits = point < 0 ? mantissa : mantissa.slice(0, point) + mantissa.slice(point + 1);
  const shift = exponent - decimals;
  const whole = digits.length < 16 ? BigInt(Number(digits)) : BigInt(digits);
  return {
    node: 'number',
    type: 'scalar',
    span: { start, end },
    numerator: shift > 0 ? whole * 10n ** BigInt(shift) : whole,
    denominator: shift < 0 ? 10n ** BigInt(-shift) : 1n,
    mantissa,
    exponent,
    decimal: point >= 0 || exponent < 0,
    decimals,
    significantFigures: significantFigures(digits),
    scientific,
  };
}

function significantFigures(digits: string): number {
  let zeros = 0;
  while (zeros < digits.length && digits.charCodeAt(zeros) === 48) zeros += 1;
  return Math.max(1, digits.length - zeros);
}

/** number = digits [ `.` digits ] [ `e` [sign] digits ] | digits vulgar, where `1½` is 1 + ½ */
export function parseNumber(cursor: Cursor): Expression {
  const token = cursor.next();
  const literal = cursor.node(numberNode(token.start, token.end, token.text, token.exponent, token.scientific));
  const next = cursor.peek();
  if (next.kind !== 'vulgar' || next.spaced) return literal;
  if (literal.decimal || literal.scientific) {
    return cursor.fail(
      'mixed-number',
      next,
      'A fraction cannot follow a decimal number.',
      'Write + or * between them.',
    );
  }
  const fraction = parseVulgar(cursor);
  const span = { start: token.start, end: next.end };
  const terms = [{ sign: '+', body: literal } as const, { sign: '+', body: fraction } as const];
  const body = cursor.node({ node: 'sum', type: 'scalar', span, terms });
  return cursor.node({ node: 'group', type: 'scalar', span, bracket: '(', body });
}

/** vulgar = `½` | `¼` | … */
export function parseVulgar(cursor: Cursor): FractionNode {
  const token = cursor.next();
  const [top, bottom] = vulgarFractions.get(token.text) ?? [1, 1];
  const span = { start: token.start, end: token.end };
  return cursor.node({
    node: 'fraction',
    type: 'scalar',
    span,
    numerator: cursor.node(numberNode(token.start, token.end, String(top), 0, false)),
    denominator: cursor.node(numberNode(token.start, token.end, String(bottom), 0, false)),
  });
}

/**
 * scientific = number times `10` `^` integer, read as one number; null where something else stands here.
 * The integer may be braced or in brackets.
 */
export function parsePowerOfTen(cursor: Cursor): NumberNode | null {
  const mantissa = cursor.peek();
  if (mantissa.kind !== 'number' || mantissa.scientific || cursor.ahead(1).kind !== '*') return null;
  const ten = cursor.ahead(2);
  if (ten.kind !== 'number' || ten.text !== '10' || ten.scientific) return null;
  const exponent = integerExponent(cursor, 3);
  if (exponent === null) return null;
  const after = cursor.ahead(exponent.length);
  if (after.kind === '^' || after.kind === 'superscript') return null;
  const last = cursor.ahead(exponent.length - 1);
  if (Math.abs(exponent.value) > maximumExponent) {
    const span = { start: mantissa.start, end: last.end };
    return cursor.fail('number-too-large', span, 'This power of ten is too large to be read.');
  }
  for (let count = 0; count < exponent.length; count += 1) cursor.next();
  return cursor.node(numberNode(mantissa.start, last.end, mantissa.text, exponent.value, true));
}

/** The integer after a base some tokens ahead; `length` counts tokens up to its end. */
function integerExponent(cursor: Cursor, from: number): { readonly value: number; readonly length: number } | null {
  const mark = cursor.ahead(from);
  if (mark.kind === 'superscript') {
    return /^[+-]?\d+$/.test(mark.text) ? { value: Number(mark.text), length: from + 1 } : null;
  }
  if (mark.kind !== '^') return null;
  let position = from + 1;
  const open = cursor.ahead(position).kind;
  const close = open === '{' ? '}' : open === '(' ? ')' : null;
  if (close !== null) position += 1;
  const sign = cursor.ahead(position).kind;
  if (sign === '+' || sign === '-') position += 1;
  const digits = cursor.ahead(position);
  if (!isInteger(digits)) return null;
  position += 1;
  if (close !== null) {
    if (cursor.ahead(position).kind !== close) return null;
    position += 1;
  }
  return { value: sign === '-' ? -Number(digits.text) : Number(digits.text), length: position };
}

function isInteger(token: Token): boolean {
  return token.kind === 'number' && !token.scientific && !token.text.includes('.');
}
