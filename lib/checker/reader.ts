/**
 * The small door: reading alone. It holds no comparison and no reference, so it may run in a student's browser.
 */
import { type Diagnostic, isFatal } from './diagnostics';
import { type ReadingContext } from './notation/answer-tree';
import { answerGrammar, parseText } from './notation/parse-text';
import { printLatex } from './notation/print-latex';
import { printPlain } from './notation/print-plain';

/** What a text reads as. */
export interface Reading {
  readonly readable: boolean;
  /** The reading typeset, as typed and never simplified; empty where unreadable. */
  readonly latex: string;
  /** The reading in words, for a screen reader; empty where unreadable. */
  readonly plain: string;
  readonly diagnostics: readonly Diagnostic[];
  /** Whether people commonly read this text in another way too. */
  readonly ambiguous: boolean;
}

/** Reads what a student typed. Never throws; takes time linear in the length. */
export function read(text: string, context: ReadingContext): Reading {
  const { tree, diagnostics, ambiguous } = parseText(answerGrammar, text, {
    ...context,
    allowReferenceFunctions: false,
  });
  if (tree === null || diagnostics.some(isFatal)) {
    return { readable: false, latex: '', plain: '', diagnostics, ambiguous: false };
  }
  return { readable: true, latex: printLatex(tree), plain: printPlain(tree), diagnostics, ambiguous };
}
