/** Powers and the other marks that stand after what they act on. */
import { choices, type Cursor } from './cursor';
import { maximumMarks } from './limits';
import { numberNode } from './parse-number';
import { exponentGoesOn, operatorFollows, parseLongExponent } from './parse-run';
import { isSign, parseSigned } from './parse-sign';
import { startsOperand } from './starts';
import { type Token } from './token';
import { type Expression, type ValueType } from './tree';
import { listLength, powerType, turnedType } from './typing';

/**
 * power = primary { `^` exponent | superscript | `†` | `ᵀ` }
 * A power binds tightest and to the right.
 */
export function parsePower(cursor: Cursor): Expression {
  const recalled = cursor.recall();
  if (recalled) return recalled;
  if (!cursor.enter()) return cursor.fail('too-deep', cursor.peek(), '');
  let base = cursor.grammar.primary(cursor);
  cursor.leave();
  let marks = 0;
  for (;;) {
    const token = cursor.peek();
    const { kind } = token;
    if (kind !== '^' && kind !== 'superscript' && kind !== 'dagger' && kind !== 'transpose' && kind !== 'prime') break;
    marks += 1;
    if (marks > maximumMarks) return cursor.fail('too-deep', token, 'Too many marks stand after one another here.');
    cursor.enter();
    base = parseMark(cursor, base, token);
    cursor.leave();
  }
  return base;
}

function parseMark(cursor: Cursor, base: Expression, mark: Token): Expression {
  cursor.next();
  switch (mark.kind) {
    case 'dagger':
      return adjoint(cursor, base, mark);
    case 'transpose':
      return transpose(cursor, base, mark);
    case 'prime':
      return cursor.fail('prime', mark, 'A prime belongs to a declared name.', 'For an adjoint write ^†.');
    case 'superscript':
      return parseSuperscript(cursor, base, mark);
    default:
      return parseCaret(cursor, base);
  }
}

/** superscript = [ sign ] digits, or one letter, in raised characters */
function parseSuperscript(cursor: Cursor, base: Expression, mark: Token): Expression {
  if (mark.text === 'T') return transpose(cursor, base, mark);
  const exponent = superscriptExponent(cursor, mark);
  return exponent ? raise(cursor, base, exponent) : base;
}

/** The exponent that raised characters spell. */
export function superscriptExponent(cursor: Cursor, mark: Token): Expression | null {
  const { text, start, end } = mark;
  const span = { start, end };
  if (/^[+-]?\d+$/.test(text)) {
    const negative = text.startsWith('-');
    const digits = negative || text.startsWith('+') ? text.slice(1) : text;
    const body = cursor.node(numberNode(negative ? start + 1 : start, end, digits, 0, false));
    if (!negative) return body;
    return cursor.node({ node: 'sum', type: 'scalar', span, terms: [{ sign: '-', body }] });
  }
  if (text === 'i') return cursor.node({ node: 'constant', type: 'scalar', span, name: 'i' });
  const declared = cursor.scope.plain.get(text);
  if (declared?.is === 'symbol') return cursor.node({ node: 'symbol', type: 'scalar', span, name: declared.name });
  cursor.fail('undeclared-name', mark, 'These raised characters are no exponent.', 'Write the exponent after ^.');
  return null;
}

/** caret = `*` | `†` | `T` | `{` mark-or-sum `}` | `(` sum `)` | sign exponent | power */
function parseCaret(cursor: Cursor, base: Expression): Expression {
  const token = cursor.peek();
  const braced = token.kind === '{';
  const inner = braced ? cursor.ahead(1) : token;
  if (!braced || cursor.ahead(2).kind === '}') {
    const turned = parseTurn(cursor, base, inner, braced);
    if (turned) return turned;
  }
  if (braced) {
    cursor.next();
    const exponent = cursor.grammar.sum(cursor);
    closeBrace(cursor, token);
    return raise(cursor, base, exponent);
  }
  const exponent = parseExponent(cursor);
  const ofEuler = isEuler(base);
  if (token.kind !== '(' && exponentGoesOn(cursor, exponent, ofEuler)) {
    const withOperators = ofEuler && cursor.takes(choices.operatorExponent);
    if (withOperators || cursor.takes(choices.exponent)) {
      return raise(cursor, base, parseLongExponent(cursor, exponent, withOperators));
    }
    const span = { start: base.span.start, end: cursor.peek().end };
    cursor.meet(choices.exponent, span);
    if (ofEuler && operatorFollows(cursor)) cursor.meet(choices.operatorExponent, span);
  }
  return raise(cursor, base, exponent);
}

