/** LaTeX commands to tokens. */
import { commandTokens, faceCommands, greekByName, identityFaces, letterCommands } from './characters';
import { scanEnvironment, scanIdentity, scanStates } from './scan';
import { barAt, commandAt, isDecoration, skipBlank } from './source';
import { type TokenKind } from './token';
import { type TokenWriter } from './token-writer';
import { readAngle, readBar } from './tokenise-state';
import { builtInWords, stateLabels } from './vocabulary';

/** The command whose backslash stands here. */
export function readCommand(writer: TokenWriter): void {
  const { source } = writer;
  const name = commandAt(source, writer.position);
  const length = 1 + name.length;
  if (isDecoration(name)) {
    readDecoration(writer, name, length);
    return;
  }
  const letter = greekByName.get(name) ?? letterCommands.get(name);
  if (letter !== undefined) {
    const token = writer.add('letters', letter, length);
    token.command = true;
    token.hat = writer.hat;
    writer.hat = false;
    return;
  }
  if (name === 'langle') readAngle(writer, length);
  else if (name === 'vert' || name === 'mid' || name === 'lvert') readBar(writer, length, name === 'lvert');
  else if (name === '{' || name === '}') writer.add(name, `\\${name}`, length);
  else if (name === '|')
    writer.fail('bars', 2, 'Double bars are not read here.', 'For an absolute value write abs( ).');
  else if (name === '\\') writer.add('row', '\\\\', 2);
  else readWordCommand(writer, name, length);
}

function readWordCommand(writer: TokenWriter, name: string, length: number): void {
  const kind = commandTokens.get(name);
  if (kind !== undefined) {
    const token = writer.add(kind as TokenKind, `\\${name}`, length);
    token.command = true;
    if (kind === 'frac') writer.pending = 2;
  } else if (name === 'hat' || name === 'widehat') {
    writer.hat = true;
    writer.position += length;
    writer.dropBrace();
  } else if (identityFaces.has(name) && readIdentity(writer, length)) {
    return;
  } else if (faceCommands.has(name)) {
    readFace(writer, length);
  } else if (name === 'begin' || name === 'end') {
    readEnvironment(writer, name, length);
  } else if (name === 'ket' || name === 'bra' || name === 'braket' || name === 'ketbra') {
    readStates(writer, name, length);
  } else if (builtInWords.get(name)?.is === 'function') {
    const token = writer.add('letters', name, length);
    token.command = true;
    token.upright = true;
  } else {
    writer.fail('unknown-command', length, `The command \\${name} is not known here.`);
  }
}

function readDecoration(writer: TokenWriter, name: string, length: number): void {
  writer.position += length;
  writer.spaced = true;
  if (name !== 'left' && name !== 'right') return;
  // Only spaces are passed here: looking past further commands would take time quadratic in a row of them.
  while (writer.source.charCodeAt(writer.position) === 32) writer.position += 1;
  const next = writer.position;
  if (writer.source.charCodeAt(next) === 46) writer.position += 1;
  const barEnd = barAt(writer.source, next);
  if (barEnd < 0) return;
  readBar(writer, barEnd - next, name === 'left', name === 'right');
}

/** A type face: its braces vanish, except where they hold an exponent or a subscript together. */
function readFace(writer: TokenWriter, length: number): void {
  const after = writer.previous();
  writer.position += length;
  const open = skipBlank(writer.source, writer.position);
  if (writer.source.charAt(open) !== '{') {
    writer.uprightOnce = true;
    return;
  }
  if (writer.uprightFrom < 0) writer.uprightFrom = writer.braces.length;
  if (after !== '^' && after !== '_' && writer.pending === 0) writer.dropBrace();
}

/** `\mathbb{1}`, `\mathbf 1`, `\mathbb{I}`: the identity operator. */
function readIdentity(writer: TokenWriter, length: number): boolean {
  const end = scanIdentity(writer.source, writer.position + length);
  if (end < 0) return false;
  writer.add('identity', '1', end - writer.position);
  writer.hat = false;
  return true;
}

function readEnvironment(writer: TokenWriter, name: 'begin' | 'end', length: number): void {
  const environment = scanEnvironment(writer.source, writer.position + length, name === 'begin');
  if (environment === null) {
    writer.fail('unknown-command', length, 'Only matrices are read here.', 'Write \\begin{pmatrix} … \\end{pmatrix}.');
    return;
  }
  writer.add(name === 'begin' ? 'begin' : 'end-environment', environment.name, environment.end - writer.position);
}

function readStates(writer: TokenWriter, name: string, length: number): void {
  const states = scanStates(writer.source, writer.position + length, name);
  if (states === null) {
    writer.fail('ket-unclosed', length, `The command \\${name} needs its label in braces.`, 'Write \\ket{+}.');
    return;
  }
  for (const { kind, label, end } of states) {
    const state = stateLabels.get(label) ?? null;
    writer.add(state === null ? 'named-ket' : kind, label, end - writer.position).state = state;
  }
}
