/** Where tokens are written, with what must be remembered between them. */
import { type Diagnostic } from '../diagnostics';
import { skipBlank } from './source';
import { makeToken, type Token, type TokenKind } from './token';

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

type Brace = 'kept' | 'dropped';

/** The tokens so far and the place in the text. */
export class TokenWriter {
  readonly tokens: Token[] = [];
  problem: Diagnostic | null = null;
  lowerExponentUsed = false;
  position = 0;
  /** UTF-16 units so far beyond one a code point. */
  surplus = 0;
  spaced = false;
  hat = false;
  uprightOnce = false;
  readonly braces: Brace[] = [];
  /** Depth in `braces` from which text is upright, or −1. */
  uprightFrom = -1;
  /** Arguments that a fraction still takes at this level: a bare one is a single digit. */
  pending = 0;
  readonly pendingOutside: number[] = [];

  constructor(
    readonly source: string,
    readonly options: TokeniseOptions,
  ) {}

  /** Adds a token that ends `length` UTF-16 units from here and moves past it. */
  add(kind: TokenKind, text: string, length: number): Token {
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

  /** Records the first problem, `length` characters from here. */
  fail(code: Diagnostic['code'], length: number, message: string, hint?: string): void {
    const start = this.position - this.surplus;
    this.problem ??= { code, span: { start, end: start + length }, message, hint };
  }

  /** The kind of the last token. */
  previous(): TokenKind {
    return this.tokens.at(-1)?.kind ?? 'end';
  }

  /** Passes a brace that holds nothing together but a type face. */
  dropBrace(): void {
    const open = skipBlank(this.source, this.position);
    if (this.source.charAt(open) !== '{') return;
    this.position = open + 1;
    this.braces.push('dropped');
    this.pendingOutside.push(this.pending);
    this.pending = 0;
  }

  /** A brace of the text: one token, unless it closes a dropped one. */
  brace(kind: '{' | '}'): void {
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
}
