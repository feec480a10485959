/** Text to tokens, in one pass from left to right. */
import { type Diagnostic } from '../diagnostics';
import {
  commandTokens,
  faceCommands,
  greekByName,
  identityFaces,
  letterCommands,
  matrixEnvironments,
  punctuation,
  subscriptOf,
  superscriptOf,
  vulgarFractions,
} from './characters';
import { maximumExponent } from './limits';
import {
  closingAngle,
  commandAt,
  followingBar,
  isAsciiLetter,
  isBlank,
  isDecoration,
  isDigit,
  letterAt,
  readLabel,
  skipBlank,
} from './source';
import { makeToken, type Token, type TokenKind } from './token';
import { builtInWords, stateLabels } from './vocabulary';

/** What tokens depend on besides the text. */
export interface TokeniseOptions {
  /** Whether angles make kets and bras; in conditions they compare, and kets are written `ket(+)`. */
  readonly kets: boolean;
  /** Whether `-+` is ∓. */
  readonly plusMinus: boolean;
  /** Whether `2e3` and `2E3` are numbers. */
  readonly lowerExponent: boolean;
  readonly upperExponent: boolean;
}

/** Tokens, ending with one of kind `end`; the first problem with a character, if any. */
export interface Tokens {
  readonly tokens: Token[];
  readonly problem: Diagnostic | null;
  /** Whether a number was written with a lower-case e. */
  readonly lowerExponentUsed: boolean;
}

/** Splits a text into tokens. Spans count code points. Linear in the length. */
export function tokenise(source: string, options: TokeniseOptions): Tokens {
  const tokeniser = new Tokeniser(source, options);
  return tokeniser.run();
}

type Brace = 'kept' | 'dropped';

class Tokeniser {
  private readonly tokens: Token[] = [];
  private problem: Diagnostic | null = null;
  private lowerExponentUsed = false;
  private position = 0;
  /** UTF-16 units so far beyond one a code point. */
  private surplus = 0;
  private spaced = false;
  private hat = false;
  private uprightOnce = false;
  private readonly braces: Brace[] = [];
  /** Depth in `braces` from which text is upright, or −1. */
  private uprightFrom = -1;
  /** Arguments that a fraction still takes at this level: a bare one is a single digit. */
  private pending = 0;
  private readonly pendingOutside: number[] = [];

  constructor(
    private readonly source: string,
    private readonly options: TokeniseOptions,
  ) {}

  run(): Tokens {
    const { source } = this;
    while (this.position < source.length && this.problem === null) this.step(source.charCodeAt(this.position));
    const end = source.length - this.surplus;
    this.tokens.push(makeToken('end', '', end, end, this.spaced));
    return { tokens: this.tokens, problem: this.problem, lowerExponentUsed: this.lowerExponentUsed };
  }

  private step(code: number): void {
    if (code === 32 || isBlank(code)) {
      this.spaced = true;
      this.position += 1;
    } else if (isAsciiLetter(code)) {
      this.letters();
    } else if (isDigit(code)) {
      this.number();
    } else if (code === 92) {
      this.command();
    } else if (code === 46) {
      this.point();
    } else {
      this.mark(code);
    }
  }

  /** Adds a token that ends `length` UTF-16 units from here and moves past it. */
  private add(kind: TokenKind, text: string, length: number): Token {
    const start = this.position - this.surplus;
    let end = start + length;
    if (length > 1 || this.source.charCodeAt(this.position) >= 0xd800) {
      for (let index = this.position; index < this.position + length; index += 1) {
        const unit = this.source.charCodeAt(index);
        if (unit >= 0xdc00 && unit <= 0xdfff) {
          this.surplus += 1;
          end -= 1;
        }
      }
    }
    const token = makeToken(kind, text, start, end, this.spaced);
    token.upright = this.uprightFrom >= 0 || this.uprightOnce;
    this.tokens.push(token);
    this.position += length;
    this.spaced = false;
    this.uprightOnce = false;
    if (this.pending > 0) this.pending -= 1;
    return token;
  }

  private fail(code: Diagnostic['code'], length: number, message: string, hint?: string): void {
    const start = this.position - this.surplus;
    this.problem ??= { code, span: { start, end: start + length }, message, hint };
  }

  private previous(): TokenKind {
    return this.tokens.at(-1)?.kind ?? 'end';
  }

  private letters(): void {
    const { source } = this;
    let end = this.position;
    let text = '';
    for (;;) {
      const letter = letterAt(source, end);
      if (letter === '') break;
      text += letter;
      end += source.charCodeAt(end) === 0xd835 ? 2 : 1;
      if (this.uprightOnce) break;
    }
    if ((text === 'ket' || text === 'bra') && this.namedState(text, end)) return;
    this.add('letters', text, end - this.position).hat = this.hat;
    this.hat = false;
  }

