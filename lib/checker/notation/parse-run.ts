/** The extent of a bare function's argument and of a divisor: unwritten products. */
import { choices, type Cursor } from './cursor';
import { parsePowerOfTen } from './parse-number';
import { isSign, parseSigned } from './parse-sign';
import { startsOperand } from './starts';
import { type Token } from './token';
import { type Expression, type Factor, type ProductNode } from './tree';
import { isLiteralZero } from './typing';

/**
 * run = [ sign ] factor { factor } [ `/` number { factor } ]
 * The argument of a function without brackets: up to a written product sign, another function, root, exponential, ket,
 * bra, operator, matrix, sum or comma.
 */
export function parseRun(cursor: Cursor, ofRoot: boolean): Expression {
  if (isSign(cursor.peek())) return parseSigned(cursor, (inner) => parseRun(inner, ofRoot));
  const token = cursor.peek();
  if (!startsOperand(token)) {
    return cursor.fail(
      'missing-argument',
      token,
      'A function needs an argument here.',
      'Write it in brackets, as in sin(x).',
    );
  }
  return cursor.takes(choices.shortExtent) ? parseShortRun(cursor, ofRoot) : parseWholeRun(cursor, ofRoot);
}

function parseWholeRun(cursor: Cursor, ofRoot: boolean): Expression {
  const first = cursor.grammar.power(cursor);
  const factors: Factor[] = [{ join: 'unwritten', body: first }];
  let last = first;
  let divided = false;
  let named = first.node !== 'number';
  let doubtful = first.node === 'power';
  while (first.node !== 'call' && first.node !== 'root' && first.type === 'scalar') {
    const token = cursor.peek();
    if (token.kind === '/' && !divided && cursor.ahead(1).kind === 'number') {
      cursor.next();
      last = cursor.grammar.power(cursor);
      if (isLiteralZero(last)) cursor.fail('division-by-zero', last.span, 'This divides by zero.');
      factors.push({ join: 'over', body: last });
      divided = true;
      doubtful = true;
      continue;
    }
    if (!runGoesOn(cursor, token)) break;
    doubtful ||= ofRoot || (named ? setsOff(cursor, token) : token.kind !== 'word');
    const from = cursor.at;
    refuseNumbers(cursor, last);
    const body = cursor.grammar.power(cursor);
    if (body.type !== 'scalar') {
      cursor.giveBack(from, body);
      break;
    }
    doubtful ||= body.node === 'power';
    named ||= body.node !== 'number';
    factors.push({ join: 'unwritten', body });
    last = body;
  }
  const span = { start: first.span.start, end: last.span.end };
  if (doubtful) cursor.meet(choices.shortExtent, span);
  if (cursor.peek().kind === '/' && startsOperand(cursor.ahead(1)) && first.type === 'scalar') {
    if (cursor.takes(choices.longExtent)) {
      cursor.next();
      const divisor = parseDivisor(cursor, cursor.grammar.power(cursor));
      factors.push({ join: 'over', body: divisor });
      return productOf(cursor, factors);
    }
    cursor.meet(choices.longExtent, { start: span.start, end: cursor.ahead(1).end });
  }
  return productOf(cursor, factors);
}

/** The other common extent: coefficients and one name, or names without space, and no power. Of a root, one atom. */
function parseShortRun(cursor: Cursor, ofRoot: boolean): Expression {
  const factors: Factor[] = [];
  for (;;) {
    const token = cursor.peek();
    const body = cursor.grammar.primary(cursor);
    factors.push({ join: 'unwritten', body });
    const next = cursor.peek();
    if (ofRoot || body.type !== 'scalar' || next.kind !== 'word' || !runGoesOn(cursor, next)) break;
    if (token.kind !== 'number' && setsOff(cursor, next)) break;
  }
  return productOf(cursor, factors);
}

/** Whether white space or a bracket makes it doubtful that this token belongs to what stands before it. */
function setsOff(cursor: Cursor, token: Token): boolean {
  if (token.kind !== 'word' && token.kind !== 'number') return true;
  return token.spaced && !cursor.previous().command;
}

function runGoesOn(cursor: Cursor, token: Token): boolean {
  switch (token.kind) {
    case 'number':
    case 'vulgar':
    case 'unknown':
    case '(':
    case '{':
    case 'frac':
    case 'overline':
    case 'bar-open':
      return true;
    case 'word': {
      const { meaning } = token;
      if (meaning?.is === 'symbol') return true;
      if (meaning?.is !== 'constant') return false;
      const after = cursor.ahead(1).kind;
      return meaning.name !== 'euler' || (after !== '^' && after !== 'superscript');
    }
    default:
      return false;
  }
}

/**
 * Whether the exponent just read might go on: an unwritten product or quotient stands directly after it that people
 * also write as part of the exponent (`e^iφ`, `2^1/2`).
 */
export function exponentGoesOn(cursor: Cursor, exponent: Expression, ofEuler: boolean): boolean {
  const single = exponent.node === 'sum' && exponent.terms.length === 1 ? exponent.terms[0]?.body : exponent;
  const literal = single?.node === 'number' ? single : null;
  const token = cursor.peek();
  if (token.kind === '/') {
    const divisor = cursor.ahead(1);
    if (literal === null) return startsOperand(divisor);
    return divisor.kind === 'number' && isProperFraction(Number(literal.mantissa), Number(divisor.text));
  }
  if (literal !== null && !ofEuler) return false;
  if (token.kind === '(' || token.kind === '{') return !token.spaced;
  return token.kind !== 'overline' && token.kind !== 'bar-open' && runGoesOn(cursor, token);
}

