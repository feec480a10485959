import { type Span } from '@/lib/checker/diagnostics';
import { type AnswerTree } from '@/lib/checker/notation/answer-tree';

/** Every span of a tree beside the span of the node around it. */
export function spansOf(tree: AnswerTree): readonly { readonly inner: Span; readonly outer: Span | null }[] {
  const found: { inner: Span; outer: Span | null }[] = [];
  const visit = (value: unknown, outer: Span | null): void => {
    if (Array.isArray(value)) {
      for (const item of value) visit(item, outer);
      return;
    }
    if (typeof value !== 'object' || value === null) return;
    const { span } = value as { span?: Span };
    if (span) found.push({ inner: span, outer });
    for (const [key, part] of Object.entries(value)) if (key !== 'span') visit(part, span ?? outer);
  };
  visit(tree, null);
  return found;
}

/** The largest nesting of nodes in a tree. */
export function depthOf(value: unknown): number {
  if (typeof value !== 'object' || value === null) return 0;
  const below = Math.max(0, ...Object.values(value).map(depthOf));
  return 'node' in value ? below + 1 : below;
}
