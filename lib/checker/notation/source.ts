/** Raw text seen as characters: letters, white space, and LaTeX commands. Nothing here knows the grammar. */
import { decorationCommands, faceCommands, greekByName, letterCommands, letterVariants } from './characters';
import { maximumLabelLength } from './limits';

/** Whether a UTF-16 unit is an ASCII digit. */
export function isDigit(code: number): boolean {
  return code >= 48 && code <= 57;
}

/** Whether a UTF-16 unit is an ASCII letter. */
export function isAsciiLetter(code: number): boolean {
  return (code >= 97 && code <= 122) || (code >= 65 && code <= 90);
}

/** White space, invisible operators, and marks that only decorate (a combining hat, a math-mode dollar). */
export function isBlank(code: number): boolean {
  if (code <= 32) return true;
  if (code < 128) return code === 36 || code === 126;
  return (
    code === 0xa0 ||
    code === 0x302 ||
    code === 0x20d7 ||
    (code >= 0x2000 && code <= 0x200f) ||
    (code >= 0x2028 && code <= 0x202f) ||
    (code >= 0x205f && code <= 0x2064) ||
    code === 0x3000 ||
    code === 0xfeff
  );
}

/**
 * The letter at a position in its normal form, or the empty string. Mathematical italic, bold and double-struck letters
 * (two UTF-16 units) read as the plain letter.
 */
export function letterAt(source: string, position: number): string {
  const code = source.charCodeAt(position);
  if (isAsciiLetter(code)) return source.charAt(position);
  if (code < 0xb5) return '';
  if (code === 0xd835) {
    const plain = source.slice(position, position + 2).normalize('NFKC');
    return plain.length === 1 && plain.charCodeAt(0) !== code ? letterAt(plain, 0) : '';
  }
  const character = source.charAt(position);
  const variant = letterVariants.get(character);
  if (variant !== undefined) return variant;
  if ((code >= 0x391 && code <= 0x3c9 && code !== 0x3a2) || code === 0x127 || code === 0x2113) return character;
  return '';
}

/** The name of the command whose backslash stands at the position: its letters, or the one character after it. */
export function commandAt(source: string, position: number): string {
  let end = position + 1;
  while (isAsciiLetter(source.charCodeAt(end))) end += 1;
  return end > position + 1 ? source.slice(position + 1, end) : source.slice(position + 1, position + 2);
}

/** Whether a command is white space: spacing, delimiter sizes, style switches, math-mode brackets. */
export function isDecoration(command: string): boolean {
  return command === 'left' || command === 'right' || decorationCommands.has(command) || isSpacing(command);
}

function isSpacing(command: string): boolean {
  return command.length === 1 ? ',;:!> ()[]\n\t'.includes(command) : command === '';
}

/** The first position at or after the given one that holds neither white space nor decoration. */
export function skipBlank(source: string, from: number): number {
  let position = from;
  while (position < source.length) {
    if (isBlank(source.charCodeAt(position))) {
      position += 1;
    } else if (source.charCodeAt(position) === 92) {
      const command = commandAt(source, position);
      if (!isDecoration(command)) return position;
      position += 1 + command.length;
    } else {
      return position;
    }
  }
  return position;
}

/** The label that starts at a position and where it ends. The empty label is none. */
export interface Label {
  readonly text: string;
  readonly end: number;
}

/**
 * A possible label of a ket or bra: signs, letters, digits and arrows, without braces, type faces and underscores.
 * Reads at most a fixed number of characters.
 */
export function readLabel(source: string, from: number): Label {
  const limit = Math.min(source.length, from + maximumLabelLength);
  let text = '';
  let position = from;
  while (position < limit) {
    const code = source.charCodeAt(position);
    const character = source.charAt(position);
    if (isBlank(code) || character === '{' || character === '}' || character === '_') {
      position += 1;
    } else if (code === 92) {
      const command = commandAt(source, position);
      const letter = labelCommand(command);
      if (letter === null) break;
      text += letter;
      position += 1 + command.length;
    } else {
      const plain = labelCharacter(source, position);
      if (plain === '') break;
      text += plain;
      position += code === 0xd835 ? 2 : 1;
    }
  }
  return { text, end: position };
}

function labelCharacter(source: string, position: number): string {
  const character = source.charAt(position);
  if (isDigit(source.charCodeAt(position)) || '+-±∓↑↓'.includes(character)) return character;
  if ('−–‐‑﹣－'.includes(character)) return '-';
  return letterAt(source, position);
}

function labelCommand(command: string): string | null {
  if (command === 'uparrow') return '↑';
  if (command === 'downarrow') return '↓';
  if (command === 'pm') return '±';
  if (isDecoration(command) || faceCommands.has(command)) return '';
  return greekByName.get(command) ?? letterCommands.get(command) ?? null;
}

/** The position after a closing angle (`>`, `⟩`, `\rangle`) that follows, or −1. */
export function closingAngle(source: string, from: number): number {
  const position = skipBlank(source, from);
  if ('>⟩〉〉'.includes(source.charAt(position)) && position < source.length) return position + 1;
  return source.startsWith('\\rangle', position) ? position + 7 : -1;
}

/** The position after a bar that follows, or −1. */
export function followingBar(source: string, from: number): number {
  return barAt(source, skipBlank(source, from));
}

/** The position after the bar at this position, or −1. */
export function barAt(source: string, position: number): number {
  if (position >= source.length) return -1;
  if ('|∣ǀ'.includes(source.charAt(position))) return position + 1;
  if (source.charCodeAt(position) !== 92) return -1;
  const command = commandAt(source, position);
  return ['vert', 'mid', 'rvert', 'lvert'].includes(command) ? position + 1 + command.length : -1;
}
