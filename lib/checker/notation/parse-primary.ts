/** What cannot be taken apart further: numbers, names, states, and whatever brackets and commands hold together. */
import { type Span } from '../diagnostics';
import { choices, type Cursor } from './cursor';
import { closeBracket, parseBars, parseBracket, parseEnvironment } from './parse-bracket';
import { parseFunction, parseWrapper } from './parse-function';
import { parseNumber, parseVulgar } from './parse-number';
import { isSign } from './parse-sign';
import { type Token } from './token';
import { type Expression } from './tree';
import { isLiteralZero, quotientType, scalarFunctionType, withoutGroups } from './typing';
import { unknownName } from './unknown-name';
import { type Meaning } from './vocabulary';

/** primary = number | name | function | state | root | fraction | conjugate | bracket | environment | bars */
export function parsePrimary(cursor: Cursor): Expression {
  const token = cursor.peek();
  const { start, end } = token;
  switch (token.kind) {
    case 'number':
      return parseNumber(cursor);
    case 'vulgar':
      return parseVulgar(cursor);
    case 'word':
      return token.meaning ? parseWord(cursor, token, token.meaning) : missing(cursor, token);
    case 'unknown':
      return unknownName(cursor, token);
    case '(':
    case '[':
    case '{':
      return parseBracket(cursor, token, token.kind);
    case 'ket':
    case 'bra': {
      cursor.next();
      if (token.state === null) return missing(cursor, token);
      const [state, written] = token.state;
      if (token.kind === 'ket') return cursor.node({ node: 'ket', type: 'ket', span: { start, end }, state, written });
      return cursor.node({ node: 'bra', type: 'bra', span: { start, end }, state, written });
    }
    case 'named-ket':
      return cursor.fail(
        'ket-label',
        token,
        `The label ${token.text} names no state here.`,
        'Known are +, -, 0, 1, up, down and +x, -x, +y, -y, +z, -z.',
      );
    case 'root':
      return parseRoot(cursor);
    case 'frac':
      return parseFraction(cursor);
    case 'overline':
      return parseOverline(cursor);
    case 'begin':
      return parseEnvironment(cursor);
    case 'bar-open':
      return parseBars(cursor);
    case '<':
      return token.text === '⟨' ? angle(cursor, token) : missing(cursor, token);
    default:
      return missing(cursor, token);
  }
}

function parseWord(cursor: Cursor, token: Token, meaning: Meaning): Expression {
  cursor.next();
  const span = { start: token.start, end: token.end };
  switch (meaning.is) {
    case 'symbol':
      return cursor.node({ node: 'symbol', type: 'scalar', span, name: meaning.name });
    case 'constant':
      return cursor.node({ node: 'constant', type: 'scalar', span, name: meaning.name });
    case 'function':
      return parseFunction(cursor, token, meaning.name);
    case 'wrapper':
      return parseWrapper(cursor, token, meaning.name);
    case 'reference':
      return cursor.grammar.reference?.(cursor, token, meaning.name) ?? missing(cursor, token);
    case 'operator':
      return cursor.node({
        node: 'operator',
        type: 'operator',
        span,
        family: meaning.family,
        index: meaning.index,
        hat: token.hat,
      });
    case 'identity':
      cursor.identitySpan ??= span;
      return cursor.node({ node: 'identity', type: 'operator', span, written: meaning.written });
    case 'dagger':
      return cursor.fail('unexpected', token, 'A dagger stands after an operator.', 'Write A^dagger.');
  }
}

/**
 * root = `√` power | `\sqrt` [ `[` integer `]` ] ( `{` sum `}` | power )
 * A power after braces applies to the root; without braces the root is of the atom with its power.
 */
function parseRoot(cursor: Cursor): Expression {
  const token = cursor.next();
  const degree = token.command && cursor.peek().kind === '[' ? parseDegree(cursor) : 2;
  const open = cursor.peek();
  const expected = cursor.stateExpected;
  cursor.stateExpected = false;
  let radicand: Expression;
  if (isSign(open)) {
    return cursor.fail('missing-operand', open, 'A sign after a root needs brackets.', 'Write it as in √(-x).');
  } else if (open.kind === '{') {
    radicand = braced(cursor, open);
  } else if (open.kind === '(' && cursor.takes(choices.shortExtent)) {
    radicand = cursor.grammar.primary(cursor);
  } else {
    radicand = cursor.grammar.power(cursor);
    if (open.kind === '(' && radicand.node === 'power') cursor.meet(choices.shortExtent, radicand.span);
  }
  cursor.stateExpected = expected;
  const span = { start: token.start, end: cursor.previous().end };
  cursor.typed(scalarFunctionType('sqrt', radicand.type), span);
  return cursor.node({ node: 'root', type: 'scalar', span, radicand: withoutGroups(radicand), degree });
}

