/** Answers that are two values or two pairs. */
import { type Span } from '../diagnostics';
import { type AnswerTree, type LabelledValue, type PairEntry, type ValuesNode } from './answer-tree';
import { type Cursor } from './cursor';
import { isWrapped, outsideBrackets, passLeftSide } from './left-side';
import { type Token } from './token';
import { type Expression } from './tree';
import { listLength, nameOfType, withoutGroups } from './typing';

/**
 * values = [ left-side ] ( bracket entries close | entries )
 * entries = entry { ( `,` | `;` ) entry }
 * entry = [ label `=` ] sum
 */
export function parseValues(cursor: Cursor, end: number): AnswerTree | null {
  cursor.plusMinus = true;
  const { tokens } = cursor;
  let from = 0;
  const equals = outsideBrackets(tokens, 0, end, '=');
  const [only] = equals;
  if (only !== undefined && equals.length === 1 && (isWrapped(tokens, only + 1, end) || isWrapped(tokens, 0, only))) {
    from = passLeftSide(cursor, 0, end).from;
  }
  const open = tokens[from];
  const wrapped = open && isWrapped(tokens, from, end) ? open.kind : null;
  if (open && wrapped !== null && (wrapped === '{' || isSeparated(tokens, from + 1, end - 1))) {
    const bracket = wrapped === '{' ? '{' : wrapped === '[' ? '[' : '(';
    const entries = parseEntries(cursor, from + 1, end - 1);
    return valuesOf(cursor, {
      node: 'values',
      span: { start: open.start, end: tokens[end - 1]?.end ?? 0 },
      bracket,
      entries,
    });
  }
  const separated = isSeparated(tokens, from, end);
  const entries = parseEntries(cursor, from, end);
  const [first] = entries;
  if (first && !separated && first.value.type === 'list') return listed(cursor, first.value);
  const span = { start: first?.span.start ?? 0, end: entries[entries.length - 1]?.span.end ?? 0 };
  return valuesOf(cursor, { node: 'values', span, bracket: 'none', entries });
}

/** A list is the set of its entries; a multiplied list, or one that a reference function gives, stays an expression. */
function listed(cursor: Cursor, expression: Expression): AnswerTree | null {
  const list = withoutGroups(expression);
  if (list.node === 'list' && list.bracket !== 'column') {
    const entries = list.entries.map((value) => ({ span: value.span, label: null, value }));
    return valuesOf(cursor, { node: 'values', span: expression.span, bracket: list.bracket, entries });
  }
  refuseCount(cursor, listLength(expression) * (hasPlusMinus(expression) ? 2 : 1), expression.span);
  return cursor.problem ? null : expression;
}

function refuseCount(cursor: Cursor, count: number, span: Span): void {
  if (count <= 2) return;
  cursor.fail('value-count', span, `A two-level operator has two eigenvalues; here stand ${count} values.`);
}

function isSeparated(tokens: readonly Token[], from: number, to: number): boolean {
  return outsideBrackets(tokens, from, to, ',').length > 0 || outsideBrackets(tokens, from, to, ';').length > 0;
}

function parseEntries(cursor: Cursor, from: number, to: number): LabelledValue[] {
  const commas = outsideBrackets(cursor.tokens, from, to, ',');
  const ends = [...commas, ...outsideBrackets(cursor.tokens, from, to, ';'), to].sort((one, other) => one - other);
  const entries: LabelledValue[] = [];
  let start = from;
  for (const end of ends) {
    if (cursor.problem) break;
    entries.push(parseEntry(cursor, start, end, false));
    start = end + 1;
  }
  return entries;
}

/** entry = [ label `=` ] sum, up to a token */
function parseEntry(cursor: Cursor, from: number, to: number, isState: boolean): LabelledValue {
  const { from: start, label } = passLeftSide(cursor, from, to);
  const outer = cursor.stateExpected;
  cursor.stateExpected = isState;
  const value = cursor.within(start, to, () => {
    const sum = cursor.grammar.sum(cursor);
    if (!cursor.atEnd()) cursor.fail('unexpected', cursor.peek(), `${cursor.peek().text} is not expected here.`);
    return sum;
  });
  cursor.stateExpected = outer;
  return { span: { start: cursor.tokens[from]?.start ?? value.span.start, end: value.span.end }, label, value };
}

