import { compute } from '@/lib/checker';
import { type TemplateContent } from './content';
import { drawValues } from './draw-values';
import { interpolate, typesetValue } from './interpolate';
import { referenceOf } from './reference-of';

/** One draw of a template as its author proves it: texts are Markdown with the values set in. */
export interface PreviewDraw {
  readonly seed: string;
  /** Each drawn value as TeX. */
  readonly values: readonly { readonly name: string; readonly latex: string }[];
  readonly prompt: string;
  readonly solution: string;
  readonly parts: readonly PreviewPart[];
}

export interface PreviewPart {
  readonly key: string;
  readonly prompt: string;
  /** The reference worked out, as TeX; for a choice the label as text. */
  readonly reference:
    | { readonly ok: true; readonly latex: string }
    | { readonly ok: true; readonly label: string }
    | { readonly ok: false; readonly error: string };
}

/** Draws once from a seed and works every reference out, or says why there is no draw. */
export function previewDraw(
  content: TemplateContent,
  seed: string,
): { ok: true; draw: PreviewDraw } | { ok: false; error: string } {
  const drawn = drawValues(content, seed);
  if (!drawn.ok) return drawn;
  const { values } = drawn;
  return {
    ok: true,
    draw: {
      seed,
      values: Object.entries(values).map(([name, value]) => ({
        name,
        latex: typesetValue(value, content.symbols).latex,
      })),
      prompt: interpolate(content.prompt, values, content),
      solution: interpolate(content.solution, values, content),
      parts: content.parts.map((part) => ({
        key: part.key,
        prompt: interpolate(part.prompt, values, content),
        reference: previewReference(content, part.key, values),
      })),
    },
  };
}

function previewReference(
  content: TemplateContent,
  key: string,
  values: Readonly<Record<string, string>>,
): PreviewPart['reference'] {
  const reference = referenceOf(content, key, values);
  if (!reference.ok) return { ok: false, error: reference.error };
  const { check } = reference;
  if (check.kind === 'choice') return { ok: true, label: check.reference };
  const computed = compute(check);
  return computed.ok ? { ok: true, latex: computed.latex } : { ok: false, error: computed.error };
}
