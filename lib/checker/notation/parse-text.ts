/** From text to tree, in every common reading, by a given grammar. */
import { type Diagnostic, type Span } from '../diagnostics';
import { type AnswerKind, type ParseResult, type ReadingContext } from './answer-tree';
import { pairBars } from './bars';
import { choices, Cursor, type Grammar } from './cursor';
import { findDecimalComma } from './decimal-comma';
import { maximumLength } from './limits';
import { parseAnswer } from './parse-answer';
import { parseChoice } from './parse-choice';
import { parsePower } from './parse-power';
import { parsePrimary } from './parse-primary';
import { parseQuantity, unitStart } from './parse-quantity';
import { parseSum } from './parse-sum';
import { otherReadings, type Reading } from './readings';
import { buildScope, checkNames, type Scope } from './scope';
import { type Token } from './token';
import { tokenise } from './tokenise';
import { resolveWords } from './words';

/** The grammar of answers, without reference functions. */
export const answerGrammar: Grammar = { sum: parseSum, power: parsePower, primary: parsePrimary, reference: null };

const noOne = { tree: null, ambiguous: false, alternatives: [] } as const;

/** Reads a text as an answer of the context's kind. Never throws. */
export function parseText(grammar: Grammar, text: string, context: ReadingContext): ParseResult {
  const refused = refuseLength(text);
  if (refused) return { ...noOne, diagnostics: [refused] };
  if (context.kind === 'choice') return { ...noOne, ...parseChoice(text, context.options?.choices ?? []) };
  const { scope, problems } = scopeOf(context);
  if (problems) return { ...noOne, diagnostics: problems };
  const prepared = prepare(text, context, scope, false);
  const first = readPrepared(grammar, prepared, context.kind, scope, 0);
  if (first.tree === null) return { ...noOne, diagnostics: first.problem ? [first.problem] : [] };
  if (first.met === 0) return { tree: first.tree, diagnostics: [], ambiguous: false, alternatives: [] };
  const again = (taken: number): Reading => {
    const other = (taken & choices.split) !== 0;
    const source = other ? prepare(text, context, scope, true) : prepared;
    return readPrepared(grammar, source, context.kind, scope, taken);
  };
  const { alternatives, diagnostic } = otherReadings(first, first.tree, again);
  return {
    tree: first.tree,
    diagnostics: diagnostic ? [diagnostic] : [],
    ambiguous: alternatives.length > 0,
    alternatives,
  };
}

/** A text beyond the length limit. */
export function refuseLength(text: string): Diagnostic | null {
  if (text.length <= maximumLength) return null;
  let length = 0;
  for (let index = 0; index < text.length && length <= maximumLength; length += 1) {
    index += (text.codePointAt(index) ?? 0) > 0xffff ? 2 : 1;
  }
  if (length <= maximumLength) return null;
  const message = `An answer has at most ${maximumLength} characters.`;
  return { code: 'too-long', span: { start: maximumLength, end: maximumLength }, message };
}

/** The names of a context, and those that may not be declared. */
export function scopeOf(context: ReadingContext): {
  readonly scope: Scope;
  readonly problems: readonly Diagnostic[] | null;
} {
  const names = context.kind === 'quantity' ? [] : Object.keys(context.symbols);
  if (context.options?.definitions) names.push(...Object.keys(context.options.definitions));
  const scope = buildScope(names, context.allowReferenceFunctions === true);
  if (scope.sound) return { scope, problems: null };
  const nowhere = { start: 0, end: 0 };
  return { scope, problems: checkNames(names).map((problem) => ({ ...problem, span: nowhere })) };
}

/** A text ready to be parsed: names resolved, bars paired, the unit of a quantity last. */
interface Prepared {
  readonly tokens: readonly Token[];
  readonly problem: Diagnostic | null;
  /** Where the expression ends, and where the unit after it does. */
  readonly end: number;
  readonly unitEnd: number;
  /** Where letters or a number could be split in another way. */
  readonly doubtful: Span | null;
}

/** The tokens of a text; with `other`, letters and numbers that could be split in two ways are split the other way. */
function prepare(text: string, { kind }: ReadingContext, scope: Scope, other: boolean): Prepared {
  const { tokens, problem, lowerExponentUsed } = tokenise(text, {
    kets: true,
    plusMinus: kind === 'eigenvalues' || kind === 'eigenpairs',
    lowerExponent: !(other && scope.declaresE),
    upperExponent: !scope.declaresCapitalE,
  });
  const comma = kind === 'scalar' || kind === 'quantity' ? findDecimalComma(tokens) : null;
  const first = problem ?? comma;
  if (first) return { tokens, problem: first, end: 0, unitEnd: 0, doubtful: null };
  const whole = { start: 0, end: tokens[tokens.length - 1]?.end ?? 0 };
  const unit = kind === 'quantity' ? takeUnit(tokens) : [];
  const words = resolveWords(tokens, scope, other);
  const bars = pairBars(words.tokens);
  const end = words.tokens.length - 1;
  if (unit.length > 0) words.tokens.splice(end, 0, ...unit);
  const doubtful = words.ambiguous ?? (lowerExponentUsed && scope.declaresE ? whole : null);
  return { tokens: words.tokens, problem: bars, end, unitEnd: end + unit.length, doubtful };
}

/** One reading of prepared tokens, with the other side taken of the given choices. */
function readPrepared(grammar: Grammar, prepared: Prepared, kind: AnswerKind, scope: Scope, taken: number): Reading {
  const { tokens, problem, end, unitEnd, doubtful } = prepared;
  if (problem) return { tree: null, problem, met: 0, places: null };
  const cursor = new Cursor(tokens, scope, grammar, taken);
  const tree = kind === 'quantity' ? parseQuantity(cursor, end, unitEnd) : parseAnswer(cursor, kind, end);
  if (doubtful) cursor.meet(choices.split, doubtful);
  return { tree: cursor.problem ? null : tree, problem: cursor.problem, met: cursor.met, places: cursor.places };
}

/** Takes the tokens of the unit out; its letters are no names. */
function takeUnit(tokens: Token[]): Token[] {
  const from = unitStart(tokens);
  return tokens.splice(from, tokens.length - 1 - from);
}
