import 'server-only';
import { renderInlineMarkdown, renderMarkdown } from '@/lib/markdown';
import { type TemplateDraft } from '@/lib/templates/draft';
import { findProblems, sampleSeed } from '@/lib/templates/find-problems';
import { previewDraw, type PreviewPart } from '@/lib/templates/preview';
import { type TemplateProblem } from '@/lib/templates/template-problem';
import { typeset } from '@/lib/typeset';

/** Draws shown beside the source. */
const DRAWS_SHOWN = 3;

/** A preview as the browser shows it: HTML made by our own renderer, so that no typesetter is loaded there. */
export type RenderedPreview = { problems: TemplateProblem[]; draws: RenderedDraw[] };

export type RenderedDraw = {
  /** "n = −3, A = σ_x" typeset. */
  values: string;
  prompt: string;
  solution: string;
  parts: { key: string; prompt: string; reference: { html: string } | { error: string } }[];
};

/** What is wrong with a draft, and as long as it is whole, three draws of it with their references worked out. */
export function renderPreview(draft: TemplateDraft): RenderedPreview {
  const { problems, content } = findProblems(draft);
  if (content === null) return { problems, draws: [] };
  const draws = Array.from({ length: DRAWS_SHOWN }, (_, index) => previewDraw(content, sampleSeed(index)));
  return {
    problems,
    draws: draws.flatMap((result) => {
      if (!result.ok) return [];
      const { draw } = result;
      const values = draw.values.map(({ name, latex }) => `${texOfName(name)} = ${latex}`).join(',\\quad ');
      return [
        {
          values: values === '' ? '' : mathematics(values, false),
          prompt: renderMarkdown(draw.prompt),
          solution: renderMarkdown(draw.solution),
          parts: draw.parts.map((part) => ({
            key: part.key,
            prompt: renderInlineMarkdown(part.prompt),
            reference: renderReference(part.reference),
          })),
        },
      ];
    }),
  };
}

function renderReference(reference: PreviewPart['reference']): RenderedDraw['parts'][number]['reference'] {
  if (!reference.ok) return { error: reference.error };
  return 'label' in reference
    ? { html: renderInlineMarkdown(reference.label) }
    : { html: mathematics(reference.latex, true) };
}

function mathematics(latex: string, display: boolean): string {
  const set = typeset(latex, display);
  return set.ok ? set.html : renderInlineMarkdown(`\`${latex}\``);
}

/** A parameter's name as TeX: its index below it, a word upright. */
function texOfName(name: string): string {
  const [base = '', index] = name.split('_');
  const letter = base.length === 1 ? base : `\\mathrm{${base}}`;
  return index === undefined ? letter : `${letter}_{\\mathrm{${index}}}`;
}
