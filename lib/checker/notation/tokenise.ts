/** Text to tokens, in one pass from left to right. */
import { type Diagnostic } from '../diagnostics';
import { punctuation, subscriptOf, superscriptOf, vulgarFractions } from './characters';
import { maximumExponent } from './limits';
import { isFinalStop, scanNumber } from './scan';
import { isAsciiLetter, isBlank, isDigit, letterAt } from './source';
import { makeToken, type Token, type TokenKind } from './token';
import { TokenWriter, type TokeniseOptions } from './token-writer';
import { readCommand } from './tokenise-command';
import { readAngle, readBar, readNamedState } from './tokenise-state';

/** Tokens, ending with one of kind `end`; the first problem with a character, if any. */
export interface Tokens {
  readonly tokens: Token[];
  readonly problem: Diagnostic | null;
  /** Whether a number was written with a lower-case e. */
  readonly lowerExponentUsed: boolean;
}

/** Splits a text into tokens. Spans count code points. Linear in the length. */
export function tokenise(source: string, options: TokeniseOptions): Tokens {
  const writer = new TokenWriter(source, options);
  while (writer.position < source.length && writer.problem === null)
    readStep(writer, source.charCodeAt(writer.position));
  const end = source.length - writer.surplus;
  writer.tokens.push(makeToken('end', '', end, end, writer.spaced));
  return { tokens: writer.tokens, problem: writer.problem, lowerExponentUsed: writer.lowerExponentUsed };
}

function readStep(writer: TokenWriter, code: number): void {
  if (code === 32 || isBlank(code)) {
    writer.spaced = true;
    writer.position += 1;
  } else if (isAsciiLetter(code)) {
    readLetters(writer);
  } else if (isDigit(code)) {
    readNumber(writer);
  } else if (code === 92) {
    readCommand(writer);
  } else if (code === 46) {
    readPoint(writer);
  } else {
    readMark(writer, code);
  }
}

function readLetters(writer: TokenWriter): void {
  const { source } = writer;
  let end = writer.position;
  let text = '';
  for (;;) {
    const letter = letterAt(source, end);
    if (letter === '') break;
    text += letter;
    end += source.charCodeAt(end) === 0xd835 ? 2 : 1;
    if (writer.uprightOnce) break;
  }
  if ((text === 'ket' || text === 'bra') && readNamedState(writer, text, end)) return;
  writer.add('letters', text, end - writer.position).hat = writer.hat;
  writer.hat = false;
}

function readNumber(writer: TokenWriter): void {
  const { source, options, position } = writer;
  if (writer.pending > 0) {
    writer.add('number', source.charAt(position), 1).part = true;
    return;
  }
  const scanned = scanNumber(source, position, options.lowerExponent, options.upperExponent);
  const length = scanned.end - position;
  if (scanned.twoPoints) {
    writer.fail('bad-number', length, 'This number has two decimal points.');
  } else if (Math.abs(scanned.exponent) > maximumExponent) {
    writer.fail('number-too-large', length, 'This power of ten is too large to be read.');
  } else {
    if (scanned.scientific) writer.lowerExponentUsed ||= source.slice(position, scanned.end).includes('e');
    const token = writer.add('number', scanned.mantissa.replace(/\.$/, ''), length);
    token.exponent = scanned.exponent;
    token.scientific = scanned.scientific;
  }
}

function readPoint(writer: TokenWriter): void {
  if (isDigit(writer.source.charCodeAt(writer.position + 1)) && writer.pending === 0) {
    readNumber(writer);
  } else if (isFinalStop(writer.source, writer.position)) {
    writer.position = writer.source.length;
  } else {
    writer.fail('unexpected', 1, 'A full stop is not expected here.', 'For a product write *.');
  }
}

function readMark(writer: TokenWriter, code: number): void {
  const character =
    code >= 0xd800
      ? String.fromCodePoint(writer.source.codePointAt(writer.position) ?? 0)
      : writer.source.charAt(writer.position);
  const kind = punctuation.get(character) as TokenKind | undefined;
  if (kind !== undefined) {
    readPunctuation(writer, kind, character);
  } else if (letterAt(writer.source, writer.position) !== '') {
    readLetters(writer);
  } else if (vulgarFractions.has(character)) {
    writer.add('vulgar', character, 1);
  } else if (superscriptOf.has(character)) {
    readScript(writer, 'superscript', superscriptOf);
  } else if (subscriptOf.has(character)) {
    readScript(writer, 'subscript', subscriptOf);
  } else if (character === '!' && writer.source.charAt(writer.position + 1) === '=') {
    writer.add('!=', '!=', 2);
  } else if (character === '″') {
    writer.add('prime', '′′', 1);
  } else if (character === '\ud835' || character.length > 1) {
    refuseCharacter(writer, character.normalize('NFKC'), character);
  } else {
    refuseCharacter(writer, character, character);
  }
}

function refuseCharacter(writer: TokenWriter, plain: string, character: string): void {
  if (isDigit(plain.charCodeAt(0)))
    writer.fail('unknown-character', 1, `The styled digit ${character} is not read.`, `Write ${plain}.`);
  else writer.fail('unknown-character', 1, `The character ${character} is not known here.`);
}

function readScript(writer: TokenWriter, kind: 'superscript' | 'subscript', table: ReadonlyMap<string, string>): void {
  let text = '';
  let end = writer.position;
  for (;;) {
    const plain = table.get(writer.source.charAt(end));
    if (plain === undefined) break;
    text += plain;
    end += 1;
  }
  writer.add(kind, text, end - writer.position);
}

function readPunctuation(writer: TokenWriter, kind: TokenKind, character: string): void {
  const { source } = writer;
  const next = source.charAt(writer.position + 1);
  if (kind === 'bar') readBar(writer, 1);
  else if (kind === '<') readAngle(writer, 1);
  else if (kind === '>' && next === '=') writer.add('>=', '>=', 2);
  else if (kind === '{' || kind === '}') writer.brace(kind);
  else if (kind === '*' && character === '*' && next === '*') writer.add('^', '**', 2);
  else if ((kind === '+' || kind === '-') && writer.previous() !== '_') readSign(writer, kind, next);
  else writer.add(kind, character, character.length);
}

function readSign(writer: TokenWriter, kind: '+' | '-', next: string): void {
  const following = punctuation.get(next);
  if (kind === '+' && next === '/' && punctuation.get(writer.source.charAt(writer.position + 2)) === '-') {
    writer.add('±', '+/-', 3);
  } else if (kind === '+' && following === '-') {
    writer.add('±', '+-', 2);
  } else if (kind === '-' && following === '+' && writer.options.plusMinus) {
    writer.add('∓', '-+', 2);
  } else {
    writer.add(kind, kind, 1);
  }
}
