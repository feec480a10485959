'use client';

import { useState, useTransition } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { useToast } from '@/components/ui/toast';
import { publishDraft } from '../actions';

interface PublishButtonProps {
  readonly templateId: string;
  readonly revision: number;
  readonly nextNumber: number;
  /** The draft is saved and has no mistake. */
  readonly ready: boolean;
  readonly mistakes: number;
}

/** Publishes the draft, after a question: a published version never changes. */
export function PublishButton({ templateId, revision, nextNumber, ready, mistakes }: PublishButtonProps) {
  const [asking, ask] = useState(false);
  const [refusal, setRefusal] = useState<string | null>(null);
  const [pending, start] = useTransition();
  const toast = useToast();

  const publish = () =>
    start(async () => {
      const result = await publishDraft({ templateId, revision }).catch(() => null);
      if (result?.ok) {
        ask(false);
        toast(`Version ${result.value.number} is published.`);
      } else setRefusal(result?.message ?? 'Halfmark cannot be reached. Please try again.');
    });

  return (
    <>
      <Button
        look="primary"
        disabled={!ready}
        title={mistakes > 0 ? 'Mend what is listed below first' : undefined}
        onClick={() => {
          setRefusal(null);
          ask(true);
        }}
      >
        Publish version {nextNumber}…
      </Button>
      <Dialog
        open={asking}
        onClose={() => ask(false)}
        title={`Publish version ${nextNumber}?`}
        actions={
          <>
            <Button look="quiet" onClick={() => ask(false)}>
              Not yet
            </Button>
            <Button look="primary" pending={pending} pendingWords="Publishing" onClick={publish}>
              Publish it
            </Button>
          </>
        }
      >
        <p>
          It can then be put into problem sets. A published version never changes; what you edit afterwards becomes
          version {nextNumber + 1}, and sets keep the version they have.
        </p>
        {refusal ? (
          <p role="alert" className="border-l-4 border-madder bg-wash px-4 py-2.5 text-small">
            <span className="font-semibold">Not published. </span>
            {refusal}
          </p>
        ) : null}
      </Dialog>
    </>
  );
}
