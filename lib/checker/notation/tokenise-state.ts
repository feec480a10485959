/** Bars and angles to tokens: kets and bras where a label makes them so. */
import { closingAngle, followingBar, readLabel, skipBlank } from './source';
import { type TokenWriter } from './token-writer';
import { stateLabels } from './vocabulary';

/** `ket(+)` and `bra(+)`. */
export function readNamedState(writer: TokenWriter, kind: 'ket' | 'bra', from: number): boolean {
  const open = skipBlank(writer.source, from);
  if (writer.source.charAt(open) !== '(') return false;
  const label = readLabel(writer.source, open + 1);
  const state = stateLabels.get(label.text);
  const close = skipBlank(writer.source, label.end);
  if (state === undefined || writer.source.charAt(close) !== ')') return false;
  writer.add(kind, label.text, close + 1 - writer.position).state = state;
  return true;
}

/** A bar opens a ket only where a label and a closing angle follow. */
export function readBar(writer: TokenWriter, length: number, opens = false, closes = false): void {
  if (writer.options.kets && !closes && readKet(writer, length)) return;
  writer.add(opens ? 'bar-open' : closes ? 'bar-close' : 'bar', '|', length);
}

function readKet(writer: TokenWriter, length: number): boolean {
  const label = readLabel(writer.source, writer.position + length);
  const end = label.text === '' ? -1 : closingAngle(writer.source, label.end);
  if (end < 0) return false;
  const state = stateLabels.get(label.text) ?? null;
  writer.add(state === null ? 'named-ket' : 'ket', label.text, end - writer.position).state = state;
  return true;
}

/** An opening angle makes a bra where a label and a bar follow; a ket that shares the bar may come after it. */
export function readAngle(writer: TokenWriter, length: number): void {
  const { source } = writer;
  if (!writer.options.kets) {
    const equal = source.charAt(writer.position + length) === '=';
    writer.add(equal ? '<=' : '<', '<', equal ? length + 1 : length);
    return;
  }
  const label = readLabel(source, writer.position + length);
  const end = label.text === '' ? -1 : followingBar(source, label.end);
  if (end < 0) {
    writer.add('<', '⟨', length);
    return;
  }
  const state = stateLabels.get(label.text) ?? null;
  writer.add(state === null ? 'named-ket' : 'bra', label.text, end - writer.position).state = state;
  readKet(writer, 0);
}
