/** The names that may be used in a text: declared symbols with their spellings, beside the built-in words. */
import { type Diagnostic } from '../diagnostics';
import { greekByName, greekNames, subscriptOf } from './characters';
import { isAsciiLetter, isDigit, letterAt } from './source';
import { builtInWords, declarableWords, operatorMeaning, reservedWords, type Meaning } from './vocabulary';

/** A name in parts: `omega_1'` is base ω, index 1, one prime. Greek words are letters. */
export interface NameParts {
  readonly base: string;
  readonly index: string;
  readonly primes: number;
}

/** One spelling of a declared base, with the index and primes that must follow. */
export interface Spelling {
  readonly text: string;
  readonly index: string;
  readonly primes: number;
  readonly meaning: Meaning;
}

export interface Scope {
  /** Declared spellings without index and primes, by text. */
  readonly plain: ReadonlyMap<string, Meaning>;
  /** The same, for splitting runs of letters. */
  readonly plainSpellings: readonly Spelling[];
  /** Declared spellings that need an index or primes. */
  readonly suffixed: readonly Spelling[];
  /** Spellings with the letters of an index joined on (`kB` for `k_B`), used only where nothing else fits. */
  readonly joined: readonly Spelling[];
  /** Declared names as given, for hints. */
  readonly names: readonly string[];
  /** Letters of the longest declared index as spelled, at least 1. */
  readonly longestIndex: number;
  readonly allowReferenceFunctions: boolean;
  readonly declaresE: boolean;
  readonly declaresCapitalE: boolean;
  /** Whether every declared name may be declared; `checkNames` says which may not. */
  readonly sound: boolean;
}

/** The letter a whole word spells (`omega` → ω), else the word itself. */
export function greekLetter(word: string): string {
  return greekByName.get(word) ?? word;
}

/**
 * A declared name in parts, or null where it is no name: letters, then an optional index after `_` (or digits), then
 * primes.
 */
export function nameParts(name: string): NameParts | null {
  let letters = 0;
  while (isAsciiLetter(name.charCodeAt(letters))) letters += 1;
  if (letters === name.length && letters > 0) return { base: greekLetter(name), index: '', primes: 0 };
  return partsOf(name, letters);
}

function partsOf(name: string, asciiLetters: number): NameParts | null {
  let position = asciiLetters;
  let base = name.slice(0, asciiLetters);
  for (let letter = letterAt(name, position); letter !== ''; letter = letterAt(name, position)) {
    base += letter;
    position += 1;
  }
  let primes = primesAt(name, position);
  position += primes;
  const marked = name.charAt(position) === '_';
  if (marked) position += 1;
  const braced = marked && name.charAt(position) === '{';
  if (braced) position += 1;
  let index = '';
  for (let part = indexPart(name, position, marked); part !== ''; part = indexPart(name, position, marked)) {
    index += part;
    position += 1;
  }
  if (braced && name.charAt(position) === '}') position += 1;
  const after = primesAt(name, position);
  primes += after;
  position += after;
  if (base === '' || position !== name.length || (marked && index === '')) return null;
  return { base: greekLetter(base), index: greekLetter(index), primes };
}

/** One character of an index; without an index mark only digits and lowered characters make one. */
function indexPart(name: string, position: number, marked: boolean): string {
  const character = name.charAt(position);
  if (isDigit(name.charCodeAt(position))) return character;
  if (marked && (character === '+' || character === '-')) return character;
  const letter = marked ? letterAt(name, position) : '';
  return letter === '' ? (subscriptOf.get(character) ?? '') : letter;
}

function primesAt(name: string, from: number): number {
  let count = 0;
  while ("'′’".includes(name.charAt(from + count)) && from + count < name.length) count += 1;
  return count;
}

