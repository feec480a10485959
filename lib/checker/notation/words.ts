/** Runs of letters, with their indices and primes, to words that have a meaning or are unknown. */
import { type DiagnosticCode } from '../diagnostics';
import { greekLetter, type Scope } from './scope';
import { noSuffix, splitRun, type Split, type Suffix } from './split';
import { makeToken, type Token } from './token';
import { builtInWords, referenceMeaning, type Meaning } from './vocabulary';

export interface Words {
  readonly tokens: Token[];
  /** Whether a run had another complete split with a different meaning. */
  readonly ambiguous: Token | null;
}

/**
 * Resolves every run of letters. Unknown names are tokens too: they are an error only where an expression uses them,
 * not in a label. With `other`, an ambiguous run takes its second split.
 */
export function resolveWords(tokens: readonly Token[], scope: Scope, other: boolean): Words {
  const resolver = new Resolver([...tokens], scope, other);
  return resolver.run();
}

/** An index and the token after it. */
interface Index {
  readonly text: string;
  readonly next: number;
  readonly valid: boolean;
}

class Resolver {
  private readonly out: Token[] = [];
  private ambiguous: Token | null = null;
  private at = 0;

  constructor(
    private readonly tokens: Token[],
    private readonly scope: Scope,
    private readonly other: boolean,
  ) {}

  run(): Words {
    while (this.at < this.tokens.length) {
      const token = this.token(this.at);
      if (token.kind === 'letters') {
        this.letters(token);
      } else {
        if (token.kind === 'identity') {
          token.kind = 'word';
          token.meaning = { is: 'identity', written: 'one' };
        }
        this.out.push(token);
        this.at += 1;
      }
    }
    return { tokens: this.out, ambiguous: this.ambiguous };
  }

  private token(index: number): Token {
    return this.tokens[index] ?? (this.tokens[this.tokens.length - 1] as Token);
  }

  private letters(token: Token): void {
    const next = this.token(this.at + 1);
    const fixed = this.fixedMeaning(token, next);
    if (fixed) {
      this.word(token, fixed, this.at + 1);
    } else if (next.kind === '_') {
      this.indexed(token);
    } else if (next.kind === 'subscript') {
      this.suffixed(token, next.text, this.at + 2, true);
    } else if (next.kind === 'number' && !next.spaced && !next.part) {
      this.digits(token, next);
    } else {
      this.suffixed(token, '', this.at + 1, true);
    }
  }

  /** Words that are not split: functions written as commands, an upright e, reference functions. */
  private fixedMeaning(token: Token, next: Token): Meaning | undefined {
    const { text } = token;
    if (token.command && token.upright) {
      return next.kind === '_' || next.kind === 'subscript' ? undefined : builtInWords.get(text);
    }
    if (token.upright && text === 'e' && next.kind !== '_' && next.kind !== 'subscript') return builtInWords.get('e');
    if (next.kind === '(' && !this.scope.plain.has(text)) {
      const reference = referenceMeaning(text);
      if (reference && this.scope.allowReferenceFunctions) return reference;
    }
    return undefined;
  }

  private word(token: Token, meaning: Meaning, next: number): void {
    token.kind = 'word';
    token.meaning = meaning;
    this.out.push(token);
    this.at = next;
  }

  /** A run directly followed by digits: an index (`a0`), or the argument of a function (`sin2x`). */
  private digits(token: Token, number: Token): void {
    const digits = /^\d+$/.test(number.text) && !number.scientific;
    if (digits) {
      const primes = this.primes(this.at + 2);
      const split = splitRun(token.text, { index: number.text, primes: primes.count }, this.scope);
      if (split) {
        this.pieces(token, split, number.text, primes.next);
        return;
      }
      if (primes.count > 0 && splitRun(token.text, { index: number.text, primes: 0 }, this.scope)) {
        this.unknown(token, number.text, primes.next, 'prime');
        return;
      }
    }
    const split = splitRun(token.text, noSuffix, this.scope);
    const last = split?.pieces.at(-1)?.meaning;
    if (split && last && (last.is === 'function' || last.is === 'wrapper')) {
      const isLog = last.is === 'function' && last.name === 'log' && (number.text === '10' || number.text === '2');
      if (!isLog) {
        this.pieces(token, split, null, this.at + 1);
        return;
      }
      this.unknown(token, number.text, this.at + 2, 'log-base');
      return;
    }
    this.unknown(token, number.text, this.at + 2, split ? 'digits-after-name' : 'undeclared-name');
  }

  /** `name_index`: a braced index, digits, a sign, or as many letters as make a declared name, else one. */
  private indexed(token: Token): void {
    const after = this.token(this.at + 2);
    if (after.kind === 'letters' && !after.upright && after.text.length > 1) {
      this.unbracedLetters(token, after);
      return;
    }
    const index = this.indexAt(this.at + 2);
    this.suffixed(token, index.text, index.next, index.valid);
    if (after.kind === 'letters' && !after.upright) this.refuseDigits();
  }

  private unbracedLetters(token: Token, after: Token): void {
    const letters = after.text;
    for (let length = Math.min(letters.length, this.scope.longestIndex); length >= 1; length -= 1) {
      const index = greekLetter(letters.slice(0, length));
      const whole = length === letters.length;
      const primes = whole ? this.primes(this.at + 3) : { count: 0, next: this.at + 3 };
      const split = splitRun(token.text, { index, primes: primes.count }, this.scope);
      if (!split) continue;
      if (whole) {
        this.pieces(token, split, index, primes.next);
        this.refuseDigits();
      } else {
        const end = after.start + length;
        this.pieces(token, split, index, this.at + 2, end);
        this.tokens[this.at] = { ...after, text: letters.slice(length), start: end, spaced: false };
      }
      return;
    }
    this.unknown(token, greekLetter(letters), this.at + 3, 'undeclared-name');
  }

