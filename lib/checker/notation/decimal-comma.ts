/** Decimal commas, which are not read. */
import { type Diagnostic } from '../diagnostics';
import { type Token } from './token';

/** A comma directly between digits where one number is asked for (`63,87 MHz`), outside the brackets of lists. */
export function findDecimalComma(tokens: readonly Token[]): Diagnostic | null {
  let lists = 0;
  for (let index = 0; index + 1 < tokens.length; index += 1) {
    const token = tokens[index];
    const before = tokens[index - 1];
    const after = tokens[index + 1];
    if (token === undefined || after === undefined) break;
    if (token.kind === '[' || token.kind === '{' || (token.kind === '(' && before?.kind === 'letters')) lists += 1;
    else if (token.kind === ']' || token.kind === '}' || (token.kind === ')' && lists > 0)) lists -= 1;
    if (token.kind !== ',' || lists > 0 || token.spaced || after.spaced) continue;
    if (before?.kind !== 'number' || after.kind !== 'number' || before.text.includes('.')) continue;
    const span = { start: before.start, end: after.end };
    const message = 'A comma is not read inside a number.';
    return { code: 'decimal-comma', span, message, hint: `For a decimal point write ${before.text}.${after.text}.` };
  }
  return null;
}
