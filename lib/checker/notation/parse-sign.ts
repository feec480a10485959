/** Signs before terms, factors and exponents. */
import { type Cursor } from './cursor';
import { type Token } from './token';
import { type Expression, type Sign } from './tree';

/** Whether a token is a sign. */
export function isSign(token: Token | undefined): boolean {
  const kind = token?.kind;
  return kind === '+' || kind === '-' || kind === '±' || kind === '∓';
}

/** sign = `+` | `-` | `±` | `∓`, the last two where two values may stand */
export function parseSign(cursor: Cursor): Sign {
  const token = cursor.next();
  const { kind } = token;
  if (kind !== '±' && kind !== '∓') return kind === '-' ? '-' : '+';
  cursor.plusMinusSeen = true;
  if (!cursor.plusMinus) {
    const message = `The sign ${kind} means two values, and here only one can stand.`;
    const hint = token.text === '+-' ? 'For a minus write a - b or a + (-b).' : undefined;
    cursor.fail('plus-minus', token, message, hint);
  }
  return kind;
}

/** signed = sign operand, where a plus means nothing */
export function parseSigned(cursor: Cursor, operand: (cursor: Cursor) => Expression): Expression {
  const { start } = cursor.peek();
  const sign = parseSign(cursor);
  cursor.enter();
  const body = operand(cursor);
  cursor.leave();
  if (sign === '+') return body;
  if (body.type === 'pairs') return cursor.fail('sum-type', body.span, 'A list of pairs has no sign.');
  return cursor.node({ node: 'sum', type: body.type, span: { start, end: body.span.end }, terms: [{ sign, body }] });
}
