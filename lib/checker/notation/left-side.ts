/** The decoration `name =` before an answer, and the labels of values. */
import { type Label } from './answer-tree';
import { greekNames } from './characters';
import { type Cursor } from './cursor';
import { isSign } from './parse-sign';
import { nesting } from './starts';
import { type Token, type TokenKind } from './token';

/** Positions of tokens of a kind in a range, outside brackets. */
export function outsideBrackets(tokens: readonly Token[], from: number, to: number, kind: TokenKind): number[] {
  const found: number[] = [];
  let depth = 0;
  for (let index = from; index < to; index += 1) {
    const token = tokens[index];
    if (token === undefined) break;
    depth += nesting(token);
    if (depth === 0 && token.kind === kind) found.push(index);
  }
  return found;
}

/** Where an expression in a range begins after `name =`, and the label if the name is one; reports what is no such thing. */
export function passLeftSide(
  cursor: Cursor,
  from: number,
  to: number,
): { readonly from: number; readonly label: Label | null } {
  const equals = outsideBrackets(cursor.tokens, from, to, '=');
  const first = equals[0];
  const second = equals[1];
  if (first === undefined) return { from, label: null };
  if (second !== undefined) {
    const token = cursor.tokens[second];
    if (token) cursor.fail('chain', token, 'There is more than one equals sign.', 'Give the final expression only.');
    return { from, label: null };
  }
  if (!isLeftSide(cursor.tokens, from, first)) {
    const start = cursor.tokens[from]?.start ?? 0;
    const end = cursor.tokens[first]?.end ?? 0;
    const message = 'Only a name can stand before an equals sign here.';
    cursor.fail('left-side', { start, end }, message, 'Give the expression alone.');
    return { from, label: null };
  }
  return { from: first + 1, label: labelOf(cursor.tokens, from, first) };
}

/** A name, a name with its arguments or a sign (`E±`), a bracket such as `[S_x, S_y]`, a ket, or a mean value. */
function isLeftSide(tokens: readonly Token[], from: number, to: number): boolean {
  const first = tokens[from];
  if (first === undefined || to <= from) return false;
  let index = from;
  if (isName(first)) {
    index += 1;
    while (index < to && isName(tokens[index]) && tokens[index]?.spaced === false) index += 1;
    if (index === to || (index === to - 1 && isSign(tokens[index]))) return true;
    return tokens[index]?.kind === '(' && isWrapped(tokens, index, to);
  }
  if (first.kind === 'ket' || first.kind === 'bra' || first.kind === 'named-ket') return to === from + 1;
  if (first.kind === '<') return tokens[to - 1]?.kind === '>';
  return isWrapped(tokens, from, to);
}

function isName(token: Token | undefined): boolean {
  if (token?.kind === 'unknown') return token.reason !== 'bad-index';
  const is = token?.kind === 'word' ? token.meaning?.is : undefined;
  return is === 'symbol' || is === 'operator' || is === 'constant' || is === 'identity';
}

/** Whether a range is one pair of brackets of the same sort with what they hold. */
export function isWrapped(tokens: readonly Token[], from: number, to: number): boolean {
  const open = tokens[from]?.kind;
  const close = open === '(' ? ')' : open === '[' ? ']' : open === '{' ? '}' : null;
  if (close === null || to < from + 2 || tokens[to - 1]?.kind !== close) return false;
  let depth = 0;
  for (let index = from; index < to; index += 1) {
    const token = tokens[index];
    if (token) depth += nesting(token);
    if (depth <= 0) return index === to - 1;
  }
  return false;
}

/** The label that names make, or null where they make none that could be shown back. */
function labelOf(tokens: readonly Token[], from: number, to: number): Label | null {
  const sign = isSign(tokens[to - 1]) ? (tokens[to - 1]?.kind ?? null) : null;
  const end = sign === null ? to : to - 1;
  const last = tokens[end - 1];
  if (!isName(last) || last === undefined) return null;
  let base = '';
  for (let index = from; index < end; index += 1) {
    base += tokens[index]?.text ?? '';
    if (index < end - 1 && tokens[index]?.index !== null) return null;
  }
  const printable = /^(?:[A-Za-z]+|ħ|ℓ)$/.test(base) || greekNames.has(base);
  return printable ? { base, index: last.index ?? sign } : null;
}
