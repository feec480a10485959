import type { ReactNode } from 'react';

export interface ScriptPageProps {
  /** `column`: body and margin, the marked script. `none`: the whole width for tables and forms without marks. */
  readonly margin?: 'column' | 'none';
  readonly children: ReactNode;
}

/**
 * The page itself: rows of body and margin with one unbroken line between them from the running head to the foot.
 * Its children are `Section`s and `PartRow`s.
 */
export function ScriptPage({ margin = 'column', children }: ScriptPageProps) {
  return (
    <main id="main" tabIndex={-1} className="script" data-margin={margin}>
      {children}
    </main>
  );
}

export interface SectionProps {
  readonly id?: string;
  /** Margin cell: marks, counts, notes. Folds under the body on a narrow page; nothing is drawn for an empty one there. */
  readonly margin?: ReactNode;
  /** Keeps the margin in sight while a long body scrolls. */
  readonly stickyMargin?: boolean;
  /** Names the row for a screen reader; without it the row is no landmark. */
  readonly label?: string;
  readonly children: ReactNode;
}

/** One row of a script page: body on the left, margin on the right, a hairline above all but the first. */
export function Section({ id, margin, stickyMargin, label, children }: SectionProps) {
  const cells = (
    <>
      <div className="script-body">{children}</div>
      <div className="script-margin" data-sticky={stickyMargin || undefined}>
        {margin ? <div>{margin}</div> : null}
      </div>
    </>
  );
  return label ? (
    <section id={id} aria-label={label} className="script-row">
      {cells}
    </section>
  ) : (
    <div id={id} className="script-row">
      {cells}
    </div>
  );
}

export interface PartRowProps extends SectionProps {
  /** The part's letter, "a". */
  readonly letter: string;
  /** What is asked, beside the letter. */
  readonly prompt: ReactNode;
}

/** The row of one part of a question: letter and prompt, then the working; its marks in the margin. */
export function PartRow({ letter, prompt, children, label = `Part ${letter}`, ...section }: PartRowProps) {
  return (
    <Section {...section} label={label}>
      <div className="flex gap-2">
        <span className="font-semibold">{letter}.</span>
        <div className="min-w-0">{prompt}</div>
      </div>
      <div className="mt-3">{children}</div>
    </Section>
  );
}

export interface PageTitleProps {
  /** The quiet line above: "Question 2 of 3 · your draw". */
  readonly kicker?: ReactNode;
  readonly children: ReactNode;
}

/** The one h1 of a page, with the line above it. */
export function PageTitle({ kicker, children }: PageTitleProps) {
  return (
    <div className="mb-3">
      {kicker ? <p className="mb-1.5 text-small text-grey">{kicker}</p> : null}
      <h1>{children}</h1>
    </div>
  );
}

/** A quiet note in the margin, also for a margin that has nothing to say yet ("Marks appear here after release."). */
export function MarginNote({ children }: { children: ReactNode }) {
  return <p className="text-small text-grey">{children}</p>;
}
