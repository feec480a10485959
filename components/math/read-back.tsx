'use client';

import { Sign } from '@/components/ui/verdict-sign';
import { type Diagnostic, type Span } from '@/lib/checker/diagnostics';
import { TypesetLive } from './typeset-live';
import { type ReadingOf } from './use-reading';

export interface ReadBackProps {
  readonly reading: ReadingOf | null;
  /** The text has changed since; the reading belongs to an earlier one. */
  readonly stale?: boolean;
  /** What stands in place of a reading while nothing is typed; nothing where left out. */
  readonly empty?: string;
}

/** How an answer was read: typeset as typed, or ∅ with what stands in the way and where. */
export function ReadBack({ reading, stale = false, empty }: ReadBackProps) {
  if (!reading) return empty ? <p className="mt-2 text-small text-grey">{empty}</p> : null;
  if (!reading.readable) return <Unreadable reading={reading} />;
  const doubts = reading.diagnostics.filter((diagnostic) => diagnostic.code === 'ambiguous');
  return (
    <div className="mt-2.5 border-y border-hairline py-2.5" data-stale={stale || undefined}>
      <p className="text-note text-grey">Read as</p>
      <div className={`text-center transition-opacity ${stale ? 'opacity-60' : ''}`}>
        <TypesetLive latex={reading.latex} plain={reading.plain} display />
      </div>
      {doubts.map((doubt) => (
        <p key={doubt.span.start} className="mt-1 border-l-4 border-ochre pl-3 text-small">
          <span className="font-semibold">Two ways to read this. </span>
          <Sentence of={doubt} />
        </p>
      ))}
    </div>
  );
}

function Unreadable({ reading }: { reading: ReadingOf }) {
  const fault = reading.diagnostics.find((diagnostic) => diagnostic.code !== 'ambiguous');
  return (
    <div className="mt-2.5 text-small">
      <p className="text-grey">
        <Sign verdict="unreadable" className="me-1.5 inline-block h-[0.95em] w-[0.95em] align-[-0.1em]" />
        {fault ? <Sentence of={fault} /> : 'This cannot be read.'}
      </p>
      {fault ? <Echo text={reading.text} span={fault.span} /> : null}
    </div>
  );
}

function Sentence({ of: { message, hint } }: { of: Diagnostic }) {
  return (
    <>
      {message}
      {hint ? ` ${hint}` : null}
    </>
  );
}

/** Characters shown on either side of a fault in a long text. */
const around = 60;

/** The typed text with the faulty place underlined, or a caret where something is missing. Places count code points. */
function Echo({ text, span }: { text: string; span: Span }) {
  const characters = Array.from(text);
  const from = Math.max(0, span.start - around);
  const to = Math.min(characters.length, span.end + around);
  const fault = characters.slice(span.start, span.end).join('');
  return (
    <p className="mt-1.5 font-mono break-all whitespace-pre-wrap text-ink" aria-hidden="true">
      {from > 0 ? '…' : ''}
      {characters.slice(from, span.start).join('')}
      {fault.trim() ? (
        <mark className="bg-wash text-ink underline decoration-madder decoration-wavy decoration-1 underline-offset-4">
          {fault}
        </mark>
      ) : (
        <mark className="bg-wash text-madder">‸{fault}</mark>
      )}
      {characters.slice(span.end, to).join('')}
      {to < characters.length ? '…' : ''}
    </p>
  );
}
