import { type Piece } from './formula-pieces';
import { type TypesetValue, type TypesetValues } from './typeset-value';

/**
 * What a sum is made of, one level of brackets at a time. `factor` is anything that a factor 1 may be left out before;
 * `unit` is upright text, before which a number always stays; `operator` is a written product sign, `over` a slash.
 */
export type Item =
  | { readonly item: 'slot'; readonly text: string; readonly value: TypesetValue }
  | {
      readonly item: 'space' | 'sign' | 'factor' | 'function' | 'unit' | 'operator' | 'over' | 'script';
      readonly text: string;
    };

type Render = (pieces: readonly Piece[], values: TypesetValues) => string;

/** How many arguments in braces a command takes. */
const argumentCounts: ReadonlyMap<string, number> = new Map([
  ...['frac', 'dfrac', 'tfrac', 'binom'].map((name) => [name, 2] as const),
  ...['sqrt', 'vec', 'hat', 'bar', 'tilde', 'dot', 'ddot', 'overline', 'underline', 'boldsymbol', 'ket', 'bra'].map(
    (name) => [name, 1] as const,
  ),
  ...['text', 'textrm', 'mathrm', 'mathsf', 'operatorname', 'mathbf', 'mathbb', 'mathcal', 'mathit'].map(
    (name) => [name, 1] as const,
  ),
]);

const functions = new Set(
  'sin cos tan sec csc cot sinh cosh tanh exp ln log arcsin arccos arctan det Re Im operatorname'.split(' '),
);
const products = new Set(['cdot', 'times', 'ast']);
const upright = new Set(['text', 'textrm', 'mathrm', 'mathsf']);

/** Groups pieces into items: a command with its arguments, an exponent or index with its sign, a bracket as a whole. */
export function itemsOf(pieces: readonly Piece[], values: TypesetValues, render: Render): Item[] {
  const items: Item[] = [];
  let at = 0;
  const group = (piece: Piece): string => {
    if (piece.piece === 'group') return piece.open + render(piece.inside, values) + piece.close;
    if (piece.piece !== 'slot') return piece.text;
    const value = values(piece.name);
    return value === undefined ? piece.text : `{${value.latex}}`;
  };
  const takeArgument = (): string => {
    let text = '';
    for (let piece = pieces[at]; piece !== undefined; piece = pieces[at]) {
      at += 1;
      text += group(piece);
      if (piece.piece !== 'space') break;
    }
    return text;
  };
  while (at < pieces.length) {
    const piece = pieces[at]!;
    at += 1;
    if (piece.piece === 'command') {
      const name = piece.text.slice(1);
      let text = piece.text;
      const next = pieces[at];
      if (name === 'sqrt' && next?.piece === 'group' && next.open === '[') text += takeArgument();
      for (let count = argumentCounts.get(name) ?? 0; count > 0; count -= 1) text += takeArgument();
      items.push({ item: roleOf(name, text), text });
    } else if (piece.piece === 'script') {
      items.push({ item: 'script', text: piece.text + takeArgument() });
    } else items.push(itemOf(piece, values, group));
  }
  return items;
}

function itemOf(piece: Piece, values: TypesetValues, group: (piece: Piece) => string): Item {
  switch (piece.piece) {
    case 'slot': {
      const value = values(piece.name);
      return value === undefined ? { item: 'factor', text: piece.text } : { item: 'slot', text: piece.text, value };
    }
    case 'space':
    case 'sign':
      return { item: piece.piece, text: piece.text };
    case 'character':
      if (piece.text === '/') return { item: 'over', text: piece.text };
      if (piece.text === '*') return { item: 'operator', text: piece.text };
      return { item: /^[!.'?]$/.test(piece.text) ? 'unit' : 'factor', text: piece.text };
    default:
      return { item: 'factor', text: group(piece) };
  }
}

function roleOf(name: string, text: string): Exclude<Item['item'], 'slot'> {
  if (products.has(name)) return 'operator';
  if (functions.has(name)) return 'function';
  // An upright i or e is a constant; other upright text is a unit or a word.
  if (upright.has(name)) return /\{\s*[ie]\s*\}$/.test(text) ? 'factor' : 'unit';
  if (/^(ldots|cdots|dots|%|#|\$|circ|degree)$/.test(name)) return 'unit';
  return 'factor';
}
