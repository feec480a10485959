/** Longer pieces of raw text: numbers, and commands with their arguments. Each scan says where the piece ends. */
import { matrixEnvironments } from './characters';
import { isDigit, readLabel, skipBlank } from './source';

export interface ScannedNumber {
  readonly mantissa: string;
  readonly exponent: number;
  readonly scientific: boolean;
  readonly end: number;
  readonly twoPoints: boolean;
}

/** Whether only decoration follows a full stop at this position, so that it ends the text and no number. */
export function isFinalStop(source: string, position: number): boolean {
  return skipBlank(source, position + 1) >= source.length;
}

/** The decimal literal that starts at a digit or a point; a letter e or E makes a power of ten where it is allowed. */
export function scanNumber(
  source: string,
  from: number,
  lowerExponent: boolean,
  upperExponent: boolean,
): ScannedNumber {
  let end = from;
  let points = 0;
  for (;;) {
    if (isDigit(source.charCodeAt(end))) end += 1;
    else if (source.charCodeAt(end) === 46 && !isFinalStop(source, end)) {
      points += 1;
      end += 1;
    } else break;
  }
  const mantissa = source.slice(from, end);
  const mark = source.charCodeAt(end);
  const marked = (mark === 101 && lowerExponent) || (mark === 69 && upperExponent);
  let exponentEnd = end + 1;
  if (marked && '+-−–'.includes(source.charAt(exponentEnd))) exponentEnd += 1;
  if (!marked || !isDigit(source.charCodeAt(exponentEnd))) {
    return { mantissa, exponent: 0, scientific: false, end, twoPoints: points > 1 };
  }
  while (isDigit(source.charCodeAt(exponentEnd))) exponentEnd += 1;
  const exponent = Number(source.slice(end + 1, exponentEnd).replace(/[−–]/, '-'));
  return { mantissa, exponent, scientific: true, end: exponentEnd, twoPoints: points > 1 };
}

/** Where `{1}`, `1`, `{I}` or `I` after a type face ends, or −1 where something else stands. */
export function scanIdentity(source: string, from: number): number {
  let position = skipBlank(source, from);
  const braced = source.charAt(position) === '{';
  if (braced) position = skipBlank(source, position + 1);
  if (source.charAt(position) !== '1' && source.charAt(position) !== 'I') return -1;
  if (!braced) return position + 1;
  position = skipBlank(source, position + 1);
  return source.charAt(position) === '}' ? position + 1 : -1;
}

/** The name of a matrix environment in braces and where it, with the column letters of an array, ends; null for others. */
export function scanEnvironment(
  source: string,
  from: number,
  begins: boolean,
): { readonly name: string; readonly end: number } | null {
  const open = skipBlank(source, from);
  const close = source.charAt(open) === '{' ? closingBrace(source, open) : -1;
  const name = close < 0 ? '' : source.slice(open + 1, close).trim();
  if (!matrixEnvironments.has(name)) return null;
  if (!begins || name !== 'array') return { name, end: close + 1 };
  const columns = skipBlank(source, close + 1);
  const columnsEnd = source.charAt(columns) === '{' ? closingBrace(source, columns) : -1;
  return { name, end: columnsEnd < 0 ? close + 1 : columnsEnd + 1 };
}

/** A state named by a command, and where its piece of the text ends. */
export interface ScannedState {
  readonly kind: 'ket' | 'bra';
  /** The label, empty where the braces hold more than one. */
  readonly label: string;
  readonly end: number;
}

/** The states of `\ket{+}`, `\bra{+}`, `\braket{+|-}`, `\ketbra{+}{-}`; null where braces or labels are missing. */
export function scanStates(source: string, from: number, command: string): readonly ScannedState[] | null {
  const open = skipBlank(source, from);
  const close = source.charAt(open) === '{' ? closingBrace(source, open) : -1;
  if (close < 0) return null;
  if (command === 'ket' || command === 'bra') return [scannedState(command, source, open + 1, close, close + 1)];
  if (command === 'braket') {
    const middle = source.slice(open, close).indexOf('|');
    if (middle < 0) return null;
    const bar = open + middle;
    return [scannedState('bra', source, open + 1, bar, bar), scannedState('ket', source, bar + 1, close, close + 1)];
  }
  const second = skipBlank(source, close + 1);
  const end = source.charAt(second) === '{' ? closingBrace(source, second) : -1;
  if (end < 0) return null;
  return [
    scannedState('ket', source, open + 1, close, close + 1),
    scannedState('bra', source, second + 1, end, end + 1),
  ];
}

function scannedState(kind: 'ket' | 'bra', source: string, from: number, to: number, end: number): ScannedState {
  const inside = source.slice(from, to);
  const label = readLabel(inside, 0);
  return { kind, label: label.end >= inside.length ? label.text : '', end };
}

/** Longest argument in braces that is looked at, so that a missing brace costs little. */
const longestArgument = 64;

/** The brace that closes the one at a position, nearby, or −1. */
function closingBrace(source: string, open: number): number {
  let depth = 0;
  const limit = Math.min(source.length, open + longestArgument);
  for (let position = open; position < limit; position += 1) {
    const character = source.charAt(position);
    if (character === '{') depth += 1;
    if (character === '}') depth -= 1;
    if (depth === 0) return position;
  }
  return -1;
}
