/** Arguments in brackets. */
import { type Cursor } from './cursor';
import { type Token } from './token';
import { type Expression } from './tree';

/** arguments = `(` sum { `,` sum } `)`, after a function's name; `each` is told the place of every argument. */
export function parseArguments(
  cursor: Cursor,
  token: Token,
  each?: { readonly before: (index: number) => void; readonly after: (index: number, value: Expression) => void },
): Expression[] {
  const open = cursor.peek();
  if (!cursor.accept('(')) {
    cursor.fail('missing-argument', token, `The function ${token.text} needs its arguments in brackets.`);
    return [];
  }
  const expected = cursor.stateExpected;
  cursor.stateExpected = false;
  const values: Expression[] = [];
  do {
    each?.before(values.length);
    const value = cursor.grammar.sum(cursor);
    each?.after(values.length, value);
    values.push(value);
  } while (cursor.accept(','));
  cursor.stateExpected = expected;
  if (!cursor.accept(')')) cursor.fail('unclosed', open, 'This bracket is not closed.', 'Add ).');
  return values;
}

/** Reports that a function takes another number of arguments. */
export function refuseCount(cursor: Cursor, token: Token, count: number): void {
  const span = { start: token.start, end: cursor.previous().end };
  cursor.fail('argument-count', span, `The function ${token.text} takes ${count} argument${count === 1 ? '' : 's'}.`);
}
