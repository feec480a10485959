/** What to say about a name that is not known. */
import { type Span } from '../diagnostics';
import { type Cursor } from './cursor';
import { nearestName } from './scope';
import { knownPrefix } from './split';
import { type Token } from './token';
import { type Expression } from './tree';
import { unitOf } from './units';

/** Reports an unknown name where an expression uses it. */
export function unknownName(cursor: Cursor, token: Token): Expression {
  const name = token.index === null ? token.text : `${token.text}_${token.index}`;
  const span: Span = { start: token.start, end: token.end };
  switch (token.reason) {
    case 'digits-after-name':
      return cursor.fail(
        'digits-after-name',
        span,
        `Digits directly after ${token.text} have no meaning here.`,
        'Write ^ for a power, or the number first.',
      );
    case 'prime':
      return cursor.fail(
        'prime',
        span,
        `The name ${token.text} with a prime is not declared here.`,
        'For an adjoint write ^†.',
      );
    case 'bad-index':
      return cursor.fail('bad-index', span, `The index of ${token.text} cannot be read.`, 'Write it as a_1 or a_{12}.');
    case 'log-base':
      return cursor.fail(
        'log-base',
        span,
        'Logarithms here are natural, without a base.',
        'For base 10 write ln(x)/ln(10).',
      );
    case 'reference-function':
      return cursor.fail(
        'reference-function',
        span,
        `The function ${token.text} is not read in an answer.`,
        'Give what it evaluates to.',
      );
    default:
      return undeclared(cursor, token, name, span);
  }
}

function undeclared(cursor: Cursor, token: Token, name: string, span: Span): Expression {
  if (name === 'j')
    return cursor.fail('undeclared-name', span, 'The letter j is not the imaginary unit here.', 'Write i.');
  const near = nearestName(cursor.scope, name);
  if (near !== undefined) {
    return cursor.fail(
      'undeclared-name',
      span,
      `The name ${name} is not known in this question.`,
      `Did you mean ${near}?`,
    );
  }
  const hint = hintFor(cursor, token);
  const known = token.index === null ? knownPrefix(token.text, cursor.scope) : 0;
  const aligned = token.end - token.start === token.text.length;
  if (known * 2 < token.text.length || !aligned || isConnective(token)) {
    return cursor.fail('undeclared-name', span, `The name ${name} is not known in this question.`, hint);
  }
  const rest = { start: token.start + known, end: token.end };
  const message = `In ${name} the part ${token.text.slice(known)} is not known in this question.`;
  return cursor.fail('undeclared-name', rest, message, hint);
}

function isConnective(token: Token): boolean {
  return token.text === 'and' || token.text === 'or';
}

function hintFor(cursor: Cursor, token: Token): string | undefined {
  if (isConnective(token)) return 'Separate two values by a comma.';
  if (token.index === null && cursor.previous().kind === 'number' && unitOf(token.text)) {
    return 'If this is a unit: none is asked for here.';
  }
  const { names } = cursor.scope;
  return names.length === 0 || names.length > 12 ? undefined : `Declared are ${names.join(', ')}.`;
}
