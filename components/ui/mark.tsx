import type { ReactNode } from 'react';

export interface MarkProps {
  /** Credit as it is printed ("3", "2.5"); null while there is none. */
  readonly credit: string | number | null;
  readonly of: string | number;
  /** A word behind it: "suggested", "on appeal". */
  readonly state?: string;
  readonly children?: ReactNode;
}

/** A mark, the largest thing in the margin: "3 of 4". What stands below it (grader's note, history) are its children. */
export function Mark({ credit, of, state, children }: MarkProps) {
  return (
    <div>
      <p className="flex flex-wrap items-baseline gap-x-2">
        {credit === null ? (
          <span className="text-mark font-semibold text-grey">
            <span aria-hidden="true">–</span>
            <span className="sr-only">not marked yet,</span>
          </span>
        ) : (
          <span className="text-mark font-semibold">{credit}</span>
        )}
        <span className="text-small text-grey">
          of {of}
          {state ? `, ${state}` : null}
        </span>
      </p>
      {children ? <div className="mt-1.5 text-small">{children}</div> : null}
    </div>
  );
}
