import { type AnswerKind, type AnswerTree, type Condition, type Symbols } from '@/lib/checker/notation/answer-tree';
import { type Diagnostic, isFatal } from '@/lib/checker/diagnostics';
import { parse, parseCondition } from '@/lib/checker/notation/parse';
import { type Expression } from '@/lib/checker/notation/tree';
import { type DrawnValues, type TemplateContent } from './content';
import { printExpression } from './print-expression';
import { substitute, substituteAnswer, type Replacements } from './substitute';

/** What was read, or the first thing wrong with it as a sentence. */
export type ReadResult<Tree> =
  { readonly ok: true; readonly tree: Tree } | { readonly ok: false; readonly error: string };

/** What a drawn value is: a number or formula, an operator, or a state. */
export type ValueKind = 'scalar' | 'operator' | 'state';

/** The symbols of a template as the reader wants them. */
export type SymbolList = TemplateContent['symbols'];

/** Reads an expression that an author wrote, with the reference functions, in the given kind. */
export function readText(
  text: string,
  kind: AnswerKind,
  symbols: Symbols,
  choices?: readonly string[],
): ReadResult<AnswerTree> {
  const { tree, diagnostics } = parse(text, { kind, symbols, options: { choices }, allowReferenceFunctions: true });
  return tree === null ? { ok: false, error: firstFault(diagnostics) } : { ok: true, tree };
}

/** The symbols of a template as a table for the reader. */
export function symbolTable(symbols: SymbolList): Symbols {
  return Object.fromEntries(symbols.map((symbol) => [symbol.name, symbol.domain]));
}

/** Reads one value of a parameter: as a scalar, else as an operator, else as a state. */
export function readValue(text: string, symbols: SymbolList): ReadResult<Expression> & { kind?: ValueKind } {
  const table = symbolTable(symbols);
  let first: string | null = null;
  for (const kind of ['scalar', 'operator', 'state'] as const) {
    const read = readText(text, kind, table);
    if (read.ok && isExpression(read.tree)) return { ok: true, tree: read.tree, kind };
    if (!read.ok) first ??= read.error;
  }
  return { ok: false, error: first ?? 'This is no value.' };
}

/** Drawn values made ready to be put in the place of their names. */
export interface ReadyValues {
  /** Symbols and scalar parameters: what the reader may meet. */
  readonly table: Symbols;
  readonly scalars: Replacements;
  /** Operators and states, which the reader cannot carry as symbols: their text goes in before reading. */
  readonly texts: ReadonlyMap<string, string>;
}

/** Reads every drawn value; an error names the parameter. */
export function readyValues(values: DrawnValues, symbols: SymbolList): ReadResult<ReadyValues> {
  const scalars = new Map<string, Expression>();
  const texts = new Map<string, string>();
  const table: Record<string, Symbols[string]> = { ...symbolTable(symbols) };
  for (const [name, text] of Object.entries(values)) {
    const read = readValue(text, symbols);
    if (!read.ok) return { ok: false, error: `The value “${text}” of ${name} cannot be read: ${read.error}` };
    if (read.kind === 'scalar') {
      scalars.set(name, read.tree);
      table[name] = 'real';
    } else texts.set(name, text);
  }
  return { ok: true, tree: { table, scalars, texts } };
}

/** Reads an author's expression and puts the drawn values in the place of their names. */
export function readWithValues(
  text: string,
  kind: AnswerKind,
  ready: ReadyValues,
  choices?: readonly string[],
): ReadResult<AnswerTree> {
  // A quantity is read without symbols, so there numbers go in as text, too.
  const given = kind === 'quantity' ? withScalarTexts(text, ready) : text;
  const read = readText(withTexts(given, ready.texts), kind, ready.table, choices);
  return read.ok ? { ok: true, tree: substituteAnswer(read.tree, ready.scalars) } : read;
}

/** Reads a condition and puts the drawn values in the place of their names. */
export function readCondition(text: string, ready: ReadyValues): ReadResult<Condition> {
  const { tree, diagnostics } = parseCondition(withTexts(text, ready.texts), {
    symbols: ready.table,
    allowReferenceFunctions: true,
  });
  if (tree === null) return { ok: false, error: firstFault(diagnostics) };
  return { ok: true, tree: mapCondition(tree, (operand) => substitute(operand, ready.scalars)) };
}

/** Whether a whole answer is one expression. */
export function isExpression(tree: AnswerTree): tree is Expression {
  return tree.node !== 'values' && tree.node !== 'pairs' && tree.node !== 'quantity' && tree.node !== 'choice';
}

function mapCondition(condition: Condition, change: (operand: Expression) => Expression): Condition {
  switch (condition.node) {
    case 'comparison':
      return { ...condition, operands: condition.operands.map(change) };
    case 'not':
      return { ...condition, body: mapCondition(condition.body, change) };
    case 'and':
    case 'or':
      return { ...condition, parts: condition.parts.map((part) => mapCondition(part, change)) };
  }
}

/** Puts texts in the place of whole names: no letter, digit, underscore or backslash stands beside them. */
function withTexts(text: string, texts: ReadonlyMap<string, string>): string {
  if (texts.size === 0) return text;
  return text.replace(/(?<![A-Za-z0-9_\\])[A-Za-z][A-Za-z0-9]*(?:_[A-Za-z0-9]+)?(?![A-Za-z0-9_])/g, (name) => {
    const value = texts.get(name);
    if (value === undefined) return name;
    return /^[A-Za-z_]+$|^\|[^|<>]+>$/.test(value) ? value : `(${value})`;
  });
}

function withScalarTexts(text: string, ready: ReadyValues): string {
  const texts = [...ready.scalars].map(([name, tree]) => [name, printExpression(tree)] as const);
  return withTexts(text, new Map(texts));
}

function firstFault(diagnostics: readonly Diagnostic[]): string {
  const fault = diagnostics.find(isFatal);
  if (fault === undefined) return 'This cannot be read.';
  return fault.hint === undefined ? fault.message : `${fault.message} ${fault.hint}`;
}