  /** `ket(+)` and `bra(+)`. */
  private namedState(kind: 'ket' | 'bra', from: number): boolean {
    const open = skipBlank(this.source, from);
    if (this.source.charAt(open) !== '(') return false;
    const label = readLabel(this.source, open + 1);
    const state = stateLabels.get(label.text);
    const close = skipBlank(this.source, label.end);
    if (state === undefined || this.source.charAt(close) !== ')') return false;
    this.add(kind, label.text, close + 1 - this.position).state = state;
    return true;
  }

  private number(): void {
    const { source } = this;
    let end = this.position;
    if (this.pending > 0) {
      this.add('number', source.charAt(end), 1);
      return;
    }
    while (isDigit(source.charCodeAt(end))) end += 1;
    if (source.charAt(end) === '.' && !this.isFinalStop(end)) {
      end += 1;
      while (isDigit(source.charCodeAt(end))) end += 1;
      if (source.charAt(end) === '.' && !this.isFinalStop(end)) {
        this.fail('bad-number', end + 1 - this.position, 'This number has two decimal points.');
        return;
      }
    }
    const mantissa = source.slice(this.position, end);
    const exponentEnd = this.exponentEnd(end);
    if (exponentEnd < 0) {
      this.add('number', mantissa, end - this.position);
      return;
    }
    const exponent = Number(source.slice(end + 1, exponentEnd).replace(/[−–]/u, '-'));
    if (Math.abs(exponent) > maximumExponent) {
      this.fail('number-too-large', exponentEnd - this.position, 'This power of ten is too large to be read.');
      return;
    }
    const token = this.add('number', mantissa, exponentEnd - this.position);
    token.exponent = exponent;
    token.scientific = true;
  }

  /** Where the exponent of a number whose mantissa ends here ends (`e-3`), or −1. */
  private exponentEnd(mantissaEnd: number): number {
    const { source, options } = this;
    const mark = source.charAt(mantissaEnd);
    if (!(mark === 'e' && options.lowerExponent) && !(mark === 'E' && options.upperExponent)) return -1;
    let end = mantissaEnd + 1;
    if ('+-−–'.includes(source.charAt(end))) end += 1;
    if (!isDigit(source.charCodeAt(end))) return -1;
    while (isDigit(source.charCodeAt(end))) end += 1;
    if (mark === 'e') this.lowerExponentUsed = true;
    return end;
  }

  private isFinalStop(position: number): boolean {
    return skipBlank(this.source, position + 1) >= this.source.length;
  }

  private point(): void {
    if (isDigit(this.source.charCodeAt(this.position + 1)) && this.pending === 0) {
      this.number();
    } else if (this.isFinalStop(this.position)) {
      this.position = this.source.length;
    } else {
      this.fail('unexpected', 1, 'A full stop is not expected here.', 'For a product write *.');
    }
  }

  private command(): void {
    const { source } = this;
    const name = commandAt(source, this.position);
    const length = 1 + name.length;
    if (isDecoration(name)) {
      this.decoration(name, length);
      return;
    }
    const letter = greekByName.get(name) ?? letterCommands.get(name);
    if (letter !== undefined) {
      const token = this.add('letters', letter, length);
      token.command = true;
      token.hat = this.hat;
      this.hat = false;
      return;
    }
    if (name === 'langle') this.openAngle(length);
    else if (name === 'vert' || name === 'mid' || name === 'lvert') this.bar(length, name === 'lvert');
    else if (name === '{' || name === '}') this.add(name, `\\${name}`, length);
    else if (name === '|')
      this.fail('bars', 2, 'Double bars are not read here.', 'For an absolute value write abs( ).');
    else if (name === '\\') this.add('row', '\\\\', 2);
    else this.wordCommand(name, length);
  }

  private wordCommand(name: string, length: number): void {
    const kind = commandTokens.get(name);
    if (kind !== undefined) {
      const token = this.add(kind as TokenKind, `\\${name}`, length);
      token.command = true;
      if (kind === 'frac') this.pending = 2;
    } else if (name === 'hat' || name === 'widehat') {
      this.hat = true;
      this.position += length;
      this.dropBrace();
    } else if (identityFaces.has(name) && this.identity(length)) {
      return;
    } else if (faceCommands.has(name)) {
      this.face(length);
    } else if (name === 'begin' || name === 'end') {
      this.environment(name, length);
    } else if (name === 'ket' || name === 'bra' || name === 'braket' || name === 'ketbra') {
      this.stateCommand(name, length);
    } else if (builtInWords.get(name)?.is === 'function') {
      const token = this.add('letters', name, length);
      token.command = true;
      token.upright = true;
    } else {
      this.fail('unknown-command', length, `The command \\${name} is not known here.`);
    }
  }

