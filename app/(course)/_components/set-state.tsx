import { TimeStamp } from '@/components/ui/time-stamp';
import { presentSetState } from '@/lib/presenters/present-set-state';

export interface SetStateProps {
  readonly set: Parameters<typeof presentSetState>[0];
  readonly zone: string;
  readonly now: Date;
  /** Leaves out the moment. */
  readonly wordOnly?: boolean;
}

/** Where a set stands: "Open until Friday 4 December, 18:00". */
export function SetState({ set, zone, now, wordOnly = false }: SetStateProps) {
  const { word, joins, at } = presentSetState(set, now);
  return (
    <>
      <span className="font-semibold">{word}</span>
      {at && !wordOnly ? (
        <span className="text-grey">
          {' '}
          {joins} <TimeStamp at={at} zone={zone} style="short" />
        </span>
      ) : null}
    </>
  );
}
