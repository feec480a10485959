/** Tokens: one alphabet for ASCII, Unicode and LaTeX. */
import { type DiagnosticCode } from '../diagnostics';
import { type StateLabel, type WrittenLabel } from './tree';
import { type Meaning } from './vocabulary';

/**
 * `letters` are runs not yet resolved into names; after resolution (words.ts) they are `word` or `unknown`.
 * `named-ket` is a ket or bra with a label that names no known state. Signs, brackets and marks are their own kind.
 */
export type TokenKind =
  | 'number'
  | 'vulgar'
  | 'letters'
  | 'word'
  | 'unknown'
  | 'superscript'
  | 'subscript'
  | 'ket'
  | 'bra'
  | 'named-ket'
  | 'bar'
  | 'bar-open'
  | 'bar-close'
  | 'root'
  | 'frac'
  | 'overline'
  | 'identity'
  | 'dagger'
  | 'transpose'
  | 'prime'
  | 'degree'
  | 'arrow'
  | 'and'
  | 'or'
  | 'not'
  | 'begin'
  | 'end-environment'
  | 'row'
  | '&'
  | '+'
  | '-'
  | '±'
  | '∓'
  | '*'
  | '/'
  | '^'
  | '_'
  | '('
  | ')'
  | '['
  | ']'
  | '{'
  | '}'
  | ','
  | ';'
  | ':'
  | '='
  | '!='
  | '<'
  | '<='
  | '>'
  | '>='
  | 'end';

export interface Token {
  kind: TokenKind;
  /** Normalised text: letters, digits, label, or the character as typed. */
  text: string;
  /** Code points of the raw text. */
  start: number;
  end: number;
  /** Whether white space or decoration stands before it. */
  spaced: boolean;
  /** Whether it was written as a LaTeX command, after which white space means nothing. */
  command: boolean;
  /** Whether it was set upright (`\mathrm`), so that an e is Euler's. */
  upright: boolean;
  hat: boolean;
  /** Numbers: whether it is one digit that is a part of a fraction, as in `\frac12`. */
  part: boolean;
  /** Numbers: the written power of ten. */
  exponent: number;
  /** Numbers: whether a power of ten was written with e. */
  scientific: boolean;
  /** Words: what they mean. Unknown words: null. */
  meaning: Meaning | null;
  /** Words and unknown words: the index written after the base that is `text`. */
  index: string | null;
  /** Unknown words: why they are unknown. */
  reason: DiagnosticCode | null;
  /** Kets and bras. */
  state: readonly [StateLabel, WrittenLabel] | null;
}

export function makeToken(kind: TokenKind, text: string, start: number, end: number, spaced: boolean): Token {
  return {
    kind,
    text,
    start,
    end,
    spaced,
    command: false,
    upright: false,
    hat: false,
    part: false,
    exponent: 0,
    scientific: false,
    meaning: null,
    index: null,
    reason: null,
    state: null,
  };
}