/** The scope of declared names. Names that are no names are left out; `checkNames` reports them. */
export function buildScope(names: readonly string[], allowReferenceFunctions: boolean): Scope {
  const plain = new Map<string, Meaning>();
  const plainSpellings: Spelling[] = [];
  const suffixed: Spelling[] = [];
  const joined: Spelling[] = [];
  let sound = true;
  let longestIndex = 1;
  for (const name of names) {
    const parts = nameParts(name);
    sound &&= parts !== null && !isReserved(parts);
    if (parts === null) continue;
    const { base, index, primes } = parts;
    const meaning: Meaning = { is: 'symbol', name };
    for (const text of spellings(base)) {
      const spelling = { text, index, primes, meaning };
      if (index === '' && primes === 0) {
        if (!plain.has(text)) plainSpellings.push(spelling);
        plain.set(text, meaning);
      } else {
        suffixed.push(spelling);
        longestIndex = Math.max(longestIndex, index.length, greekNames.get(index)?.length ?? 0);
        if (primes === 0 && letterAt(index, 0) !== '') {
          for (const letters of spellings(index)) joined.push({ text: text + letters, index: '', primes: 0, meaning });
        }
      }
    }
  }
  return {
    plain,
    plainSpellings,
    suffixed,
    joined,
    names,
    longestIndex,
    allowReferenceFunctions,
    declaresE: plain.has('e'),
    declaresCapitalE: plain.has('E'),
    sound,
  };
}

/** The ways a base or an index is spelled: a Greek letter also by its English name. */
function spellings(letter: string): readonly string[] {
  const name = greekNames.get(letter);
  return name === undefined ? [letter] : [letter, name];
}

/** The meaning of an unsuffixed word, declared names first. */
export function plainMeaning(scope: Scope, word: string): Meaning | undefined {
  return scope.plain.get(word) ?? builtInWords.get(word);
}

/**
 * Whether each declared name may be declared: it must be a name and none of the reserved words.
 * Spans are of the name itself.
 */
export function checkNames(names: readonly string[]): readonly Diagnostic[] {
  const diagnostics: Diagnostic[] = [];
  for (const name of names) {
    const span = { start: 0, end: [...name].length };
    const parts = nameParts(name);
    if (parts === null) {
      const message = `"${name}" is no name: a name is letters, then an index after _ if it has one.`;
      diagnostics.push({ code: 'bad-name', span, message });
    } else if (isReserved(parts)) {
      const message = `"${name}" already has a meaning and cannot be declared.`;
      diagnostics.push({ code: 'reserved-name', span, message });
    }
  }
  return diagnostics;
}

function isReserved({ base, index, primes }: NameParts): boolean {
  if (primes > 0) return false;
  if (index !== '') return operatorMeaning(base, index) !== undefined || (base === 'atan' && index === '2');
  return (builtInWords.has(base) && !declarableWords.has(base)) || reservedWords.has(base);
}

/** A declared name or built-in word at most one edit away from an unknown one, for a hint. */
export function nearestName(scope: Scope, word: string): string | undefined {
  const plain = word.toLowerCase();
  if (plain.length > 24) return undefined;
  for (const name of [...scope.names, ...builtInWords.keys()]) {
    if (name.length > 1 && name !== word && (name.toLowerCase() === plain || isOneEdit(name, word))) return name;
  }
  return undefined;
}

/** Whether one insertion, deletion, substitution or exchange of neighbours turns one word (of three letters or more) into the other. */
function isOneEdit(one: string, other: string): boolean {
  if (one.length < 3 || other.length < 3 || Math.abs(one.length - other.length) > 1) return false;
  let start = 0;
  while (start < one.length && one[start] === other[start]) start += 1;
  const rest = (text: string, skip: number): string => text.slice(start + skip);
  return (
    rest(one, 1) === rest(other, 1) ||
    rest(one, 1) === rest(other, 0) ||
    rest(one, 0) === rest(other, 1) ||
    (one[start] === other[start + 1] && one[start + 1] === other[start] && rest(one, 2) === rest(other, 2))
  );
}
