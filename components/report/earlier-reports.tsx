import { MarginNote } from '@/components/ui/script-page';
import { TimeStamp } from '@/components/ui/time-stamp';

export interface EarlierReportsProps {
  /** The latest first. */
  readonly reports: readonly { revision: number; reason: string; createdAt: Date }[];
  readonly zone: string;
}

/** The history of a report in a margin: when each was issued and why; nothing while there is one alone. */
export function EarlierReports({ reports, zone }: EarlierReportsProps) {
  if (reports.length < 2) return null;
  return (
    <MarginNote>
      Reports so far
      {reports.map(({ revision, reason, createdAt }) => (
        <span key={revision} className="mt-1 block">
          <TimeStamp at={createdAt} zone={zone} style="short" />: {reason}
        </span>
      ))}
    </MarginNote>
  );
}
