/** Splitting a run of letters into names: leftmost longest first, with backtracking, in linear time. */
import { greekLetter, plainMeaning, type Scope, type Spelling } from './scope';
import { builtInByFirst, builtInWords, operatorMeaning, type Meaning } from './vocabulary';

/** What follows the run: the last name must carry it. */
export interface Suffix {
  readonly index: string;
  readonly primes: number;
}

export const noSuffix: Suffix = { index: '', primes: 0 };

export interface Piece {
  readonly start: number;
  readonly end: number;
  readonly meaning: Meaning;
}

export interface Split {
  readonly pieces: readonly Piece[];
  /** Another complete split with a different meaning, if there is one. */
  readonly other: readonly Piece[] | null;
}

/**
 * The split of a run whose last name carries the suffix, or null where none is complete.
 * A run that is one word of the language or a Greek letter's name as a whole is that word, whatever its letters could
 * mean; a word that an author made up and declared can still be meant as the product of shorter names, the other split.
 */
export function splitRun(run: string, suffix: Suffix, scope: Scope): Split | null {
  const whole = meaningAtEnd(run, 0, suffix, scope, false);
  const isOwnWord = suffix.index === '' && suffix.primes === 0 && scope.plain.has(run) && greekLetter(run) === run;
  if (whole && !isOwnWord) return { pieces: [{ start: 0, end: run.length, meaning: whole }], other: null };
  return run.length === 1
    ? splitWith(run, suffix, scope, true)
    : (splitWith(run, suffix, scope, false) ?? splitWith(run, suffix, scope, true));
}

/** Farthest position from which names reach no further, for a message: everything before it is names. */
export function knownPrefix(run: string, scope: Scope): number {
  const reached = new Uint8Array(run.length + 1);
  reached[0] = 1;
  let farthest = 0;
  for (let position = 0; position < run.length; position += 1) {
    if (reached[position] === 0) continue;
    farthest = position;
    forEachWord(run, position, scope, false, (length) => {
      reached[position + length] = 1;
    });
  }
  return farthest;
}

function splitWith(run: string, suffix: Suffix, scope: Scope, joined: boolean): Split | null {
  const length = run.length;
  const suffixed = suffix.index !== '' || suffix.primes > 0;
  /** Length of the longest word at each position that leads to a complete split, 0 if none; and of the next longest. */
  const best = new Uint16Array(length + 1);
  const second = new Uint16Array(length + 1);
  for (let position = length - 1; position >= 0; position -= 1) {
    let longest = 0;
    let next = 0;
    const offer = (size: number): void => {
      const end = position + size;
      if (end === length ? suffixed : best[end] === 0) return;
      if (size > longest) {
        next = longest;
        longest = size;
      } else if (size > next && size < longest) {
        next = size;
      }
    };
    forEachWord(run, position, scope, joined, offer);
    if (suffixed && meaningAtEnd(run, position, suffix, scope, joined)) {
      next = longest;
      longest = length - position;
    }
    best[position] = longest;
    second[position] = next;
  }
  if (best[0] === 0) return null;
  const pieces = follow(run, suffix, scope, joined, best, second, -1);
  let turn = -1;
  for (const piece of pieces) {
    if (second[piece.start] !== 0) {
      turn = piece.start;
      break;
    }
  }
  return { pieces, other: turn < 0 ? null : follow(run, suffix, scope, joined, best, second, turn) };
}

/** The pieces along the longest words, but for the next longest at one position. */
function follow(
  run: string,
  suffix: Suffix,
  scope: Scope,
  joined: boolean,
  best: Uint16Array,
  second: Uint16Array,
  turn: number,
): readonly Piece[] {
  const pieces: Piece[] = [];
  let position = 0;
  while (position < run.length) {
    const size = (position === turn ? second[position] : best[position]) ?? 0;
    const end = position + size;
    const meaning =
      end === run.length
        ? meaningAtEnd(run, position, suffix, scope, joined)
        : (plainMeaning(scope, run.slice(position, end)) ?? joinedMeaning(run, position, end, scope));
    if (meaning === undefined) return pieces;
    pieces.push({ start: position, end, meaning });
    position = end;
  }
  return pieces;
}

/** Calls back with the length of every word without suffix that stands at a position, longest built-in first. */
function forEachWord(
  run: string,
  position: number,
  scope: Scope,
  joined: boolean,
  offer: (length: number) => void,
): void {
  for (const spelling of scope.plainSpellings) {
    if (run.startsWith(spelling.text, position)) offer(spelling.text.length);
  }
  if (joined) {
    for (const spelling of scope.joined) if (run.startsWith(spelling.text, position)) offer(spelling.text.length);
  }
  const words = builtInByFirst.get(run.charAt(position));
  if (words === undefined) return;
  for (const word of words) {
    if (run.startsWith(word, position) && !scope.plain.has(word)) offer(word.length);
  }
}

/** The meaning of the rest of the run together with the suffix. */
function meaningAtEnd(run: string, from: number, suffix: Suffix, scope: Scope, joined: boolean): Meaning | undefined {
  const text = from === 0 ? run : run.slice(from);
  if (suffix.index === '' && suffix.primes === 0) {
    return plainMeaning(scope, text) ?? (joined ? joinedMeaning(run, from, run.length, scope) : undefined);
  }
  for (const spelling of scope.suffixed) {
    if (spelling.text === text && spelling.index === suffix.index && spelling.primes === suffix.primes)
      return spelling.meaning;
  }
  if (suffix.primes > 0) return undefined;
  if (text === 'S') return operatorMeaning('S', suffix.index);
  if (text === 'σ' || text === 'sigma') return operatorMeaning('σ', suffix.index);
  if ((text === 'atan' || text === 'arctan') && suffix.index === '2') return builtInWords.get('atan2');
  return undefined;
}

function joinedMeaning(run: string, from: number, to: number, scope: Scope): Meaning | undefined {
  const fits = (spelling: Spelling): boolean =>
    spelling.text.length === to - from && run.startsWith(spelling.text, from);
  return scope.joined.find(fits)?.meaning;
}
