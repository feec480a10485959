import katex from 'katex';
import { longestTex } from './tex-guard';

/** KaTeX's own limits: sizes in em, and how many macro expansions one formula may take. */
export const typesetLimits = { maxSize: 12, maxExpand: 300 } as const;

export type TypesetResult =
  { readonly ok: true; readonly html: string } | { readonly ok: false; readonly message: string };

/**
 * Typesets TeX as HTML with MathML for a screen reader. Nothing in the formula is trusted: no links, classes, styles or
 * images, bounded sizes and expansions. Never throws; what cannot be typeset comes back with a message.
 *
 * @param latex TeX in mathematics mode, without dollar signs
 * @param display on a line of its own
 */
export function typeset(latex: string, display: boolean): TypesetResult {
  if (latex.length > longestTex) return { ok: false, message: 'This formula is too long to be typeset.' };
  try {
    const html = katex.renderToString(latex, {
      displayMode: display,
      output: 'htmlAndMathml',
      throwOnError: true,
      trust: false,
      strict: 'error',
      ...typesetLimits,
    });
    return { ok: true, html };
  } catch (error) {
    return {
      ok: false,
      message: error instanceof katex.ParseError ? error.message : 'This formula is nested too deep.',
    };
  }
}

/** The paper's madder: the one colour that marks a differing element; the stylesheet gives it night's madder at night. */
const differingColour = '#96283a';

/** TeX for an element in which an answer differs from its reference: underlined as well as coloured. */
export function markDiffering(latex: string): string {
  return `\\underline{\\textcolor{${differingColour}}{${latex}}}`;
}