function parseDegree(cursor: Cursor): number {
  cursor.next();
  const token = cursor.next();
  const degree = token.kind === 'number' ? Number(token.text) : 0;
  if (!Number.isInteger(degree) || degree < 2 || degree > 99) {
    cursor.fail('bad-argument', token, 'The degree of a root is a whole number from 2 to 99.');
  }
  if (!cursor.accept(']')) cursor.fail('unclosed', token, 'The bracket of this degree is not closed.', 'Add ].');
  return degree;
}

/** fraction = `\frac` argument argument, where a bare argument is one digit or one primary */
function parseFraction(cursor: Cursor): Expression {
  const token = cursor.next();
  const numerator = fractionArgument(cursor, token);
  const denominator = fractionArgument(cursor, token);
  const span = { start: token.start, end: cursor.previous().end };
  const type = cursor.typed(quotientType(numerator.type, denominator.type), denominator.span);
  if (isLiteralZero(denominator)) return cursor.fail('division-by-zero', denominator.span, 'This divides by zero.');
  return cursor.node({ node: 'fraction', type, span, numerator, denominator });
}

function fractionArgument(cursor: Cursor, token: Token): Expression {
  const open = cursor.peek();
  if (open.kind === '{') return braced(cursor, open);
  if (open.kind === 'end')
    return cursor.fail('missing-argument', token, 'This fraction needs two parts.', 'Write \\frac{a}{b}.');
  return cursor.grammar.primary(cursor);
}

/** braced = `{` sum `}` */
function braced(cursor: Cursor, open: Token): Expression {
  cursor.next();
  const body = cursor.grammar.sum(cursor);
  closeBracket(cursor, open, '}');
  return body;
}

/** conjugate = `\overline` ( `{` sum `}` | primary ) */
function parseOverline(cursor: Cursor): Expression {
  const token = cursor.next();
  const open = cursor.peek();
  const body = open.kind === '{' ? braced(cursor, open) : cursor.grammar.primary(cursor);
  const span: Span = { start: token.start, end: cursor.previous().end };
  if (body.type === 'list' || body.type === 'pairs') {
    return cursor.fail('bad-argument', span, 'A list has no complex conjugate here.');
  }
  return cursor.node({ node: 'conjugate', type: body.type, span, body });
}

/** An opening angle that makes no bra. */
function angle(cursor: Cursor, token: Token): Expression {
  for (let distance = 1; cursor.ahead(distance).kind !== 'end'; distance += 1) {
    const { kind, end } = cursor.ahead(distance);
    if (kind !== '>') continue;
    const span = { start: token.start, end };
    const message = 'A mean value in angle brackets does not say in which state it is taken.';
    return cursor.fail('expectation-brackets', span, message, 'Write it as <+|A|+>, with the state.');
  }
  return cursor.fail('ket-unclosed', token, 'This bra has no bar.', 'Write it as <+|.');
}

/** Something is needed and something else, or nothing, stands here. */
function missing(cursor: Cursor, token: Token): Expression {
  const before = cursor.previous();
  if (token.kind === 'end') {
    if (before.kind === 'end' || cursor.at === 0) return cursor.fail('empty', token, 'There is nothing to read here.');
    const hint = before.text === '*' ? 'For a complex conjugate write z^* or conj(z).' : undefined;
    return cursor.fail('missing-operand', before, `Something is missing after ${before.text}.`, hint);
  }
  if (token.kind === '_' || token.kind === 'subscript') {
    return cursor.fail('bad-index', token, 'An index can only follow a name.');
  }
  if (token.kind === '>') {
    return cursor.fail('ket-unclosed', token, 'This closes a ket that was not opened.', 'Write it as |+>.');
  }
  if (token.kind === 'bar-close') return cursor.fail('bars', token, 'These bars hold nothing.');
  if (token.kind === 'prime') return cursor.fail('prime', token, 'A prime belongs to a declared name.');
  const shown = token.kind === 'row' ? 'a new line' : token.text;
  return cursor.fail('missing-operand', token, `Something is missing before ${shown}.`);
}
