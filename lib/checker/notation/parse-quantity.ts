/** Quantities: a numeric constant, then a unit. */
import { type QuantityNode, type UnitFactor } from './answer-tree';
import { type Cursor } from './cursor';
import { outsideBrackets, passLeftSide } from './left-side';
import { type Token } from './token';
import { type Expression } from './tree';
import { unitsOf } from './units';
import { builtInWords } from './vocabulary';

/**
 * The first token of the unit: outside brackets a run of letters that is neither a constant nor a function, a degree
 * sign, or a bracket that holds only such a run. The index of the end where there is none.
 */
export function unitStart(tokens: readonly Token[]): number {
  let depth = 0;
  const equals = outsideBrackets(tokens, 0, tokens.length - 1, '=')[0];
  for (let index = equals === undefined ? 0 : equals + 1; index < tokens.length - 1; index += 1) {
    const token = tokens[index];
    if (token === undefined) break;
    if (token.kind === '(' || token.kind === '[' || token.kind === '{') {
      if (depth === 0 && isUnitLetters(tokens[index + 1])) return beforeJoin(tokens, index);
      depth += 1;
    } else if (token.kind === ')' || token.kind === ']' || token.kind === '}') {
      depth -= 1;
    } else if (depth === 0 && token.kind === 'frac' && isUnitLetters(tokens[index + 2])) {
      return beforeJoin(tokens, index);
    } else if (depth === 0 && (token.kind === 'degree' || isUnitLetters(token))) {
      return token.kind === 'degree' && tokens[index - 1]?.kind === '^' ? index - 1 : beforeJoin(tokens, index);
    }
  }
  return tokens.length - 1;
}

function isUnitLetters(token: Token | undefined): boolean {
  return (
    token?.kind === 'letters' && !builtInWords.has(token.text) && !startsFunction(token.text) && token.text !== 'E'
  );
}

function startsFunction(text: string): boolean {
  return /^(?:sqrt|exp|ln|sin|cos|tan|pi)/.test(text);
}

/** A product sign or slash before the unit belongs to the unit. */
function beforeJoin(tokens: readonly Token[], index: number): number {
  const kind = tokens[index - 1]?.kind;
  return kind === '*' || kind === '/' ? index - 1 : index;
}

/** quantity = [ left-side ] value [ [ `*` | `/` ] unit ], the value read already up to where the unit starts */
export function parseQuantity(cursor: Cursor, unitAt: number, end: number): QuantityNode {
  const { from } = passLeftSide(cursor, 0, unitAt);
  if (from === unitAt && unitAt < end) refuseNoNumber(cursor, unitAt);
  const value = cursor.within(from, unitAt, () => {
    const sum = cursor.grammar.sum(cursor);
    if (!cursor.atEnd()) cursor.fail('unexpected', cursor.peek(), 'This is not expected in the value.');
    return sum;
  });
  checkValue(cursor, value, unitAt < end);
  let unit: UnitFactor[] | null = null;
  if (unitAt < end) {
    unit = cursor.within(unitAt, end, () => {
      const factors = parseUnit(cursor);
      if (!cursor.atEnd()) cursor.fail('unit-syntax', cursor.peek(), 'This is not expected in a unit.');
      return factors;
    });
  }
  const span = { start: value.span.start, end: cursor.tokens[end - 1]?.end ?? value.span.end };
  return { node: 'quantity', span, value, unit };
}

function refuseNoNumber(cursor: Cursor, unitAt: number): void {
  const token = cursor.tokens[unitAt];
  if (token?.kind === 'letters' && unitsOf(token.text) === null) {
    const message = `A quantity is a number and a unit, and ${token.text} is neither.`;
    cursor.fail('symbol-in-quantity', token, message);
  } else if (token) {
    cursor.fail('missing-operand', token, 'A number is missing before the unit.', 'Write it as in 63.87 MHz.');
  }
}

function checkValue(cursor: Cursor, value: Expression, hasUnit: boolean): void {
  if (value.type !== 'scalar') {
    cursor.fail('wrong-kind', value.span, 'A number with a unit is asked for here.', 'Write it as in 63.87 MHz.');
  }
  if (hasUnit && value.node === 'sum' && value.terms.length > 1) {
    cursor.fail('unit-syntax', value.span, 'The unit belongs to the last term only.', 'Put the sum in brackets.');
  }
  const constant = findConstant(value);
  if (constant !== null) {
    cursor.fail(
      'symbol-in-quantity',
      constant.span,
      'A quantity is a number and a unit, without symbols.',
      'Put in the value of the constant.',
    );
  }
}

