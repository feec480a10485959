/** The pieces of a TeX formula, as far as setting drawn values into it needs to know them. */

/** One token, as it was written. `slot` is a place for a drawn value, `script` is ^ or _. */
export interface TokenPiece {
  readonly piece: 'space' | 'sign' | 'boundary' | 'script' | 'command' | 'number' | 'character';
  readonly text: string;
}

export interface SlotPiece {
  readonly piece: 'slot';
  readonly text: string;
  readonly name: string;
}

/** What stands between two brackets, braces or the two ends of an environment; `close` is empty where none came. */
export interface GroupPiece {
  readonly piece: 'group';
  readonly open: string;
  readonly inside: readonly Piece[];
  readonly close: string;
}

export type Piece = TokenPiece | SlotPiece | GroupPiece;

/** A place for a drawn value, in prose and in formulas: two braces around a parameter's name. */
export const slotPattern = /\{\{\s*([^{}]*?)\s*\}\}/;

/** Splits a formula into nested pieces; joining their texts gives the formula back, whatever it is. */
export function piecesOf(formula: string): Piece[] {
  const tokens = tokenise(formula);
  let at = 0;
  const read = (depth: number): { pieces: Piece[]; close: string } => {
    const pieces: Piece[] = [];
    for (let token = tokens[at]; token !== undefined; token = tokens[at]) {
      at += 1;
      if (token.kind === 'open' && depth < MAX_DEPTH) {
        const group = read(depth + 1);
        pieces.push({ piece: 'group', open: token.text, inside: group.pieces, close: group.close });
      } else if (token.kind === 'open') {
        pieces.push({ piece: 'boundary', text: token.text });
      } else if (token.kind === 'close') {
        if (depth > 0) return { pieces, close: token.text };
        pieces.push({ piece: 'boundary', text: token.text });
      } else if (token.kind === 'slot') {
        pieces.push({ piece: 'slot', text: token.text, name: token.name });
      } else {
        pieces.push({ piece: token.kind, text: token.text });
      }
    }
    return { pieces, close: '' };
  };
  return read(0).pieces;
}

/** Deeper brackets are taken as they stand; no formula that can be read is nested as deep. */
const MAX_DEPTH = 100;

type Token =
  | { kind: TokenPiece['piece'] | 'open' | 'close'; text: string; name?: undefined }
  | { kind: 'slot'; text: string; name: string };

const delimiter = String.raw`(?:\\[A-Za-z]+|\\[{}|]|[()[\]|.<>/])`;

/** First that fits, at the place where the last one ended. A ket or bra with a written label is one character. */
const rules: readonly (readonly [Token['kind'], RegExp])[] = [
  ['slot', new RegExp(slotPattern.source, 'y')],
  ['open', new RegExp(String.raw`\\(?:left|[bB]igg?l)\s*${delimiter}|\\begin\s*\{[a-zA-Z]+\*?\}(?:\{[clr|]*\})?`, 'y')],
  ['close', new RegExp(String.raw`\\(?:right|[bB]igg?r)\s*${delimiter}|\\end\s*\{[a-zA-Z]+\*?\}`, 'y')],
  ['character', /\|[^|{}&$]{0,20}?\\rangle(?![A-Za-z])|\\langle\s*[^|{}&$]{0,20}?\|/y],
  ['boundary', /\\\\(?:\[[^\]]*\])?|[&,;:=<>|]|\\(?:[lr]angle|[lr]?[vV]ert)(?![A-Za-z])|\\\|/y],
  ['space', /\\[,;:! ]|\\q?quad(?![A-Za-z])|[\s~]+/y],
  ['boundary', /\\(?:[lg]eq?|neq?|approx|sim|equiv|to|in|pm|mp|propto|implies|Rightarrow)(?![A-Za-z])/y],
  ['open', /\\\{|[{([]/y],
  ['close', /\\\}|[})\]]/y],
  ['command', /\\(?:[A-Za-z]+|.)/sy],
  ['sign', /[+-]/y],
  ['script', /[\^_]/y],
  ['number', /\d+(?:\.\d+)?/y],
  ['character', /[\s\S]/uy],
];

function tokenise(formula: string): Token[] {
  const tokens: Token[] = [];
  for (let at = 0; at < formula.length;) {
    const token = tokenAt(formula, at);
    tokens.push(token);
    at += token.text.length;
  }
  return tokens;
}

function tokenAt(formula: string, at: number): Token {
  for (const [kind, rule] of rules) {
    rule.lastIndex = at;
    const match = rule.exec(formula);
    if (match === null || match[0] === '') continue;
    return kind === 'slot' ? { kind, text: match[0], name: match[1] ?? '' } : { kind, text: match[0] };
  }
  return { kind: 'character', text: formula.charAt(at) };
}