  private decoration(name: string, length: number): void {
    this.position += length;
    this.spaced = true;
    if (name !== 'left' && name !== 'right') return;
    const next = skipBlank(this.source, this.position);
    if (this.source.charAt(next) === '.' && next === this.position) this.position += 1;
    const barEnd = followingBar(this.source, this.position);
    if (barEnd < 0) return;
    this.position = next;
    this.bar(barEnd - next, name === 'left', name === 'right');
  }

  /** A type face: its braces vanish, except where they hold an exponent or a subscript together. */
  private face(length: number): void {
    const after = this.previous();
    this.position += length;
    const open = skipBlank(this.source, this.position);
    if (this.source.charAt(open) !== '{') {
      this.uprightOnce = true;
      return;
    }
    if (this.uprightFrom < 0) this.uprightFrom = this.braces.length;
    if (after !== '^' && after !== '_' && this.pending === 0) this.dropBrace();
  }

  private dropBrace(): void {
    const open = skipBlank(this.source, this.position);
    if (this.source.charAt(open) !== '{') return;
    this.position = open + 1;
    this.braces.push('dropped');
    this.pendingOutside.push(this.pending);
    this.pending = 0;
  }

  /** `\mathbb{1}`, `\mathbf 1`, `\mathbb{I}`: the identity operator. */
  private identity(length: number): boolean {
    const { source } = this;
    let position = skipBlank(source, this.position + length);
    const braced = source.charAt(position) === '{';
    if (braced) position = skipBlank(source, position + 1);
    if (source.charAt(position) !== '1' && source.charAt(position) !== 'I') return false;
    position += 1;
    if (braced) {
      position = skipBlank(source, position);
      if (source.charAt(position) !== '}') return false;
      position += 1;
    }
    this.add('identity', '1', position - this.position);
    this.hat = false;
    return true;
  }

  private environment(name: 'begin' | 'end', length: number): void {
    const { source } = this;
    const open = skipBlank(source, this.position + length);
    const close = source.charAt(open) === '{' ? source.indexOf('}', open) : -1;
    const environment = close < 0 ? '' : source.slice(open + 1, close).trim();
    if (!matrixEnvironments.has(environment)) {
      const what = environment === '' ? 'An environment needs a name in braces.' : `"${environment}" is no matrix.`;
      this.fail('unknown-command', length, what, 'Write \\begin{pmatrix} … \\end{pmatrix}.');
      return;
    }
    let end = close + 1;
    if (name === 'begin' && environment === 'array') {
      const columns = skipBlank(source, end);
      const columnsEnd = source.charAt(columns) === '{' ? source.indexOf('}', columns) : -1;
      if (columnsEnd >= 0) end = columnsEnd + 1;
    }
    this.add(name === 'begin' ? 'begin' : 'end-environment', environment, end - this.position);
  }

  /** `\ket{+}`, `\bra{+}`, `\braket{+|-}`, `\ketbra{+}{-}`. */
  private stateCommand(name: string, length: number): void {
    const { source } = this;
    const open = skipBlank(source, this.position + length);
    const close = source.indexOf('}', open);
    const inside = source.slice(open + 1, close);
    if (source.charAt(open) !== '{' || close < 0) {
      this.fail('ket-unclosed', length, `The command \\${name} needs a label in braces.`, `Write \\${name}{+}.`);
      return;
    }
    if (name === 'ket' || name === 'bra') {
      this.state(name, readLabel(inside, 0), inside.length, close + 1);
      return;
    }
    const middle = name === 'braket' ? source.indexOf('|', open) : skipBlank(source, close + 1);
    const end = name === 'braket' ? close : source.indexOf('}', middle);
    if (middle < 0 || middle > end || (name === 'ketbra' && source.charAt(middle) !== '{')) {
      this.fail('ket-unclosed', length, `The command \\${name} needs two labels.`);
      return;
    }
    const first = source.slice(open + 1, Math.min(middle, close));
    const second = source.slice(middle + 1, end);
    this.state(name === 'braket' ? 'bra' : 'ket', readLabel(first, 0), first.length, middle);
    this.state(name === 'braket' ? 'ket' : 'bra', readLabel(second, 0), second.length, end + 1);
  }

  private state(kind: 'ket' | 'bra', label: { text: string; end: number }, length: number, end: number): void {
    const state = label.end >= length ? (stateLabels.get(label.text) ?? null) : null;
    this.add(state === null ? 'named-ket' : kind, label.text, end - this.position).state = state;
  }

