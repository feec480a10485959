/** Answers that are one of given labels. */
import { type Diagnostic } from '../diagnostics';
import { type ChoiceNode } from './answer-tree';

/** The label that equals the text after trimming and case-folding; an unknown label is unreadable. */
export function parseChoice(
  text: string,
  labels: readonly string[],
): { readonly tree: ChoiceNode | null; readonly diagnostics: readonly Diagnostic[] } {
  const span = { start: 0, end: [...text].length };
  const typed = fold(text);
  if (typed === '') {
    return { tree: null, diagnostics: [{ code: 'empty', span, message: 'There is nothing to read here.' }] };
  }
  const choice = labels.find((label) => fold(label) === typed);
  if (choice !== undefined) return { tree: { node: 'choice', span, choice }, diagnostics: [] };
  const message = 'This is none of the choices.';
  return {
    tree: null,
    diagnostics: [{ code: 'unknown-choice', span, message, hint: `Choose ${labels.join(' or ')}.` }],
  };
}

function fold(label: string): string {
  return label.trim().replace(/\s+/g, ' ').normalize('NFC').toUpperCase().toLowerCase();
}
