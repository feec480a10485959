import { type Verdict } from '@/lib/checker/contract';
import type { ReactNode } from 'react';

const words: Record<Verdict, string> = {
  agrees: 'Agrees',
  differs: 'Differs',
  undecided: 'Undecided',
  unreadable: 'Unreadable',
};

const colours: Record<Verdict, string> = {
  agrees: 'text-verdigris',
  differs: 'text-madder',
  undecided: 'text-ochre',
  unreadable: 'text-grey',
};

const strokes: Record<Verdict, ReactNode> = {
  agrees: <path d="M3 6.5h18M3 12h18M3 17.5h18" />,
  differs: <path d="M3 6.5h18M3 12h18M3 17.5h18M7.5 22 16.5 2" />,
  undecided: (
    <>
      <path d="M3 15.2h18M3 20.7h18" />
      <path d="M8.6 4.3C8.9 2.4 10.2 1.4 12 1.4c2.1 0 3.5 1.2 3.5 2.9 0 2.1-3.4 2.2-3.4 4.4" strokeWidth={2.1} />
      <circle cx="12.1" cy="11.6" r="1.4" fill="currentColor" stroke="none" />
    </>
  ),
  unreadable: (
    <>
      <circle cx="12" cy="12" r="8.2" strokeWidth={2.1} />
      <path d="M4.5 20.5 19.5 3.5" strokeWidth={2.1} />
    </>
  ),
};

export interface VerdictSignProps {
  readonly verdict: Verdict;
  /** `margin`: large, words beside; `line`: in running text or a table cell. */
  readonly size?: 'margin' | 'line';
  /** The quiet line below (margin) or behind (line): "slip: complex-conjugated". */
  readonly detail?: ReactNode;
  /** Another word for the verdict, where the place asks for one. */
  readonly word?: string;
}

/** A verdict: the sign first (≡ agrees, ≢ differs, ≟ undecided, ∅ unreadable), then the words; colour only helps. */
export function VerdictSign({ verdict, size = 'line', detail, word = words[verdict] }: VerdictSignProps) {
  if (size === 'margin') {
    return (
      <div className="grid grid-cols-[auto_1fr] items-baseline gap-x-4">
        <Sign verdict={verdict} className={`h-7 w-7 self-center ${colours[verdict]}`} />
        <p className="text-base font-semibold">{word}</p>
        {detail ? <p className="col-start-2 text-small text-grey">{detail}</p> : null}
      </div>
    );
  }
  return (
    <span className="inline-flex items-baseline gap-1.5">
      <Sign verdict={verdict} className={`h-[1em] w-[1em] shrink-0 translate-y-[0.12em] ${colours[verdict]}`} />
      <span>
        {word}
        {detail ? <span className="text-grey">, {detail}</span> : null}
      </span>
    </span>
  );
}

/** The sign alone, drawn so that it is the same with every font. Hidden from a screen reader: words must stand beside it. */
export function Sign({ verdict, className }: { verdict: Verdict; className?: string }) {
  return (
    <svg
      viewBox="0 0 24 24"
      aria-hidden="true"
      focusable="false"
      className={className}
      fill="none"
      stroke="currentColor"
      strokeWidth={2.7}
      data-verdict={verdict}
    >
      {strokes[verdict]}
    </svg>
  );
}
