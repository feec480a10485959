/** Products and quotients, written and unwritten. */
import { type Cursor } from './cursor';
import { parsePowerOfTen } from './parse-number';
import { parseDivisor, parseDivisorFactor, refuseNumbers } from './parse-run';
import { isSign, parseSigned } from './parse-sign';
import { nesting, startsOperand } from './starts';
import { type Token } from './token';
import { type Expression, type Factor, type Join, type ProductNode, type ValueType } from './tree';
import { isLiteralZero, productType, quotientType } from './typing';

/**
 * product = factor { `*` operand | `/` divisor | factor }
 * operand = sign operand | factor
 * All three joins have one rank and go from left to right. A factor is a power, or a number with its power of ten.
 */
export function parseProduct(cursor: Cursor): Expression {
  const first = parseFactor(cursor);
  let token = cursor.peek();
  let join = joinOf(token);
  let inside = insideBraket(cursor, first, 'scalar');
  if (join === null && inside === null) return first;
  const factors: Factor[] = [{ join: 'unwritten', body: first }];
  let type = first.type;
  let last = first;
  for (;;) {
    if (inside) {
      type = cursor.typed(productType(type, inside.type), inside.span);
      pushInside(factors, inside);
      last = inside;
    }
    token = cursor.peek();
    join = joinOf(token);
    if (join === null) break;
    const body = parseJoined(cursor, join, last);
    const before = type;
    const typed = join === 'over' ? quotientType(type, body.type) : productType(type, body.type);
    type = cursor.typed(typed, join === 'over' ? body.span : { start: last.span.start, end: body.span.end });
    factors.push({ join, body });
    last = body;
    inside = insideBraket(cursor, body, before);
  }
  const span = { start: first.span.start, end: last.span.end };
  return cursor.node<ProductNode>({ node: 'product', type, span, factors });
}

function joinOf(token: Token): Join | null {
  if (token.kind === '*') return 'times';
  if (token.kind === '/') return 'over';
  return startsOperand(token) ? 'unwritten' : null;
}

function parseFactor(cursor: Cursor): Expression {
  return parsePowerOfTen(cursor) ?? cursor.grammar.power(cursor);
}

function parseJoined(cursor: Cursor, join: Join, last: Expression): Expression {
  if (join === 'unwritten') {
    refuseNumbers(cursor, last);
    const body = parseFactor(cursor);
    refuseMixed(cursor, last, body);
    return body;
  }
  cursor.next();
  if (join === 'times') return parseOperand(cursor, parseFactor);
  const divisor = parseDivisor(cursor, parseOperand(cursor, parseDivisorFactor));
  if (isLiteralZero(divisor)) cursor.fail('division-by-zero', divisor.span, 'This divides by zero.');
  return divisor;
}

function parseOperand(cursor: Cursor, factor: (cursor: Cursor) => Expression): Expression {
  if (!isSign(cursor.peek())) return factor(cursor);
  return parseSigned(cursor, (inner) => parseOperand(inner, factor));
}

/** `1\frac12` could be 1 + ½ or 1 · ½. */
function refuseMixed(cursor: Cursor, last: Expression, body: Expression): void {
  if (last.node !== 'number' || body.node !== 'fraction') return;
  if (body.numerator.node !== 'number' || body.denominator.node !== 'number') return;
  const span = { start: last.span.start, end: body.span.end };
  const message = 'A number directly before a fraction can be a sum or a product.';
  cursor.fail('mixed-number', span, message, 'Write + or * between them.');
}

/**
 * braket = bra sum ket, where the sum holds a sign outside brackets, as in `<+|S_x + S_y|->`: the bars then hold the
 * sum together. Null where the factor just read is no bra, where no sign stands before its ket, and after a ket: there
 * `|+><+| - |-><-|` is a difference of two operators.
 */
function insideBraket(cursor: Cursor, factor: Expression, before: ValueType): Expression | null {
  if (factor.node !== 'bra' || before !== 'scalar' || cursor.previous().kind !== 'bra') return null;
  const close = closingKet(cursor);
  if (close < 0) return null;
  return cursor.within(cursor.at, close, () => {
    const sum = cursor.grammar.sum(cursor);
    if (!cursor.atEnd()) cursor.fail('unexpected', cursor.peek(), 'This is not expected between a bra and a ket.');
    return sum;
  });
}

/** The token of the ket that closes the bra just passed, if a sign stands between them; else −1. */
function closingKet(cursor: Cursor): number {
  let depth = 0;
  let signed = false;
  const limit = cursor.getLimit();
  for (let index = cursor.at; index < limit; index += 1) {
    const token = cursor.tokens[index];
    if (token === undefined) return -1;
    depth += nesting(token);
    if (depth < 0) return -1;
    if (depth > 0) continue;
    if (token.kind === 'ket') return signed ? index : -1;
    if (token.kind === 'bra' || token.kind === ',' || token.kind === ';' || token.kind === '=') return -1;
    const before = cursor.tokens[index - 1]?.kind;
    signed ||= isSign(token) && before !== '^' && before !== '*' && before !== '/';
  }
  return -1;
}

function pushInside(factors: Factor[], inside: Expression): void {
  if (inside.node !== 'product') {
    factors.push({ join: 'unwritten', body: inside });
    return;
  }
  inside.factors.forEach(({ join, body }, index) => factors.push({ join: index === 0 ? 'unwritten' : join, body }));
}
