/** Brackets: grouping, lists, matrices, states, commutators; matrix environments; bars. */
import { type Span } from '../diagnostics';
import { type Cursor } from './cursor';
import { type Token } from './token';
import { type Expression, type ListNode } from './tree';
import { nameOfType, scalarFunctionType } from './typing';

type Open = '(' | '[' | '{';

const closing = { '(': ')', '[': ']', '{': '}' } as const;

/**
 * bracket = open row { `;` row } close
 * row = sum { `,` sum }
 * One entry: grouping. Two with an operator: a commutator in `[ ]`, an anticommutator in `{ }`. All scalar: a list, a
 * state where one is expected, or with `;` or rows in brackets a matrix.
 */
export function parseBracket(cursor: Cursor, open: Token, kind: Open): Expression {
  const isRow = cursor.at === cursor.rowAt;
  cursor.next();
  if (cursor.peek().kind === closing[kind]) {
    return cursor.fail('empty-brackets', { start: open.start, end: cursor.peek().end }, 'These brackets hold nothing.');
  }
  const rows: Expression[][] = [[]];
  for (;;) {
    cursor.rowAt = kind === '[' ? cursor.at : -1;
    rows[rows.length - 1]?.push(cursor.grammar.sum(cursor));
    if (cursor.accept(',')) continue;
    if (kind === '(' || !cursor.accept(';')) break;
    rows.push([]);
  }
  closeBracket(cursor, open, closing[kind]);
  const span = { start: open.start, end: cursor.previous().end };
  if (rows.length > 1) return matrixOf(cursor, rows, span);
  return bracketOf(cursor, kind, rows[0] ?? [], span, isRow);
}

/** Passes the closing mark, or reports what stands there instead. */
export function closeBracket(cursor: Cursor, open: Token, close: ')' | ']' | '}' | 'bar-close'): void {
  if (cursor.accept(close)) return;
  const token = cursor.peek();
  if (token.kind === 'end') {
    const mark = close === 'bar-close' ? '|' : close;
    cursor.fail('unclosed', open, 'This bracket is not closed.', `Add ${mark}.`);
  } else {
    cursor.fail('unexpected', token, 'This is not expected inside the brackets.');
  }
}

function bracketOf(cursor: Cursor, kind: Open, entries: readonly Expression[], span: Span, isRow: boolean): Expression {
  const [first, second] = entries;
  if (first === undefined) return cursor.fail('empty-brackets', span, 'These brackets hold nothing.');
  if (second === undefined) {
    if (kind === '[' && first.node === 'list' && first.bracket === '[') return matrixOf(cursor, [first.entries], span);
    return cursor.node({ node: 'group', type: first.type, span, bracket: kind, body: first });
  }
  if (entries.every(({ type }) => type === 'scalar')) {
    if (kind === '[' && entries.every(isBracketed))
      return matrixOf(
        cursor,
        entries.map((entry) => [inside(entry)]),
        span,
      );
    if (cursor.stateExpected && !isRow && kind !== '{' && entries.length === 2) {
      return cursor.node({ node: 'column', type: 'ket', span, inline: true, entries: [first, second] });
    }
    return cursor.node<ListNode>({ node: 'list', type: 'list', span, bracket: kind, entries });
  }
  if (
    kind === '[' &&
    entries.every((entry) => isBracketed(entry) || (entry.node === 'list' && entry.bracket === '['))
  ) {
    if (!entries.some(({ type }) => type === 'operator')) {
      return matrixOf(
        cursor,
        entries.map((entry) => (entry.node === 'list' ? entry.entries : [inside(entry)])),
        span,
      );
    }
  }
  return commutatorOf(cursor, kind, entries, span);
}

function isBracketed(entry: Expression): boolean {
  return entry.node === 'group' && entry.bracket === '[';
}

function inside(entry: Expression): Expression {
  return entry.node === 'group' ? entry.body : entry;
}

