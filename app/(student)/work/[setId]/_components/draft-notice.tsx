'use client';

import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { paths } from '@/lib/paths';
import { type Draft, type PartRef } from './draft-keeper';
import { useKeeper } from './keeper-context';

/** Below a field whose text is not on the server, where that needs the person: signed out, refused, or changed elsewhere. */
export function DraftNotice({ part, draft }: { part: PartRef; draft: Draft }) {
  const keeper = useKeeper();
  if (draft.state === 'signed-out') {
    return (
      <Notice tone="caution" title="Your session has ended">
        What you type is kept in this browser.{' '}
        <a href={paths.signIn(paths.work())} target="_blank" rel="noreferrer">
          Sign in in another tab
        </a>{' '}
        and come back here: it is saved then.
      </Notice>
    );
  }
  if (draft.state === 'stuck') {
    return (
      <Notice tone="caution" title="Not saved">
        {draft.message}
      </Notice>
    );
  }
  if (draft.state === 'changed' && draft.theirs) {
    return (
      <Notice tone="caution" title="Changed in another tab or on another device">
        There it is now{' '}
        {draft.theirs.text.trim() ? (
          <code className="break-all whitespace-pre-wrap">{draft.theirs.text}</code>
        ) : (
          'empty'
        )}
        .{' '}
        <span className="mt-1.5 flex flex-wrap gap-x-5">
          <Button look="plain" onClick={() => keeper.settle(part, 'theirs')}>
            Take that
          </Button>
          <Button look="plain" onClick={() => keeper.settle(part, 'mine')}>
            Keep what is typed here
          </Button>
        </span>
      </Notice>
    );
  }
  return null;
}