/** A constant that is no plain number: i, ħ or h. */
function findConstant(expression: Expression): Expression | null {
  switch (expression.node) {
    case 'constant':
      return expression.name === 'pi' || expression.name === 'euler' ? null : expression;
    case 'group':
    case 'absolute':
    case 'conjugate':
    case 'adjoint':
    case 'transpose':
      return findConstant(expression.body);
    case 'sum':
      return firstOf(expression.terms.map(({ body }) => body));
    case 'product':
      return firstOf(expression.factors.map(({ body }) => body));
    case 'fraction':
      return firstOf([expression.numerator, expression.denominator]);
    case 'power':
      return firstOf([expression.base, expression.exponent]);
    case 'root':
      return findConstant(expression.radicand);
    case 'call':
      return firstOf(expression.arguments);
    default:
      return null;
  }
}

function firstOf(expressions: readonly Expression[]): Expression | null {
  for (const expression of expressions) {
    const found = findConstant(expression);
    if (found) return found;
  }
  return null;
}

/**
 * unit = [ `*` | `/` ] factor { [ `*` | `/` ] factor }
 * factor = ( name | `(` unit `)` | `\frac` factor factor ) [ `^` integer | superscript ]
 * After a slash one factor is divided by, as in a product.
 */
function parseUnit(cursor: Cursor): UnitFactor[] {
  const factors: UnitFactor[] = [];
  for (;;) {
    const token = cursor.peek();
    if (cursor.atEnd() || token.kind === ')' || token.kind === ']' || token.kind === '}') break;
    const over = token.kind === '/';
    if (over || token.kind === '*') cursor.next();
    const part = parseUnitFactor(cursor);
    if (part.length === 0) break;
    for (const factor of part) factors.push(over ? { ...factor, power: -factor.power } : factor);
  }
  return factors;
}

function parseUnitFactor(cursor: Cursor): readonly UnitFactor[] {
  const token = cursor.peek();
  if (token.kind === '(' || token.kind === '[' || token.kind === '{') {
    cursor.next();
    if (!cursor.enter()) return [];
    const inner = parseUnit(cursor);
    cursor.leave();
    const close = cursor.peek().kind;
    if (close !== ')' && close !== ']' && close !== '}') cursor.fail('unclosed', token, 'This bracket is not closed.');
    cursor.next();
    const power = unitPower(cursor);
    return inner.map((factor) => ({ ...factor, power: factor.power * power }));
  }
  if (token.kind === 'frac') {
    cursor.next();
    const top = parseUnitFactor(cursor);
    const bottom = parseUnitFactor(cursor);
    return [...top, ...bottom.map((factor) => ({ ...factor, power: -factor.power }))];
  }
  if (token.kind === 'degree' || (token.kind === '^' && cursor.ahead(1).kind === 'degree')) {
    if (token.kind === '^') cursor.next();
    cursor.next();
    return [{ span: { start: token.start, end: cursor.previous().end }, prefix: '', unit: 'deg', power: 1 }];
  }
  if (token.kind !== 'letters') {
    cursor.fail('unit-syntax', token, 'This is not expected in a unit.', 'Write it as in rad/s or J*s.');
    return [];
  }
  return namedUnits(cursor, token);
}

function namedUnits(cursor: Cursor, token: Token): readonly UnitFactor[] {
  cursor.next();
  let word = token.text;
  let { end } = token;
  const following = cursor.peek();
  const isMicro = word === 'μ' && token.command;
  const isOhm = following.text === 'Ω' && following.command && !following.spaced;
  if (following.kind === 'letters' && (isMicro || (isOhm && unitsOf(`${word}Ω`)))) {
    word += following.text;
    end = following.end;
    cursor.next();
  }
  const units = unitsOf(word);
  if (units === null) {
    cursor.fail('unit-unknown', { start: token.start, end }, `The unit ${word} is not known here.`);
    return [];
  }
  const power = unitPower(cursor);
  const span = { start: token.start, end };
  return units.map(({ prefix, unit }, index) => ({
    span,
    prefix,
    unit,
    power: index === units.length - 1 ? power : 1,
  }));
}

/** The power after a unit, 1 where none is written. */
function unitPower(cursor: Cursor): number {
  const token = cursor.peek();
  let text: string;
  if (token.kind === 'superscript') {
    cursor.next();
    text = token.text;
  } else if (token.kind === '^' && cursor.ahead(1).kind !== 'degree') {
    cursor.next();
    const braced = cursor.peek().kind === '{' || cursor.peek().kind === '(';
    if (braced) cursor.next();
    const sign = cursor.peek().kind;
    if (sign === '-' || sign === '+') cursor.next();
    const digits = cursor.next();
    text = digits.kind === 'number' && !digits.scientific ? `${sign === '-' ? '-' : ''}${digits.text}` : 'x';
    if (braced && cursor.peek().kind !== '}' && cursor.peek().kind !== ')') text = 'x';
    if (braced) cursor.next();
  } else {
    return 1;
  }
  if (/^[+-]?\d{1,2}$/.test(text) && Number(text) !== 0) return Number(text);
  cursor.fail('unit-syntax', token, 'The power of a unit is a whole number.', 'Write it as in s^-1.');
  return 1;
}