function commutatorOf(cursor: Cursor, kind: Open, entries: readonly Expression[], span: Span): Expression {
  const [left, right] = entries;
  const odd = entries.find(({ type }) => type !== 'operator' && type !== 'scalar');
  if (odd) {
    return cursor.fail('entry-type', odd.span, `Here ${nameOfType(odd.type)} cannot stand beside the other entries.`);
  }
  if (left === undefined || right === undefined || entries.length > 2) {
    return cursor.fail(
      'entry-type',
      span,
      'The entries of a list or matrix are scalars; a commutator has two operators.',
    );
  }
  if (kind === '(') {
    const message = 'Operators in round brackets, separated by a comma, have no meaning here.';
    return cursor.fail('entry-type', span, message, 'For a commutator write [A, B].');
  }
  const node = kind === '[' ? 'commutator' : 'anticommutator';
  return cursor.node({ node, type: 'operator', span, left, right });
}

/** The matrix, column, row or list that rows of entries make. */
function matrixOf(cursor: Cursor, rows: readonly (readonly Expression[])[], span: Span): Expression {
  const width = rows[0]?.length ?? 0;
  const shape = `${rows.length}×${width}`;
  for (const row of rows) {
    if (row.length !== width) return cursor.fail('matrix-shape', span, 'The rows of this matrix differ in length.');
    const odd = row.find(({ type }) => type !== 'scalar');
    if (odd) {
      return cursor.fail('entry-type', odd.span, `The entries of a matrix are scalars, not ${nameOfType(odd.type)}.`);
    }
  }
  const [top, bottom] = rows;
  const [a, b] = top ?? [];
  const [c, d] = bottom ?? [];
  if (rows.length === 2 && width === 2 && a && b && c && d) {
    return cursor.node({
      node: 'matrix',
      type: 'operator',
      span,
      rows: [
        [a, b],
        [c, d],
      ],
    });
  }
  if (rows.length === 2 && width === 1 && a && c) {
    return cursor.node({ node: 'column', type: 'ket', span, entries: [a, c] });
  }
  if (rows.length === 1 && width === 2 && a && b) {
    return cursor.node({ node: 'row', type: 'bra', span, entries: [a, b] });
  }
  if (rows.length === 1 && width === 1 && a) {
    return cursor.node({ node: 'group', type: 'scalar', span, bracket: '[', body: a });
  }
  if (width === 1 || rows.length === 1) {
    const bracket = width === 1 ? 'column' : '[';
    return cursor.node<ListNode>({ node: 'list', type: 'list', span, bracket, entries: rows.flat() });
  }
  return cursor.fail('matrix-shape', span, `A matrix here has two rows and two columns; this one is ${shape}.`);
}

/**
 * environment = `\begin{…}` row { `\\` row } [ `\\` ] `\end{…}`
 * row = sum { `&` sum }
 */
export function parseEnvironment(cursor: Cursor): Expression {
  const open = cursor.next();
  const rows: Expression[][] = [[]];
  for (;;) {
    rows[rows.length - 1]?.push(cursor.grammar.sum(cursor));
    if (cursor.accept('&')) continue;
    if (!cursor.accept('row') || cursor.peek().kind === 'end-environment') break;
    rows.push([]);
  }
  if (!cursor.accept('end-environment')) {
    const token = cursor.peek();
    if (token.kind === 'end')
      return cursor.fail('unclosed', open, 'This matrix is not closed.', `Add \\end{${open.text}}.`);
    return cursor.fail('unexpected', token, 'This is not expected inside a matrix.');
  }
  return matrixOf(cursor, rows, { start: open.start, end: cursor.previous().end });
}

/** bars = `|` sum `|`, the bars being paired already */
export function parseBars(cursor: Cursor): Expression {
  const open = cursor.next();
  const body = cursor.grammar.sum(cursor);
  closeBracket(cursor, open, 'bar-close');
  const span = { start: open.start, end: cursor.previous().end };
  cursor.typed(scalarFunctionType('abs', body.type), span);
  return cursor.node({ node: 'absolute', type: 'scalar', span, body });
}