  private mark(code: number): void {
    const character =
      code >= 0xd800
        ? String.fromCodePoint(this.source.codePointAt(this.position) ?? 0)
        : this.source.charAt(this.position);
    const kind = punctuation.get(character) as TokenKind | undefined;
    if (kind !== undefined) {
      this.punctuation(kind, character);
    } else if (letterAt(this.source, this.position) !== '') {
      this.letters();
    } else if (vulgarFractions.has(character)) {
      this.add('vulgar', character, 1);
    } else if (superscriptOf.has(character)) {
      this.script('superscript', superscriptOf);
    } else if (subscriptOf.has(character)) {
      this.script('subscript', subscriptOf);
    } else if (character === '!' && this.source.charAt(this.position + 1) === '=') {
      this.add('!=', '!=', 2);
    } else if (character === '″') {
      this.add('prime', '′′', 1);
    } else if (character === '\ud835' || character.length > 1) {
      this.unknown(character.normalize('NFKC'), character);
    } else {
      this.unknown(character, character);
    }
  }

  private unknown(plain: string, character: string): void {
    if (isDigit(plain.charCodeAt(0)))
      this.fail('unknown-character', 1, `The styled digit ${character} is not read.`, `Write ${plain}.`);
    else this.fail('unknown-character', 1, `The character ${character} is not known here.`);
  }

  private script(kind: 'superscript' | 'subscript', table: ReadonlyMap<string, string>): void {
    let text = '';
    let end = this.position;
    for (;;) {
      const plain = table.get(this.source.charAt(end));
      if (plain === undefined) break;
      text += plain;
      end += 1;
    }
    this.add(kind, text, end - this.position);
  }

  private punctuation(kind: TokenKind, character: string): void {
    const { source } = this;
    const next = source.charAt(this.position + 1);
    if (kind === 'bar') this.bar(1);
    else if (kind === '<') this.openAngle(1);
    else if (kind === '>' && next === '=') this.add('>=', '>=', 2);
    else if (kind === '{' || kind === '}') this.brace(kind);
    else if (kind === '*' && character === '*' && next === '*') this.add('^', '**', 2);
    else if ((kind === '+' || kind === '-') && this.previous() !== '_') this.sign(kind, next);
    else this.add(kind, character, character.length);
  }

  private sign(kind: '+' | '-', next: string): void {
    const following = punctuation.get(next);
    if (kind === '+' && next === '/' && punctuation.get(this.source.charAt(this.position + 2)) === '-') {
      this.add('±', '+/-', 3);
    } else if (kind === '+' && following === '-') {
      this.add('±', '+-', 2);
    } else if (kind === '-' && following === '+' && this.options.plusMinus) {
      this.add('∓', '-+', 2);
    } else {
      this.add(kind, kind, 1);
    }
  }

  private brace(kind: '{' | '}'): void {
    if (kind === '{') {
      const outside = this.pending > 0 ? this.pending - 1 : 0;
      this.braces.push('kept');
      this.pendingOutside.push(outside);
      this.add('{', '{', 1);
      this.pending = 0;
      return;
    }
    const brace = this.braces.pop();
    if (this.braces.length <= this.uprightFrom) this.uprightFrom = -1;
    if (brace === 'dropped') {
      this.position += 1;
      this.hat = false;
    } else {
      this.add('}', '}', 1);
    }
    this.pending = this.pendingOutside.pop() ?? 0;
  }

  /** A bar opens a ket only where a label and a closing angle follow. */
  private bar(length: number, opens = false, closes = false): void {
    if (this.options.kets && !closes && this.ket(length)) return;
    this.add(opens ? 'bar-open' : closes ? 'bar-close' : 'bar', '|', length);
  }

  private ket(length: number): boolean {
    const label = readLabel(this.source, this.position + length);
    const end = label.text === '' ? -1 : closingAngle(this.source, label.end);
    if (end < 0) return false;
    const state = stateLabels.get(label.text) ?? null;
    this.add(state === null ? 'named-ket' : 'ket', label.text, end - this.position).state = state;
    return true;
  }

  /** An opening angle makes a bra where a label and a bar follow; a ket that shares the bar may come after it. */
  private openAngle(length: number): void {
    const { source } = this;
    if (!this.options.kets) {
      const equal = source.charAt(this.position + length) === '=';
      this.add(equal ? '<=' : '<', '<', equal ? length + 1 : length);
      return;
    }
    const label = readLabel(source, this.position + length);
    const end = label.text === '' ? -1 : followingBar(source, label.end);
    if (end < 0) {
      this.add('<', '⟨', length);
      return;
    }
    const state = stateLabels.get(label.text) ?? null;
    this.add(state === null ? 'named-ket' : 'bra', label.text, end - this.position).state = state;
    this.ket(0);
  }
}
