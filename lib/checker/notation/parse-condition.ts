/** Conditions of templates. */
import { type Condition, type Relation } from './answer-tree';
import { type Cursor } from './cursor';
import { type Token } from './token';
import { type Expression } from './tree';
import { nameOfType } from './typing';

/** Turns the words `and`, `or` and `not` into tokens of their own, before names are resolved. */
export function markConnectives(tokens: readonly Token[]): void {
  for (const token of tokens) {
    if (token.kind !== 'letters') continue;
    if (token.text === 'and' || token.text === 'or' || token.text === 'not') token.kind = token.text;
  }
}

/** condition = conjunction { `or` conjunction }, up to the end */
export function parseWholeCondition(cursor: Cursor): Condition {
  const condition = parseOr(cursor);
  if (!cursor.atEnd()) {
    const token = cursor.peek();
    cursor.fail('unexpected', token, `${token.text} is not expected here.`);
  }
  return condition;
}

function parseOr(cursor: Cursor): Condition {
  return parseJoined(cursor, 'or', (inner) => parseJoined(inner, 'and', parseNot));
}

/** conjunction = negation { `and` negation } */
function parseJoined(cursor: Cursor, node: 'and' | 'or', part: (cursor: Cursor) => Condition): Condition {
  const first = part(cursor);
  if (cursor.peek().kind !== node) return first;
  const parts = [first];
  while (cursor.accept(node)) parts.push(part(cursor));
  const end = parts[parts.length - 1]?.span.end ?? first.span.end;
  return { node, span: { start: first.span.start, end }, parts };
}

/** negation = `not` negation | `(` condition `)` | comparison */
function parseNot(cursor: Cursor): Condition {
  const token = cursor.peek();
  if (token.kind !== 'not' && !(token.kind === '(' && holdsCondition(cursor))) return parseComparison(cursor);
  cursor.next();
  cursor.enter();
  const body = token.kind === 'not' ? parseNot(cursor) : parseOr(cursor);
  cursor.leave();
  if (token.kind === 'not') return { node: 'not', span: { start: token.start, end: body.span.end }, body };
  if (!cursor.accept(')')) cursor.fail('unclosed', token, 'This bracket is not closed.', 'Add ).');
  return body;
}

/** Whether the bracket here holds a relation or a connective, and so a condition. */
function holdsCondition(cursor: Cursor): boolean {
  let depth = 0;
  for (let distance = 0; ; distance += 1) {
    const { kind } = cursor.ahead(distance);
    if (kind === 'end') return false;
    if (kind === '(' || kind === '[' || kind === '{') depth += 1;
    if (kind === ')' || kind === ']' || kind === '}') depth -= 1;
    if (depth === 0) return false;
    if (relationOf(kind) !== null || kind === 'and' || kind === 'or' || kind === 'not') return true;
  }
}

/** comparison = sum relation sum { relation sum } */
function parseComparison(cursor: Cursor): Condition {
  const operands = [parseOperand(cursor)];
  const relations: Relation[] = [];
  for (;;) {
    const token = cursor.peek();
    const relation = relationOf(token.kind);
    if (relation === null) break;
    cursor.next();
    if (relation === '=') cursor.accept('=');
    relations.push(relation);
    operands.push(parseOperand(cursor));
  }
  const start = operands[0]?.span.start ?? 0;
  const span = { start, end: operands[operands.length - 1]?.span.end ?? start };
  if (relations.length === 0) {
    cursor.fail('comparison', span, 'A condition compares two expressions.', 'Write it as in a < b or n != 0.');
  }
  return { node: 'comparison', span, operands, relations };
}

function parseOperand(cursor: Cursor): Expression {
  const operand = cursor.grammar.sum(cursor);
  if (operand.type === 'scalar') return operand;
  return cursor.fail('comparison', operand.span, `A condition compares scalars, not ${nameOfType(operand.type)}.`);
}

function relationOf(kind: Token['kind']): Relation | null {
  switch (kind) {
    case '=':
    case '!=':
    case '<':
    case '<=':
    case '>':
    case '>=':
      return kind;
    default:
      return null;
  }
}
