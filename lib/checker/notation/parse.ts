/** The parser's door: from text to tree, in every common reading. */
import { type Diagnostic } from '../diagnostics';
import { type Condition, type ParseResult, type ReadingContext, type Symbols } from './answer-tree';
import { pairBars } from './bars';
import { choices, Cursor, type Grammar } from './cursor';
import { findDecimalComma } from './decimal-comma';
import { maximumLength } from './limits';
import { parseAnswer } from './parse-answer';
import { parseChoice } from './parse-choice';
import { markConnectives, parseWholeCondition } from './parse-condition';
import { parsePower } from './parse-power';
import { parsePrimary } from './parse-primary';
import { parseQuantity, unitStart } from './parse-quantity';
import { parseSum } from './parse-sum';
import { otherReadings, type Reading } from './readings';
import { buildScope, checkNames, type Scope } from './scope';
import { type Token } from './token';
import { tokenise } from './tokenise';
import { resolveWords } from './words';

const grammar: Grammar = { sum: parseSum, power: parsePower, primary: parsePrimary };

const noOne = { tree: null, ambiguous: false, alternatives: [] } as const;

/**
 * Reads a text as an answer of the context's kind. Never throws. The tree is what the rules of the language say; where
 * people commonly write the same text for something else too, those readings are alternatives.
 */
export function parse(text: string, context: ReadingContext): ParseResult {
  const refused = refuse(text);
  if (refused) return { ...noOne, diagnostics: [refused] };
  if (context.kind === 'choice') return { ...noOne, ...parseChoice(text, context.options?.choices ?? []) };
  const scope = scopeOf(context);
  if (scope.problems) return { ...noOne, diagnostics: scope.problems };
  const first = readOnce(text, context, scope.scope, 0);
  if (first.tree === null) return { ...noOne, diagnostics: first.problem ? [first.problem] : [] };
  if (first.met === 0) return { tree: first.tree, diagnostics: [], ambiguous: false, alternatives: [] };
  const again = (taken: number): Reading => readOnce(text, context, scope.scope, taken);
  const { alternatives, diagnostic } = otherReadings(first, first.tree, again);
  return {
    tree: first.tree,
    diagnostics: diagnostic ? [diagnostic] : [],
    ambiguous: alternatives.length > 0,
    alternatives,
  };
}

/** Reads a condition of a template: comparisons between scalars, joined by `and`, `or` and `not`. Never throws. */
export function parseCondition(
  text: string,
  context: { readonly symbols: Symbols; readonly allowReferenceFunctions?: boolean },
): { readonly tree: Condition | null; readonly diagnostics: readonly Diagnostic[] } {
  const refused = refuse(text);
  if (refused) return { tree: null, diagnostics: [refused] };
  const { scope, problems } = scopeOf({ kind: 'scalar', ...context });
  if (problems) return { tree: null, diagnostics: problems };
  const options = { kets: false, plusMinus: false, lowerExponent: true, upperExponent: !scope.declaresCapitalE };
  const { tokens, problem } = tokenise(text, options);
  if (problem) return { tree: null, diagnostics: [problem] };
  markConnectives(tokens);
  const words = resolveWords(tokens, scope, false).tokens;
  const bars = pairBars(words);
  if (bars) return { tree: null, diagnostics: [bars] };
  const cursor = new Cursor(words, scope, grammar, 0);
  const tree = parseWholeCondition(cursor);
  return cursor.problem ? { tree: null, diagnostics: [cursor.problem] } : { tree, diagnostics: [] };
}

function refuse(text: string): Diagnostic | null {
  if (text.length <= maximumLength) return null;
  let length = 0;
  for (let index = 0; index < text.length && length <= maximumLength; length += 1) {
    index += (text.codePointAt(index) ?? 0) > 0xffff ? 2 : 1;
  }
  if (length <= maximumLength) return null;
  const message = `An answer has at most ${maximumLength} characters.`;
  return { code: 'too-long', span: { start: maximumLength, end: maximumLength }, message };
}

function scopeOf(context: ReadingContext): { readonly scope: Scope; readonly problems: readonly Diagnostic[] | null } {
  const names = context.kind === 'quantity' ? [] : Object.keys(context.symbols);
  if (context.options?.definitions) names.push(...Object.keys(context.options.definitions));
  const scope = buildScope(names, context.allowReferenceFunctions === true);
  if (scope.sound) return { scope, problems: null };
  const nowhere = { start: 0, end: 0 };
  return { scope, problems: checkNames(names).map((problem) => ({ ...problem, span: nowhere })) };
}

/** One reading, with the other side taken of the given choices. */
function readOnce(text: string, context: ReadingContext, scope: Scope, taken: number): Reading {
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
