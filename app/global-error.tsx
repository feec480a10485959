'use client';

import { Button } from '@/components/ui/button';
import { ErrorState } from '@/components/ui/states';
import { latinFace } from './typefaces';
import './globals.css';

interface GlobalErrorProps {
  readonly error: Error & { digest?: string };
  readonly reset: () => void;
}

/** The last resort: the layout itself failed, so this page brings its own html and body. */
export default function GlobalError({ error, reset }: GlobalErrorProps) {
  return (
    <html lang="en" className={latinFace.variable}>
      <body>
        <title>Something failed · Halfmark</title>
        <main className="script p-(--gutter)">
          <h1 className="text-base">Halfmark</h1>
          <ErrorState
            title="Halfmark could not make this page."
            reference={error.digest}
            action={
              <Button look="primary" onClick={reset}>
                Try again
              </Button>
            }
          >
            The fault is on our side. What you had saved or submitted is kept.
          </ErrorState>
        </main>
      </body>
    </html>
  );
}
