import { ScriptPage, Section } from './script-page';

const widths = ['w-11/12', 'w-4/5', 'w-full', 'w-3/5'];

/** Lines that stand for text on its way. The words are for a screen reader. */
export function Skeleton({ lines = 3, words = 'Loading' }: { lines?: number; words?: string }) {
  return (
    <div role="status" className="grid max-w-measure gap-3">
      <span className="sr-only">{words}</span>
      {Array.from({ length: lines }, (_, line) => (
        <div key={line} aria-hidden="true" className={`skeleton-line ${widths[line % widths.length] ?? ''}`} />
      ))}
    </div>
  );
}

/** A whole page on its way: body and margin, as it will stand. For a `loading.tsx` beside a slow page. */
export function PageSkeleton() {
  return (
    <ScriptPage>
      <Section margin={<div aria-hidden="true" className="skeleton-line w-1/2" />}>
        <Skeleton lines={4} words="The page is on its way" />
      </Section>
    </ScriptPage>
  );
}
