'use client';

import { useEffect, useState, useSyncExternalStore } from 'react';
import { type DraftState } from './draft-keeper';
import { useKeeper } from './keeper-context';

const words: Record<Exclude<DraftState, 'clean'>, string> = {
  typing: 'saving',
  sending: 'saving',
  held: 'not saved yet; kept in this browser',
  'signed-out': 'signed out; kept in this browser',
  stuck: 'not saved; kept in this browser',
  changed: 'changed elsewhere; see below',
};

/** At the right of the running head: when what was typed was saved last, or what stands in the way. */
export function SavedStatus() {
  const keeper = useKeeper();
  const { worst, lastSaved } = useSyncExternalStore(keeper.subscribe, keeper.overall, keeper.overall);
  const now = useNow(lastSaved !== null && worst === 'clean');
  const isTrouble = worst !== 'clean' && worst !== 'typing' && worst !== 'sending';
  return (
    <>
      {worst === 'clean' && lastSaved === null ? null : (
        <span className={isTrouble ? 'font-semibold text-ochre' : undefined}>
          {' · '}
          {worst === 'clean' ? `saved ${ago(now - (lastSaved ?? now))}` : words[worst]}
        </span>
      )}
      <span role="status" className="sr-only">
        {isTrouble ? `Saving: ${words[worst]}.` : ''}
      </span>
    </>
  );
}

/** The time, told anew every few seconds while somebody looks at it. */
function useNow(isOn: boolean): number {
  const [now, setNow] = useState(() => Date.now());
  useEffect(() => {
    if (!isOn) return undefined;
    const tell = () => setNow(Date.now());
    const first = setTimeout(tell, 0);
    const timer = setInterval(tell, 4_000);
    return () => {
      clearTimeout(first);
      clearInterval(timer);
    };
  }, [isOn]);
  return now;
}

/** A short time ago, in words: "just now", "12 s ago", "3 min ago". */
export function ago(milliseconds: number): string {
  const seconds = Math.round(milliseconds / 1000);
  if (seconds < 4) return 'just now';
  if (seconds < 60) return `${seconds} s ago`;
  if (seconds < 3_600) return `${Math.floor(seconds / 60)} min ago`;
  return `${Math.floor(seconds / 3_600)} h ago`;
}
