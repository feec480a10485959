import { Typeset } from '@/components/math/typeset';
import { Sign } from '@/components/ui/verdict-sign';
import { read } from '@/lib/checker/reader';
import { type PartReading } from '@/lib/templates/read-answer';

/** An answer that is only shown: as it was typed, and as it was read. Made by the server. */
export function SubmittedAnswer({ text, reading }: { text: string; reading: PartReading }) {
  const { readable, latex, plain } = read(text, reading);
  return (
    <div>
      <p className="font-mono text-small break-words whitespace-pre-wrap">{text}</p>
      {reading.kind === 'choice' ? null : (
        <div className="mt-2.5 border-y border-hairline py-2.5">
          {readable ? (
            <>
              <p className="text-note text-grey">Read as</p>
              <div className="text-center">
                <Typeset latex={latex} plain={plain} display />
              </div>
            </>
          ) : (
            <p className="text-small text-grey">
              <Sign verdict="unreadable" className="me-1.5 inline-block h-[0.95em] w-[0.95em] align-[-0.1em]" />
              This could not be read by the checker.
            </p>
          )}
        </div>
      )}
    </div>
  );
}
