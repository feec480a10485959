import Link from 'next/link';
import { ActionButton } from '@/app/_components/action-button';
import { Mark } from '@/components/ui/mark';
import { MarginNote } from '@/components/ui/script-page';
import { paths } from '@/lib/paths';
import { type ReleaseOverview } from '@/lib/queries/release-overview';
import { closeSetNow } from '../../actions';
import { ReleaseForm } from './release-form';

interface ReleaseStepProps {
  readonly overview: ReleaseOverview;
  readonly mayClose: boolean;
}

/** The margin of the release: how many are ready, and the next step, be it closing or releasing. */
export function ReleaseStep({ overview: { course, set, students }, mayClose }: ReleaseStepProps) {
  const out = students.filter(({ releasedAt }) => releasedAt !== null).length;
  const heldBack = students.filter(({ releasedAt, extendedUntil }) => releasedAt === null && extendedUntil !== null);
  const ready = students.filter(({ releasedAt, extendedUntil }) => releasedAt === null && extendedUntil === null);
  const waiting = ready.reduce((sum, { partsWaiting }) => sum + partsWaiting, 0);
  if (set.state === 'draft') return <MarginNote>The set is a draft; there is nothing to release yet.</MarginNote>;
  if (set.state === 'open') {
    return mayClose ? (
      <ActionButton
        action={closeSetNow}
        fields={{ courseId: course.id, problemSetId: set.id, revision: String(set.revision) }}
        label="Close the set…"
        look="danger"
        done="The set is closed. Its scores can be released when they are marked."
        confirm={{
          title: 'Close this set before its time?',
          words:
            'Students who have not handed in yet lose the rest of their time; those with an extension keep theirs. It can be opened again until its scores are released.',
        }}
      />
    ) : (
      <MarginNote>The set is still open. Its instructor can close it before its time.</MarginNote>
    );
  }
  return (
    <div className="grid gap-4">
      <Mark credit={out} of={`${students.length} students released`}>
        <p>
          {ready.length} can be released now
          {heldBack.length === 0 ? null : <>, {heldBack.length} held back</>}
        </p>
        {waiting === 0 ? null : (
          <p>
            {waiting} {waiting === 1 ? 'part of theirs waits' : 'parts of theirs wait'}
          </p>
        )}
      </Mark>
      {ready.length === 0 ? null : (
        <ReleaseForm
          courseId={course.id}
          problemSetId={set.id}
          ready={ready.length}
          heldBack={heldBack.length}
          waiting={waiting}
        />
      )}
      {out === 0 ? null : (
        <Link href={paths.deliveries(course.id, set.id)} className="text-small">
          What became of the e-mails
        </Link>
      )}
    </div>
  );
}
