import { piecesOf, type Piece } from './formula-pieces';
import { itemsOf, type Item } from './formula-items';
import { type TypesetValue, type TypesetValues } from './typeset-value';

/**
 * Sets drawn values into a TeX formula so that it reads as if written by hand: signs merge (`a + {{n}} b` with n = −3 is
 * a − 3b), a factor 1 is left out, a term that is zero falls away, and a negative value behind a factor or under a power
 * is bracketed. Terms without a drawn value, and names without a value, stay as they are.
 */
export function typesetFormula(formula: string, values: TypesetValues): string {
  return renderPieces(piecesOf(formula), values);
}

function renderPieces(pieces: readonly Piece[], values: TypesetValues): string {
  let text = '';
  let segment: Piece[] = [];
  const flush = () => {
    text += renderSegment(itemsOf(segment, values, renderPieces));
    segment = [];
  };
  for (const piece of pieces) {
    if (piece.piece === 'boundary') {
      flush();
      text += piece.text;
    } else segment.push(piece);
  }
  flush();
  return text;
}

type Term = { sign: '' | '+' | '-'; items: Item[] };

/** A segment is a sum of signed terms: what stands between two relation signs, commas or brackets. */
function renderSegment(items: readonly Item[]): string {
  if (!items.some((item) => item.item === 'slot')) return items.map((item) => item.text).join('');
  const { lead, terms } = termsOf(items);
  const rendered = terms.map(renderTerm);
  const kept = rendered.filter((term) => term !== null);
  if (kept.length === 0) return `${lead}0`;
  // A plus sign at the very beginning stays only where the author wrote it there.
  const plusIsWritten = terms[0]?.sign === '+' && rendered[0] !== null;
  const texts = kept.map((term, index) =>
    index === 0 && term.sign === '+' && !plusIsWritten ? term.body.trimStart() : term.sign + term.body,
  );
  return lead + texts.join('');
}

function termsOf(items: readonly Item[]): { lead: string; terms: Term[] } {
  const terms: Term[] = [];
  let current: Term = { sign: '', items: [] };
  const start = items.findIndex((item) => item.item !== 'space');
  const lead = items
    .slice(0, start)
    .map((space) => space.text)
    .join('');
  let before: Item | undefined;
  for (const item of items.slice(start)) {
    if (item.item === 'sign' && before?.item !== 'operator' && before?.item !== 'over') {
      if (before !== undefined) terms.push(current);
      current = { sign: item.text === '-' ? '-' : '+', items: [] };
    } else current.items.push(item);
    if (item.item !== 'space') before = item;
  }
  return { lead, terms: [...terms, current] };
}

/** One term with its values set in; null when it is zero. */
function renderTerm(term: Term): { sign: string; body: string } | null {
  const solid = term.items.filter((item) => item.item !== 'space');
  if (solid.some((item, index) => makesZero(item, solid[index - 1], solid[index + 1]))) return null;
  let sign = term.sign;
  let body = '';
  let closeAtEnd = '';
  // After a factor 1 that is left out, the blanks and the product sign behind it are left out, too.
  let leftOut = false;
  for (const item of term.items) {
    const place = solid.indexOf(item);
    if (item.item !== 'slot') {
      if (leftOut && (item.item === 'space' || item.item === 'operator')) continue;
      leftOut = false;
      body = joined(body, item.text);
      continue;
    }
    const before = solid[place - 1];
    const after = solid[place + 1];
    if (before === undefined) {
      const first = renderFirst(item.value, sign, after);
      sign = first.sign;
      body = joined(body, first.text);
      leftOut = first.text === '';
    } else if (before.item === 'function' && (item.value.negative || item.value.isSum)) {
      const bare = item.value.isOne && after?.item === 'factor' ? '-' : item.value.latex;
      body = joined(body, `\\left(${bare}`);
      closeAtEnd += '\\right)';
    } else body = joined(body, renderLater(item.value, before, after));
  }
  return { sign, body: body + closeAtEnd };
}

function makesZero(item: Item, before: Item | undefined, after: Item | undefined): boolean {
  if (item.item !== 'slot' || !item.value.isZero) return false;
  if (before?.item === 'over' || before?.item === 'function') return false;
  return after?.item !== 'script' && after?.item !== 'unit';
}

/** A value that begins its term: its sign becomes the term's. */
function renderFirst(
  value: TypesetValue,
  sign: Term['sign'],
  after: Item | undefined,
): { sign: Term['sign']; text: string } {
  if (after?.item === 'script') return { sign, text: asBase(value) };
  if (value.isSum) {
    return { sign, text: after === undefined && sign === '' ? value.latex : bracketed(value.latex) };
  }
  const merged = value.negative ? (sign === '-' ? '+' : '-') : sign;
  if (value.isOne && (after?.item === 'factor' || after?.item === 'function' || after?.item === 'operator')) {
    return { sign: merged, text: '' };
  }
  return { sign: merged, text: value.magnitude + dotBetween(value.magnitude, after) };
}

/** A value behind another factor. */
function renderLater(value: TypesetValue, before: Item, after: Item | undefined): string {
  if (after?.item === 'script') return asBase(value);
  if (value.negative || value.isSum) return bracketed(value.latex);
  if (before.item === 'over' && /[/\\]/.test(value.magnitude)) return bracketed(value.latex);
  if (value.isOne && before.item === 'factor') return '';
  const dot = before.item === 'factor' && startsLikeNumber(value.magnitude) ? '\\cdot ' : '';
  return dot + value.magnitude + dotBetween(value.magnitude, after);
}

/** A value that carries an exponent. */
function asBase(value: TypesetValue): string {
  return /^(\d+|[A-Za-z]|\\[A-Za-z]+ ?)$/.test(value.latex) ? value.latex : bracketed(value.latex);
}

function bracketed(latex: string): string {
  return `\\left(${latex}\\right)`;
}

function startsLikeNumber(latex: string): boolean {
  return /^(\d|\\[td]?frac)/.test(latex);
}

/** Two numbers side by side need a dot. */
function dotBetween(latex: string, after: Item | undefined): string {
  if (after?.item !== 'factor' || !startsLikeNumber(after.text)) return '';
  return /\d/.test(latex) ? '\\cdot ' : '';
}

/** A command needs a blank before a letter. */
function joined(left: string, right: string): string {
  return /\\[A-Za-z]+$/.test(left) && /^[A-Za-z]/.test(right) ? `${left} ${right}` : left + right;
}
