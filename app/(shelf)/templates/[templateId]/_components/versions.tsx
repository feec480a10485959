import { EmptyState } from '@/components/ui/states';
import { TimeStamp } from '@/components/ui/time-stamp';
import { type VersionView } from '@/lib/queries/template-for-editor';

/** Published versions, the latest first, and the sets that use them. */
export function Versions({ versions }: { versions: readonly VersionView[] }) {
  if (versions.length === 0) {
    return (
      <EmptyState title="Nothing is published yet">
        Sets take published versions only. When the draft is whole, publish it; it stays as it is from then on.
      </EmptyState>
    );
  }
  return (
    <>
      <h2 className="mb-3">Versions</h2>
      <ul className="grid max-w-measure gap-2 text-small">
        {versions.map((version) => (
          <li key={version.id} className="grid gap-x-4 sm:grid-cols-[6rem_1fr]">
            <span className="font-semibold">Version {version.number}</span>
            <span>
              published <TimeStamp at={version.publishedAt} zone="UTC" style="date" /> by {version.publishedBy}
              <span className="text-grey">
                {version.usedIn.length === 0 ? ' · in no set' : ` · in ${version.usedIn.join('; ')}`}
              </span>
            </span>
          </li>
        ))}
      </ul>
    </>
  );
}
