/** The parser's door: answers, references and conditions. */
import { type Diagnostic } from '../diagnostics';
import { type Condition, type ParseResult, type ReadingContext, type Symbols } from './answer-tree';
import { pairBars } from './bars';
import { Cursor, type Grammar } from './cursor';
import { markConnectives, parseWholeCondition } from './parse-condition';
import { parseReference } from './parse-reference';
import { answerGrammar, parseText, refuseLength, scopeOf } from './parse-text';
import { tokenise } from './tokenise';
import { resolveWords } from './words';

const fullGrammar: Grammar = { ...answerGrammar, reference: parseReference };

/**
 * Reads a text as an answer of the context's kind, or as a reference where the context allows reference functions.
 * Never throws. The tree is what the rules of the language say; where people commonly write the same text for something
 * else too, those readings are alternatives.
 */
export function parse(text: string, context: ReadingContext): ParseResult {
  return parseText(fullGrammar, text, context);
}

/** Reads a condition of a template: comparisons between scalars, joined by `and`, `or` and `not`. Never throws. */
export function parseCondition(
  text: string,
  context: { readonly symbols: Symbols; readonly allowReferenceFunctions?: boolean },
): { readonly tree: Condition | null; readonly diagnostics: readonly Diagnostic[] } {
  const refused = refuseLength(text);
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
  const cursor = new Cursor(words, scope, fullGrammar, 0);
  const tree = parseWholeCondition(cursor);
  return cursor.problem ? { tree: null, diagnostics: [cursor.problem] } : { tree, diagnostics: [] };
}
