/** Functions, by name or as reference functions. */
import { type Cursor } from './cursor';
import { numberNode } from './parse-number';
import { superscriptExponent } from './parse-power';
import { parseRun } from './parse-run';
import { parseArguments, refuseCount } from './parse-arguments';
import { type Token } from './token';
import { type Expression, type FunctionName } from './tree';
import { scalarFunctionType, withoutGroups } from './typing';
import { inverseFunctions } from './vocabulary';

/**
 * function = name [ `^` exponent | superscript ] ( brackets | run )
 * A name directly followed by a bracket takes what it holds and no more.
 */
export function parseFunction(cursor: Cursor, token: Token, name: FunctionName): Expression {
  const exponent = parseNameExponent(cursor, name);
  const isInverse = exponent !== null && isMinusOne(exponent);
  const called = isInverse ? inverseFunctions.get(name) : name;
  if (called === undefined) {
    const span = { start: token.start, end: cursor.previous().end };
    const message = `The inverse of ${name} has no name here.`;
    return cursor.fail('no-inverse-function', span, message, `For 1/${name} write 1/${name}(x).`);
  }
  const values = called === 'atan2' ? parsePair(cursor, token) : [parseArgument(cursor, false)];
  const span = { start: token.start, end: cursor.previous().end };
  const type = callType(cursor, called, values, span);
  const written = isInverse ? 'inverse' : 'name';
  const call = cursor.node({ node: 'call', type, span, name: called, written, arguments: values });
  if (exponent === null || isInverse) return call;
  if (exponent.type !== 'scalar') return cursor.fail('power-type', exponent.span, 'An exponent must be a scalar.');
  return cursor.node({ node: 'power', type, span, base: call, exponent, placed: 'name' });
}

function callType(
  cursor: Cursor,
  name: FunctionName,
  values: readonly Expression[],
  span: { readonly start: number; readonly end: number },
): 'scalar' | 'operator' {
  for (const value of values) {
    if (name === 'exp' && value.type === 'operator') return 'operator';
    cursor.typed(scalarFunctionType(name, value.type), span);
  }
  return 'scalar';
}

/** `sqrt`, `abs` and `conj` with the same extents as other functions. */
export function parseWrapper(cursor: Cursor, token: Token, name: 'sqrt' | 'abs' | 'conj'): Expression {
  const body = parseArgument(cursor, name === 'sqrt');
  const span = { start: token.start, end: cursor.previous().end };
  if (name === 'conj') {
    if (body.type === 'list' || body.type === 'pairs') {
      return cursor.fail('bad-argument', body.span, 'A list has no complex conjugate here.');
    }
    return cursor.node({ node: 'conjugate', type: body.type, span, body });
  }
  cursor.typed(scalarFunctionType(name, body.type), span);
  if (name === 'abs') return cursor.node({ node: 'absolute', type: 'scalar', span, body });
  return cursor.node({ node: 'root', type: 'scalar', span, radicand: withoutGroups(body), degree: 2 });
}

/** argument = `(` sum `)` | `{` sum `}` | `[` … `]` | run */
function parseArgument(cursor: Cursor, ofRoot: boolean): Expression {
  const open = cursor.peek();
  if (open.kind !== '(' && open.kind !== '{' && open.kind !== '[') return parseRun(cursor, ofRoot);
  const expected = cursor.stateExpected;
  cursor.stateExpected = false;
  const body = cursor.grammar.primary(cursor);
  cursor.stateExpected = expected;
  if (body.node !== 'list') return body.node === 'group' ? body.body : body;
  return cursor.fail('argument-count', body.span, 'One argument is expected here.');
}

/** The exponent between a function's name and its argument. */
function parseNameExponent(cursor: Cursor, name: string): Expression | null {
  const token = cursor.peek();
  if (token.kind === 'superscript') {
    cursor.next();
    return superscriptExponent(cursor, token);
  }
  if (token.kind !== '^') return null;
  cursor.next();
  const open = cursor.peek();
  if (open.kind === '{' || open.kind === '(') {
    cursor.next();
    const exponent = cursor.grammar.sum(cursor);
    if (!cursor.accept(open.kind === '{' ? '}' : ')')) cursor.fail('unclosed', open, 'This bracket is not closed.');
    return exponent;
  }
  const negative = open.kind === '-';
  if (negative) cursor.next();
  const atom = cursor.next();
  const body = nameExponentAtom(cursor, atom);
  if (body === null) {
    return cursor.fail('missing-operand', atom, `An exponent is missing after ${name}^.`, 'Write it as in sin^2 x.');
  }
  if (!negative) return body;
  const span = { start: open.start, end: atom.end };
  return cursor.node({ node: 'sum', type: 'scalar', span, terms: [{ sign: '-', body }] });
}

function nameExponentAtom(cursor: Cursor, atom: Token): Expression | null {
  const span = { start: atom.start, end: atom.end };
  if (atom.kind === 'number')
    return cursor.node(numberNode(atom.start, atom.end, atom.text, atom.exponent, atom.scientific));
  if (atom.meaning?.is === 'symbol')
    return cursor.node({ node: 'symbol', type: 'scalar', span, name: atom.meaning.name });
  return null;
}

function isMinusOne(exponent: Expression): boolean {
  if (exponent.node !== 'sum' || exponent.terms.length !== 1) return false;
  const term = exponent.terms[0];
  return term?.sign === '-' && term.body.node === 'number' && term.body.numerator === term.body.denominator;
}

/** pair = `(` sum `,` sum `)` */
function parsePair(cursor: Cursor, token: Token): readonly Expression[] {
  const values = parseArguments(cursor, token);
  if (values.length !== 2) refuseCount(cursor, token, 2);
  return values;
}
