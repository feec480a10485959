/** Pairing of the bars that are no part of a ket or bra. */
import { type Diagnostic } from '../diagnostics';
import { maximumDepth } from './limits';
import { isSign } from './parse-sign';
import { endsOperand, nesting, startsOperand } from './starts';
import { type Token, type TokenKind } from './token';

/**
 * Turns every bar into an opening or a closing one, in place. Bars pair inside one bracket and one entry. Where two
 * pairings are possible, or none, that is the problem returned. Linear in the number of tokens.
 */
export function pairBars(tokens: readonly Token[]): Diagnostic | null {
  if (!tokens.some(({ kind }) => kind === 'bar')) return null;
  const levels: number[][] = [[]];
  const resolve = (): Diagnostic | null => {
    const bars = levels[levels.length - 1] ?? [];
    levels[levels.length - 1] = [];
    return bars.length === 0 ? null : pair(tokens, bars);
  };
  for (let index = 0; index < tokens.length; index += 1) {
    const token = tokens[index];
    if (token === undefined) break;
    if (token.kind === 'bar') levels[levels.length - 1]?.push(index);
    const depth = nesting(token);
    if (depth > 0) levels.push([]);
    if (depth >= 0 && !separators.has(token.kind)) continue;
    const problem = resolve();
    if (problem) return problem;
    if (depth < 0 && levels.length > 1) levels.pop();
  }
  for (const bars of levels) {
    const problem = bars.length === 0 ? null : pair(tokens, bars);
    if (problem) return problem;
  }
  return null;
}

/** Tokens that end an entry: bars on their two sides do not pair. */
const separators: ReadonlySet<TokenKind> = new Set([
  ',',
  ';',
  ':',
  '=',
  '!=',
  '<',
  '<=',
  '>',
  '>=',
  '&',
  'row',
  'and',
  'or',
  'not',
  'end',
]);

/**
 * Counts the pairings, up to two. A bar can close after an operand and open before one; an opening bar directly before a
 * closing one would hold nothing.
 */
function pair(tokens: readonly Token[], bars: readonly number[]): Diagnostic | null {
  const count = bars.length;
  if (count % 2 === 1) return unpaired(tokens, bars);
  const deepest = Math.min(count / 2, maximumDepth);
  const width = (deepest + 1) * 2;
  /** ways[bar][depth][whether the bar before opened], at most 2 each. */
  const ways = new Uint8Array((count + 1) * width);
  ways[count * width] = 1;
  ways[count * width + 1] = 1;
  const sides = bars.map((index) => sidesOf(tokens, index));
  for (let bar = count - 1; bar >= 0; bar -= 1) {
    const { opens, closes, afterBar } = sides[bar] ?? noSides;
    for (let depth = 0; depth <= deepest; depth += 1) {
      const open = opens && depth < deepest ? (ways[(bar + 1) * width + (depth + 1) * 2 + 1] ?? 0) : 0;
      const close = depth > 0 ? (ways[(bar + 1) * width + (depth - 1) * 2] ?? 0) : 0;
      ways[bar * width + depth * 2] = Math.min(2, open + (closes || afterBar ? close : 0));
      ways[bar * width + depth * 2 + 1] = Math.min(2, open + (closes ? close : 0));
    }
  }
  if (ways[0] === 0) return unpaired(tokens, bars);
  if (ways[0] === 2) {
    const message = 'These bars can be paired in two ways.';
    return { code: 'bars', span: spanOf(tokens, bars), message, hint: 'Write abs( ) for absolute values.' };
  }
  let depth = 0;
  for (let bar = 0; bar < count; bar += 1) {
    const token = tokens[bars[bar] ?? 0];
    const opens = sides[bar]?.opens === true && depth < deepest;
    const open = opens && (ways[(bar + 1) * width + (depth + 1) * 2 + 1] ?? 0) > 0;
    if (token) token.kind = open ? 'bar-open' : 'bar-close';
    depth += open ? 1 : -1;
  }
  return null;
}

/** What a bar may do: open before an operand, close after one, or close after a bar that closes. */
interface Sides {
  readonly opens: boolean;
  readonly closes: boolean;
  readonly afterBar: boolean;
}

const noSides: Sides = { opens: false, closes: false, afterBar: false };

function sidesOf(tokens: readonly Token[], index: number): Sides {
  const next = tokens[index + 1];
  const before = tokens[index - 1];
  const opens = next !== undefined && (next.kind === 'bar' || startsOperand(next) || isSign(next));
  const starred = before?.kind === '*' && tokens[index - 2]?.kind === '^';
  return { opens, closes: starred || endsOperand(before), afterBar: before?.kind === 'bar' };
}

function unpaired(tokens: readonly Token[], bars: readonly number[]): Diagnostic {
  for (const index of bars) {
    const token = tokens[index];
    const label = tokens[index + 1];
    const after = tokens[index + 2];
    if (token === undefined || label === undefined || after === undefined) continue;
    if ((label.kind === '+' || label.kind === '-' || label.kind === 'arrow') && !startsOperand(after)) {
      const span = { start: token.start, end: label.end };
      return { code: 'ket-unclosed', span, message: 'This ket is not closed.', hint: `Write |${label.text}>.` };
    }
  }
  const message = 'A bar here has no partner.';
  return {
    code: 'bars',
    span: spanOf(tokens, bars),
    message,
    hint: 'A ket is written |+>, an absolute value abs( ) or | |.',
  };
}

function spanOf(tokens: readonly Token[], bars: readonly number[]): { start: number; end: number } {
  const first = tokens[bars[0] ?? 0];
  const last = tokens[bars[bars.length - 1] ?? 0];
  return { start: first?.start ?? 0, end: last?.end ?? 0 };
}