function valuesOf(cursor: Cursor, values: ValuesNode): ValuesNode | null {
  let count = 0;
  for (const { value } of values.entries) {
    if (value.type !== 'scalar') {
      const message = `Two values are asked for; here stands ${nameOfType(value.type)}.`;
      cursor.fail('wrong-kind', value.span, message, 'Write them as {a, b}.');
    }
    count += hasPlusMinus(value) ? 2 : 1;
  }
  refuseCount(cursor, count, values.span);
  return cursor.problem ? null : values;
}

/**
 * pairs = pair { `;` pair }, optionally in brackets
 * pair = [ label `=` ] sum `:` [ label `=` ] sum
 */
export function parsePairs(cursor: Cursor, end: number): AnswerTree | null {
  cursor.plusMinus = true;
  const { tokens } = cursor;
  const wrapped = isWrapped(tokens, 0, end) && outsideBrackets(tokens, 1, end - 1, ':').length > 0;
  const from = wrapped ? 1 : 0;
  const to = wrapped ? end - 1 : end;
  if (outsideBrackets(tokens, from, to, ':').length === 0) {
    const value = cursor.within(from, to, () => cursor.grammar.sum(cursor));
    if (cursor.problem === null && value.type === 'pairs') return value;
    const hint = 'Write value: state; value: state.';
    cursor.fail('wrong-kind', value.span, 'Two pairs of an eigenvalue and its state are asked for.', hint);
    return null;
  }
  const pairs: PairEntry[] = [];
  let start = from;
  for (const stop of [...outsideBrackets(tokens, from, to, ';'), to]) {
    if (cursor.problem || (stop === to && start >= to && pairs.length > 0)) break;
    pairs.push(parsePair(cursor, start, stop));
    start = stop + 1;
  }
  const count = pairs.reduce(
    (sum, { value, state }) => sum + (hasPlusMinus(value.value) || hasPlusMinus(state) ? 2 : 1),
    0,
  );
  const span = { start: tokens[0]?.start ?? 0, end: tokens[end - 1]?.end ?? 0 };
  if (count !== 2)
    cursor.fail(
      'value-count',
      span,
      `Two pairs are asked for; here ${count === 1 ? 'stands one' : `stand ${count}`}.`,
      'Write value: state; value: state.',
    );
  return cursor.problem ? null : { node: 'pairs', span, pairs };
}

function parsePair(cursor: Cursor, from: number, to: number): PairEntry {
  const colons = outsideBrackets(cursor.tokens, from, to, ':');
  const colon = colons[0] ?? to;
  const start = cursor.tokens[from];
  if (colons.length !== 1 && start) {
    cursor.fail('unexpected', start, 'A pair is a value, a colon and a state.', 'Write value: state; value: state.');
  }
  const value = parseEntry(cursor, from, colon, false);
  if (value.value.type !== 'scalar') {
    cursor.fail(
      'wrong-kind',
      value.value.span,
      `Before the colon an eigenvalue is asked for, not ${nameOfType(value.value.type)}.`,
    );
  }
  const state = parseEntry(cursor, colon + 1, to, true).value;
  if (state.type !== 'ket') {
    cursor.fail('wrong-kind', state.span, `After the colon a state is asked for, not ${nameOfType(state.type)}.`);
  }
  return { span: { start: value.span.start, end: state.span.end }, value, state };
}

/** Whether a value holds a ± or ∓ and so stands for two. */
export function hasPlusMinus(expression: Expression): boolean {
  switch (expression.node) {
    case 'sum':
      return expression.terms.some(({ sign, body }) => sign === '±' || sign === '∓' || hasPlusMinus(body));
    case 'product':
      return expression.factors.some(({ body }) => hasPlusMinus(body));
    case 'fraction':
      return hasPlusMinus(expression.numerator) || hasPlusMinus(expression.denominator);
    case 'power':
      return hasPlusMinus(expression.base) || hasPlusMinus(expression.exponent);
    case 'root':
      return hasPlusMinus(expression.radicand);
    case 'call':
    case 'reference':
      return expression.arguments.some(hasPlusMinus);
    case 'group':
    case 'absolute':
    case 'conjugate':
    case 'adjoint':
    case 'transpose':
      return hasPlusMinus(expression.body);
    case 'matrix':
      return expression.rows.some((row) => row.some(hasPlusMinus));
    case 'column':
    case 'row':
    case 'list':
      return expression.entries.some(hasPlusMinus);
    case 'commutator':
    case 'anticommutator':
      return hasPlusMinus(expression.left) || hasPlusMinus(expression.right);
    default:
      return false;
  }
}