function isProperFraction(top: number, bottom: number): boolean {
  if (!Number.isInteger(top) || !Number.isInteger(bottom) || bottom < 2 || top < 1) return false;
  let one = top;
  let other = bottom;
  while (other !== 0) [one, other] = [other, one % other];
  return one === 1;
}

/** Whether an operator stands in the unwritten product here, in which case an exponent of e may have it, too. */
export function operatorFollows(cursor: Cursor): boolean {
  for (let distance = 0; distance < longestExponent; distance += 1) {
    const token = cursor.ahead(distance);
    if (isOperatorWord(token)) return true;
    if (token.kind !== '/' && !runGoesOn(cursor, token)) return false;
  }
  return false;
}

/** Tokens of an exponent that are looked at for an operator, so that reading stays linear. */
const longestExponent = 16;

function isOperatorWord(token: Token): boolean {
  return token.kind === 'word' && token.meaning?.is === 'operator';
}

/**
 * The exponent together with the product or quotient that follows it: the reading that `exponentGoesOn` asks about. With
 * operators it is the exponential of an operator.
 */
export function parseLongExponent(cursor: Cursor, exponent: Expression, withOperators: boolean): Expression {
  const sign = exponent.node === 'sum' && exponent.terms.length === 1 ? exponent.terms[0] : undefined;
  const factors: Factor[] = [{ join: 'unwritten', body: sign?.body ?? exponent }];
  let divided = false;
  for (;;) {
    const token = cursor.peek();
    if (token.kind === '/' && !divided && startsOperand(cursor.ahead(1))) {
      cursor.next();
      factors.push({ join: 'over', body: parseDivisor(cursor, cursor.grammar.power(cursor)) });
      divided = true;
      continue;
    }
    if (!runGoesOn(cursor, token) && !(withOperators && isOperatorWord(token))) break;
    const from = cursor.at;
    const body = cursor.grammar.power(cursor);
    if (body.type !== 'scalar' && !(withOperators && body.type === 'operator')) {
      cursor.giveBack(from, body);
      break;
    }
    factors.push({ join: 'unwritten', body });
  }
  const body = productOf(cursor, factors);
  if (sign === undefined || exponent.node !== 'sum') return body;
  const span = { start: exponent.span.start, end: body.span.end };
  return cursor.node({ ...exponent, type: body.type, span, terms: [{ sign: sign.sign, body }] });
}

/**
 * What stands after `/`: by rule one factor. In the other reading the unwritten product that follows belongs to it
 * (`eB/2m`), unless brackets or a fraction set it off.
 */
export function parseDivisor(cursor: Cursor, first: Expression): Expression {
  if (first.type !== 'scalar' || first.node === 'group' || first.node === 'fraction') return first;
  if (!startsOperand(cursor.peek())) return first;
  if (!cursor.takes(choices.slash)) {
    cursor.meet(choices.slash, { start: first.span.start, end: cursor.peek().end });
    return first;
  }
  const factors: Factor[] = [{ join: 'unwritten', body: first }];
  let last: Expression = first;
  while (startsOperand(cursor.peek())) {
    refuseNumbers(cursor, last);
    const from = cursor.at;
    const body = cursor.grammar.power(cursor);
    if (body.type !== 'scalar') {
      cursor.giveBack(from, body);
      break;
    }
    factors.push({ join: 'unwritten', body });
    last = body;
  }
  return productOf(cursor, factors);
}

/** A divisor's first factor: a number with its power of ten, or a power. */
export function parseDivisorFactor(cursor: Cursor): Expression {
  if (cursor.takes(choices.slash)) return cursor.grammar.power(cursor);
  const literal = parsePowerOfTen(cursor);
  if (literal) cursor.meet(choices.slash, literal.span);
  return literal ?? cursor.grammar.power(cursor);
}

/** `2 3` and `1 000` are no products. */
export function refuseNumbers(cursor: Cursor, last: Expression): void {
  const before = cursor.previous();
  const next = cursor.peek();
  if (next.kind !== 'number' && next.kind !== 'vulgar') return;
  if (before.kind !== 'vulgar' && (before.kind !== 'number' || last.node === 'fraction')) return;
  const span = { start: before.start, end: next.end };
  const thousands = next.text.length === 3 && next.kind === 'number';
  const hint = thousands
    ? `For one number write ${before.text}${next.text}; for a product write *.`
    : 'For a product write * between them.';
  cursor.fail('numbers-side-by-side', span, 'Two numbers stand side by side.', hint);
}

function productOf(cursor: Cursor, factors: readonly Factor[]): Expression {
  const first = factors[0]?.body;
  const last = factors[factors.length - 1]?.body;
  if (first === undefined || last === undefined)
    return cursor.fail('missing-operand', cursor.peek(), 'Something is missing here.');
  if (factors.length === 1) return first;
  const type = factors.findLast(({ body }) => body.type !== 'scalar')?.body.type ?? 'scalar';
  const span = { start: first.span.start, end: last.span.end };
  return cursor.node<ProductNode>({ node: 'product', type, span, factors });
}
