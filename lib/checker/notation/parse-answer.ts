/** Whole answers, one rule a kind, and what each kind must be. */
import { type AnswerKind, type AnswerTree } from './answer-tree';
import { type Cursor } from './cursor';
import { passLeftSide } from './left-side';
import { parsePairs, parseValues } from './parse-values';
import { type Expression, type ListNode } from './tree';
import { listLength, nameOfType } from './typing';

/** Reads the tokens up to `end` as an answer of a kind other than quantity and choice; null with a problem noted. */
export function parseAnswer(cursor: Cursor, kind: AnswerKind, end: number): AnswerTree | null {
  if (kind === 'eigenvalues') return parseValues(cursor, end);
  if (kind === 'eigenpairs') return parsePairs(cursor, end);
  cursor.stateExpected = kind === 'state';
  const { from } = passLeftSide(cursor, 0, end);
  if (cursor.problem === null) cursor.at = from;
  let expression = cursor.grammar.sum(cursor);
  if ((kind === 'vector' || kind === 'pauli') && cursor.peek().kind === ',')
    expression = parseBareList(cursor, expression);
  if (!cursor.atEnd()) reportRest(cursor, kind);
  if (cursor.problem === null) checkKind(cursor, kind, expression);
  return cursor.problem === null ? expression : null;
}

/** bare-list = sum `,` sum { `,` sum } */
function parseBareList(cursor: Cursor, first: Expression): Expression {
  const entries = [first];
  while (cursor.accept(',')) entries.push(cursor.grammar.sum(cursor));
  const odd = entries.find(({ type }) => type !== 'scalar');
  if (odd) return cursor.fail('entry-type', odd.span, `A component is a scalar, not ${nameOfType(odd.type)}.`);
  const span = { start: first.span.start, end: entries[entries.length - 1]?.span.end ?? first.span.end };
  return cursor.node<ListNode>({ node: 'list', type: 'list', span, bracket: 'none', entries });
}

/** What stands after a complete expression. */
function reportRest(cursor: Cursor, kind: AnswerKind): void {
  const token = cursor.peek();
  if (cursor.problem) return;
  switch (token.kind) {
    case ')':
    case ']':
    case '}':
    case 'end-environment':
      cursor.fail('unopened', token, `This ${token.text} closes nothing.`);
      break;
    case '>':
      cursor.fail('ket-unclosed', token, 'This closes a ket that was not opened.', 'Write it as |+>.');
      break;
    case ',':
    case ';': {
      const hint = kind === 'state' ? 'Write the two components as (a, b).' : undefined;
      cursor.fail('wrong-kind', token, 'One expression is asked for here, not a list.', hint);
      break;
    }
    case '_':
    case 'subscript':
      cursor.fail('bad-index', token, 'An index can only follow a name.');
      break;
    default:
      cursor.fail('unexpected', token, `${token.text} is not expected here.`);
  }
}

const asked: Readonly<Record<string, string>> = {
  scalar: 'An expression without operators and states is asked for here',
  operator: 'An operator is asked for here',
  pauli: 'Four Pauli coefficients or an operator are asked for here',
  state: 'A state is asked for here',
  vector: 'Three components are asked for here',
};

function checkKind(cursor: Cursor, kind: AnswerKind, expression: Expression): void {
  const { type, span } = expression;
  if (fits(kind, type)) {
    const count = kind === 'vector' ? 3 : 4;
    if (type === 'list' && listLength(expression) !== count) {
      const message = `${count === 3 ? 'Three components' : 'Four coefficients'} are asked for here; this has ${listLength(expression)}.`;
      cursor.fail('value-count', span, message);
    }
    return;
  }
  if (kind === 'scalar' && type === 'operator' && cursor.identitySpan) {
    const message = 'I is the identity operator, which cannot stand in a scalar.';
    cursor.fail('identity-in-scalar', cursor.identitySpan, message, 'For the imaginary unit write i.');
    return;
  }
  if (kind === 'state' && type === 'bra') {
    cursor.fail('wrong-kind', span, 'A state is asked for here, and this is a bra.', 'Write a ket, as in |+>.');
    return;
  }
  const hint = kind === 'operator' && type === 'list' ? 'Write a matrix as [[a, b], [c, d]].' : undefined;
  cursor.fail(
    'wrong-kind',
    span,
    `${asked[kind] ?? 'Something else is asked for here'}, not ${nameOfType(type)}.`,
    hint,
  );
}

function fits(kind: AnswerKind, type: Expression['type']): boolean {
  switch (kind) {
    case 'scalar':
      return type === 'scalar';
    case 'operator':
      return type === 'operator' || type === 'scalar';
    case 'pauli':
      return type === 'operator' || type === 'scalar' || type === 'list';
    case 'state':
      return type === 'ket';
    case 'vector':
      return type === 'list';
    default:
      return true;
  }
}
