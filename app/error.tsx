'use client';

import { Button, ButtonLink } from '@/components/ui/button';
import { RunningHead } from '@/components/ui/running-head';
import { ScriptPage, Section } from '@/components/ui/script-page';
import { ErrorState } from '@/components/ui/states';

interface ErrorPageProps {
  readonly error: Error & { digest?: string };
  readonly reset: () => void;
}

/** What stands in place of a page that failed. The message of an unknown error never reaches the browser, its digest does. */
export default function ErrorPage({ error, reset }: ErrorPageProps) {
  return (
    <>
      <RunningHead place="Something failed" />
      <ScriptPage>
        <Section>
          <h1 className="sr-only">Something failed</h1>
          <ErrorState
            title="This page could not be made."
            reference={error.digest}
            action={
              <>
                <Button look="primary" onClick={reset}>
                  Try again
                </Button>
                <ButtonLink href="/">To your courses</ButtonLink>
              </>
            }
          >
            The fault is on our side and has been written to the log. What you had saved or submitted is kept. Try
            again; if it fails again, tell whoever runs Halfmark for you.
          </ErrorState>
        </Section>
      </ScriptPage>
    </>
  );
}
