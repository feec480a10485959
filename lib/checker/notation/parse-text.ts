/** From text to tree, in every common reading, by a given grammar. */
import { type Diagnostic } from '../diagnostics';
import { type ParseResult, type ReadingContext } from './answer-tree';
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
  const scope = scopeOf(context);
  if (scope.problems) return { ...noOne, diagnostics: scope.problems };
  const first = readOnce(grammar, text, context, scope.scope, 0);
  if (first.tree === null) return { ...noOne, diagnostics: first.problem ? [first.problem] : [] };
  if (first.met === 0) return { tree: first.tree, diagnostics: [], ambiguous: false, alternatives: [] };
  const again = (taken: number): Reading => readOnce(grammar, text, context, scope.scope, taken);
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

/** One reading, with the other side taken of the given choices. */
function readOnce(grammar: Grammar, text: string, context: ReadingContext, scope: Scope, taken: number): Reading {
  const { kind } = context;
  const other = (taken & choices.split) !== 0;
  const { tokens, problem, lowerExponentUsed } = tokenise(text, {
    kets: true,
    plusMinus: kind === 'eigenvalues' || kind === 'eigenpairs',
    lowerExponent: !(other && scope.declaresE),
    upperExponent: !scope.declaresCapitalE,
  });
  if (problem) return { tree: null, problem, met: 0, places: null };
  const comma = kind === 'scalar' || kind === 'quantity' ? findDecimalComma(tokens) : null;
  if (comma) return { tree: null, problem: comma, met: 0, places: null };
  const unit = kind === 'quantity' ? takeUnit(tokens) : [];
  const words = resolveWords(tokens, scope, other);
  const bars = pairBars(words.tokens);
  if (bars) return { tree: null, problem: bars, met: 0, places: null };
  const end = words.tokens.length - 1;
  if (unit.length > 0) words.tokens.splice(end, 0, ...unit);
  const cursor = new Cursor(words.tokens, scope, grammar, taken);
  const tree = kind === 'quantity' ? parseQuantity(cursor, end, end + unit.length) : parseAnswer(cursor, kind, end);
  if (words.ambiguous) cursor.meet(choices.split, words.ambiguous);
  else if (lowerExponentUsed && scope.declaresE) cursor.meet(choices.split, { start: 0, end: text.length });
  return { tree: cursor.problem ? null : tree, problem: cursor.problem, met: cursor.met, places: cursor.places };
}

/** Takes the tokens of the unit out; its letters are no names. */
function takeUnit(tokens: Token[]): Token[] {
  const from = unitStart(tokens);
  return tokens.splice(from, tokens.length - 1 - from);
}
