'use client';

import { type DraftStatus } from './use-draft';

/** Whether what was typed is kept. */
export function SaveLine({ status }: { status: DraftStatus }) {
  if (status.is === 'conflict' || status.is === 'failed') {
    return (
      <div role="alert" className="border-l-4 border-madder bg-wash px-4 py-2.5 text-small">
        <span className="font-semibold">Not saved. </span>
        {status.message}{' '}
        {status.is === 'conflict' ? (
          <>
            Copy what you want to keep, then <a href="">load the other version</a>.
          </>
        ) : (
          'It stays on this page and is sent again by itself.'
        )}
      </div>
    );
  }
  const words = { saved: 'Saved', unsaved: 'Not saved yet', saving: 'Saving' }[status.is];
  return (
    <p role="status" className="text-small text-grey">
      {words}
      {status.is === 'saved' ? null : <span aria-hidden="true">…</span>}
    </p>
  );
}