  private suffixed(token: Token, index: string, next: number, valid: boolean): void {
    const before = index === '' && this.token(this.at + 1).kind !== '_';
    const primes = this.primes(next);
    if (!valid) {
      this.unknown(token, index, next, 'bad-index');
      return;
    }
    const suffix: Suffix = { index, primes: primes.count };
    const split = splitRun(token.text, suffix, this.scope);
    if (split) {
      this.pieces(token, split, index === '' ? null : index, primes.next);
      return;
    }
    const reason = this.reason(token.text, index, primes.count, next);
    this.unknown(token, before ? null : index, primes.next, reason);
  }

  private reason(run: string, index: string, primes: number, next: number): DiagnosticCode {
    if (primes > 0 && splitRun(run, { index, primes: 0 }, this.scope)) return 'prime';
    if (run === 'log' || run === 'ln') return 'log-base';
    if (referenceMeaning(run) && this.token(next).kind === '(') return 'reference-function';
    return 'undeclared-name';
  }

  /** A word directly followed by digits would be read as a product that nobody means. */
  private refuseDigits(): void {
    const next = this.token(this.at);
    const last = this.out.at(-1);
    if (last?.kind !== 'word' || next.kind !== 'number' || next.spaced) return;
    last.kind = 'unknown';
    last.reason = 'digits-after-name';
  }

  private pieces(token: Token, split: Split, index: string | null, next: number, endOfIndex = -1): void {
    // Set upright as one word, as the printer does, a name is meant as a whole.
    const other = token.upright && split.pieces.length === 1 ? null : split.other;
    const pieces = this.other && other ? other : split.pieces;
    if (other) this.ambiguous ??= token;
    const end = endOfIndex >= 0 ? endOfIndex : this.token(next - 1).end;
    if (pieces.length === 1) {
      token.end = end;
      token.index = index;
      this.word(token, (pieces[0] as Split['pieces'][number]).meaning, next);
      return;
    }
    const oneToOne = token.end - token.start === token.text.length;
    pieces.forEach((piece, position) => {
      const last = position === pieces.length - 1;
      const start = oneToOne ? token.start + piece.start : token.start;
      const word = makeToken(
        'word',
        token.text.slice(piece.start, piece.end),
        start,
        last ? end : oneToOne ? token.start + piece.end : token.end,
        position === 0 && token.spaced,
      );
      word.meaning = piece.meaning;
      word.hat = token.hat;
      if (last) word.index = index;
      this.out.push(word);
    });
    this.at = next;
  }

  private unknown(token: Token, index: string | null, next: number, reason: DiagnosticCode): void {
    token.kind = 'unknown';
    token.reason = reason;
    token.index = index;
    token.end = Math.max(token.end, this.token(next - 1).end);
    this.out.push(token);
    this.at = next;
  }

  /** The index that starts at a token, with what comes after it. */
  private indexAt(from: number): Index {
    const first = this.token(from);
    if (first.kind === '{') {
      let text = '';
      let next = from + 1;
      for (; next < this.tokens.length; next += 1) {
        const token = this.token(next);
        if (token.kind === '}') return { text: greekLetter(text), next: next + 1, valid: text !== '' };
        if (!isIndexPart(token)) break;
        text += token.kind === 'letters' ? greekLetter(token.text) : indexText(token);
      }
      return { text, next: Math.min(next, this.tokens.length - 1), valid: false };
    }
    if (first.kind === 'letters') return { text: greekLetter(first.text), next: from + 1, valid: true };
    const valid = isIndexPart(first) && first.kind !== ',' && !first.text.includes('.') && !first.scientific;
    return { text: indexText(first), next: valid ? from + 1 : from, valid };
  }

  /** Primes at a token: `x'`, `x^\prime`, `x^{\prime\prime}`. */
  private primes(from: number): { readonly count: number; readonly next: number } {
    let next = from;
    let count = 0;
    while (this.token(next).kind === 'prime') {
      count += this.token(next).text === '′′' ? 2 : 1;
      next += 1;
    }
    if (count > 0 || this.token(next).kind !== '^') return { count, next };
    const braced = this.token(next + 1).kind === '{';
    let inner = next + (braced ? 2 : 1);
    while (this.token(inner).kind === 'prime') {
      count += 1;
      inner += 1;
    }
    if (count === 0 || (braced && this.token(inner).kind !== '}')) return { count: 0, next: from };
    return { count, next: braced ? inner + 1 : inner };
  }
}

function isIndexPart(token: Token): boolean {
  const { kind } = token;
  return (
    kind === 'letters' ||
    kind === 'number' ||
    kind === '+' ||
    kind === '-' ||
    kind === '±' ||
    kind === '∓' ||
    kind === ',' ||
    kind === 'arrow'
  );
}

function indexText(token: Token): string {
  if (token.kind === 'arrow')
    return token.text.startsWith('\\') ? (token.text === '\\uparrow' ? '↑' : '↓') : token.text;
  return token.kind === 'number' ? token.text : token.kind;
}
