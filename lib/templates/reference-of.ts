import { type CheckOptions, type CheckRequest, type SymbolDomain, type SymbolTable } from '@/lib/checker/contract';
import { type DrawnValues, type Part, type TemplateContent } from './content';
import { printAnswer } from './print-expression';
import { readWithValues, readyValues, type ReadResult, type ReadyValues } from './read-text';

/** A check without its answer: what a part of one draw is compared with, as plain data in the check contract. */
export type PartCheck = Required<Omit<CheckRequest, 'id' | 'answer'>>;

/**
 * The check of one part of a draw, or what of the template stands in its way, in words; `place` is the field of the part
 * (`reference`, `expected.0.expression`).
 */
export type ReferenceResult =
  | { readonly ok: true; readonly check: PartCheck }
  | { readonly ok: false; readonly error: string; readonly place: string };

/** What of a template a reference depends on. */
export type Referable = Pick<TemplateContent, 'symbols' | 'parts'>;

/**
 * The reference of one part for drawn values: the author's computation with every parameter replaced by its value, in
 * the answer language, with the symbols and options it is checked under and the author's expected wrong answers among
 * the options. Nothing is worked out here; the checker does that. A part that is not in the template is an error, too.
 */
export function referenceOf(content: Referable, partKey: string, values: DrawnValues): ReferenceResult {
  const part = content.parts.find((candidate) => candidate.key === partKey);
  if (part === undefined) return fault('key', `The template has no part ${partKey}.`);
  const ready = readyValues(values, content.symbols);
  if (!ready.ok) return fault('reference', ready.error);
  const reference = textOf(part.reference, part, ready.tree);
  if (!reference.ok) return fault('reference', reference.error);
  const slips = [];
  for (const [index, wrong] of part.expected.entries()) {
    const expression = textOf(wrong.expression, part, ready.tree);
    if (!expression.ok) return fault(`expected.${index}.expression`, expression.error);
    slips.push({ id: wrong.id, expression: expression.tree });
  }
  const symbols = drawnSymbols(content, ready.tree);
  if (!symbols.ok) return fault('reference', symbols.error);
  return {
    ok: true,
    check: {
      kind: part.kind,
      reference: reference.tree,
      symbols: symbols.tree,
      options: { ...optionsOf(part), ...(slips.length > 0 ? { slips } : {}) },
    },
  };
}

function fault(place: string, error: string): ReferenceResult {
  return { ok: false, place, error };
}

/** The options of the check contract that the author set; what is not set is left out. */
export function optionsOf(part: Pick<Part, 'options'>): CheckOptions {
  return Object.fromEntries(Object.entries(part.options).filter(([, value]) => value !== undefined));
}

function textOf(text: string, part: Part, ready: ReadyValues): ReadResult<string> {
  if (part.kind === 'choice') return { ok: true, tree: text.trim() };
  const read = readWithValues(text, part.kind, ready, part.options.choices);
  return read.ok ? { ok: true, tree: printAnswer(read.tree) } : read;
}

/** The symbols of a draw with their domains: what the reader of an answer needs. An interval that cannot be read is real. */
export function symbolsOfDraw(content: Pick<TemplateContent, 'symbols'>, values: DrawnValues): SymbolTable {
  const ready = readyValues(values, content.symbols);
  const drawn = ready.ok ? drawnSymbols(content, ready.tree) : ready;
  return drawn.ok ? drawn.tree : Object.fromEntries(content.symbols.map(({ name }) => [name, 'real']));
}

/** The symbols with their domains; the ends of an interval may hold parameters. */
function drawnSymbols(
  content: Pick<TemplateContent, 'symbols'>,
  ready: ReadyValues,
): ReadResult<Record<string, SymbolDomain>> {
  const symbols: Record<string, SymbolDomain> = {};
  for (const { name, domain } of content.symbols) {
    if (typeof domain === 'string') {
      symbols[name] = domain;
      continue;
    }
    const ends: string[] = [];
    for (const end of domain.between) {
      const read = readWithValues(end, 'scalar', ready);
      if (!read.ok) return { ok: false, error: `The interval of ${name}: ${read.error}` };
      ends.push(printAnswer(read.tree));
    }
    symbols[name] = { between: [ends[0]!, ends[1]!] };
  }
  return { ok: true, tree: symbols };
}
