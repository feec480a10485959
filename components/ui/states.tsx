import type { ReactNode } from 'react';
import { WordmarkSign } from './wordmark';

export interface StateProps {
  readonly title: string;
  /** Why it is so, and what to do. */
  readonly children: ReactNode;
  /** The way on: a button or a link. */
  readonly action?: ReactNode;
}

/** What stands where there is nothing yet: what would be here, and the next step. */
export function EmptyState({ title, children, action }: StateProps) {
  return (
    <div className="max-w-measure py-6">
      <WordmarkSign className="mb-4 h-6 w-9 text-grey" />
      <p className="text-lead font-semibold">{title}</p>
      <div className="mt-1 text-grey">{children}</div>
      {action ? <div className="mt-4">{action}</div> : null}
    </div>
  );
}

export interface ErrorStateProps extends StateProps {
  /** What to quote when asking for help; the log has it too. */
  readonly reference?: string;
}

/** What stands where something failed: what happened, what was kept, what to do, and a reference for the log. */
export function ErrorState({ title, children, action, reference }: ErrorStateProps) {
  return (
    <div role="alert" className="max-w-measure py-6">
      <WordmarkSign className="mb-4 h-6 w-9 text-madder" />
      <p className="text-lead font-semibold">{title}</p>
      <div className="mt-1 text-grey">{children}</div>
      {action ? <div className="mt-4 flex flex-wrap gap-3">{action}</div> : null}
      {reference ? (
        <p className="mt-5 text-small text-grey">
          For whoever helps you: <code>{reference}</code>
        </p>
      ) : null}
    </div>
  );
}