/** `^*`, `^†`, `^T`, each also in braces; null where an exponent stands. */
function parseTurn(cursor: Cursor, base: Expression, mark: Token, braced: boolean): Expression | null {
  const isTranspose = mark.kind === 'transpose' || (mark.text === 'T' && mark.index === null && base.type !== 'scalar');
  const isAdjoint = mark.kind === 'dagger' || mark.meaning?.is === 'dagger';
  if (mark.kind !== '*' && !isTranspose && !isAdjoint) return null;
  cursor.at += braced ? 3 : 1;
  if (mark.kind === '*') return conjugate(cursor, base, mark);
  return isAdjoint ? adjoint(cursor, base, mark) : transpose(cursor, base, mark);
}

/**
 * exponent = sign exponent | atom [ `^` exponent ]
 * An exponent without braces takes one atom, with its own power; a minus binds looser than that power.
 */
function parseExponent(cursor: Cursor): Expression {
  const token = cursor.peek();
  if (isSign(token)) return parseSigned(cursor, parseExponent);
  if (!startsOperand(token)) {
    return cursor.fail(
      'missing-operand',
      cursor.atEnd() ? cursor.previous() : token,
      'An exponent is missing after ^.',
    );
  }
  const exponent = cursor.grammar.power(cursor);
  return exponent.node === 'group' && token.kind === '(' ? exponent.body : exponent;
}

function closeBrace(cursor: Cursor, open: Token): void {
  if (!cursor.accept('}')) cursor.fail('unclosed', open, 'This brace is not closed.', 'Add }.');
}

function isEuler(base: Expression): boolean {
  return base.node === 'constant' && base.name === 'euler';
}

function raise(cursor: Cursor, base: Expression, exponent: Expression): Expression {
  const span = { start: base.span.start, end: cursor.previous().end };
  if (isEuler(base) && (exponent.type === 'scalar' || exponent.type === 'operator')) {
    return cursor.node({
      node: 'call',
      type: exponent.type,
      span,
      name: 'exp',
      written: 'power',
      arguments: [exponent],
    });
  }
  const type = cursor.typed(powerType(base, exponent), span);
  return cursor.node({ node: 'power', type, span, base, exponent, placed: 'after' });
}

function conjugate(cursor: Cursor, body: Expression, mark: Token): Expression {
  const span = { start: body.span.start, end: mark.end };
  const { type } = body;
  if (type === 'list' || type === 'pairs')
    return cursor.fail('power-type', span, 'A list has no complex conjugate here.');
  return cursor.node({ node: 'conjugate', type, span, body });
}

function adjoint(cursor: Cursor, body: Expression, mark: Token): Expression {
  const span = { start: body.span.start, end: mark.end };
  return cursor.node({ node: 'adjoint', type: cursor.typed(turnedType(body.type), span), span, body });
}

/** The transpose; of a list of two scalars the state that they are the components of. */
function transpose(cursor: Cursor, body: Expression, mark: Token): Expression {
  const span = { start: body.span.start, end: mark.end };
  if (body.node === 'column' && body.inline) return { ...body, span };
  if (body.node === 'list' && listLength(body) === 2 && body.entries[0] && body.entries[1]) {
    return cursor.node({
      node: 'column',
      type: 'ket',
      span,
      inline: true,
      entries: [body.entries[0], body.entries[1]],
    });
  }
  if (body.type === 'scalar')
    return cursor.fail('power-type', mark, 'A scalar has no transpose here.', 'For a power declare T.');
  const type: ValueType = cursor.typed(turnedType(body.type), span);
  return cursor.node({ node: 'transpose', type, span, body });
}
