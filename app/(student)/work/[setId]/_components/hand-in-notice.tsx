'use client';

import { useEffect, useRef } from 'react';
import { Button } from '@/components/ui/button';
import { Sign } from '@/components/ui/verdict-sign';
import { paths } from '@/lib/paths';
import { pressValue } from './hand-in-form';
import { type HandInNews } from './use-hand-in';

interface HandInNoticeProps {
  readonly news: HandInNews;
  readonly form: string;
  readonly onBack: () => void;
}

/** Under the button that was pressed: the question whether to submit what cannot be read, or why nothing was submitted. */
export function HandInNotice({ news, form, onBack }: HandInNoticeProps) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => box.current?.focus(), [news]);
  return (
    <div
      ref={box}
      role="alert"
      tabIndex={-1}
      className={`w-full border-l-4 bg-wash px-3.5 py-2.5 text-small ${news.kind === 'ask' ? 'border-ochre' : 'border-madder'}`}
    >
      {news.kind === 'ask' ? <Ask news={news} form={form} onBack={onBack} /> : <Refused news={news} />}
    </div>
  );
}

function Ask({ news, form, onBack }: { news: Extract<HandInNews, { kind: 'ask' }>; form: string; onBack: () => void }) {
  const many = news.unreadable.length > 1;
  return (
    <div className="grid justify-items-start gap-2.5">
      <p>
        <span className="font-semibold">Not submitted yet. </span>
        {many ? 'These answers cannot be read:' : 'This answer cannot be read:'}
      </p>
      <ul className="grid gap-1">
        {news.unreadable.map(({ partKey, message }) => (
          <li key={partKey}>
            <Sign verdict="unreadable" className="me-1.5 inline-block h-[0.95em] w-[0.95em] align-[-0.1em] text-grey" />
            <span className="font-semibold">{partKey}.</span> {message}
          </li>
        ))}
      </ul>
      <p className="text-grey">
        Mended, it is checked at once. As it stands a person will read it; that costs no attempt.
      </p>
      <Button onClick={onBack}>Mend {many ? 'them' : 'it'}</Button>
      <Button
        look="plain"
        className="text-start"
        type="submit"
        form={form}
        name="press"
        value={pressValue({ part: news.part, confirmUnreadable: true })}
      >
        Submit all the same: a person will read {many ? 'them' : 'it'}
      </Button>
    </div>
  );
}

function Refused({ news }: { news: Extract<HandInNews, { kind: 'refused' }> }) {
  if (!news.isSignedOut) {
    return (
      <p>
        <span className="font-semibold">Not submitted. </span>
        {news.message}
      </p>
    );
  }
  return (
    <p>
      <span className="font-semibold">Your session has ended, and nothing was submitted. </span>
      What you typed is kept in this browser.{' '}
      <a href={paths.signIn(paths.work())} target="_blank" rel="noreferrer">
        Sign in in another tab
      </a>
      , come back here and press again.
    </p>
  );
}
