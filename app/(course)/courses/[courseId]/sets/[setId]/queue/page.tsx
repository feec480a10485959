import Link from 'next/link';
import { setName, SetHead } from '@/app/(course)/_components/course-head';
import { openCoursePage } from '@/app/_server/course-page';
import { pageOf } from '@/app/_server/page';
import { QueryProvider } from '@/components/ui/query-provider';
import { EmptyState } from '@/components/ui/states';
import { Notice } from '@/components/ui/notice';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { flagReasons, flagSentence } from '@/lib/domain/flag-reasons';
import { canSeeStudentIdentities } from '@/lib/policies/can-see-student-identities';
import { decide, sectionBound } from '@/lib/policies/decide';
import { paths } from '@/lib/paths';
import { scriptCode } from '@/lib/presenters/script-code';
import { disagreementsOf, ownSecondMarkings, queueOfSet, queueStamp } from '@/lib/queries/queue-of-set';
import { setForStaff } from '@/lib/queries/set-for-staff';
import { QueueTable, type QueueLine } from './_components/queue-table';
import { QueuePulse } from './_components/queue-pulse';
import { TakeNext } from './_components/take-next';

export const metadata = { title: 'Queue' };

type Props = {
  params: Promise<{ courseId: string; setId: string }>;
  searchParams: Promise<{ done?: string }>;
};

/** What waits for a person in a set, who holds what, and the way to the desk. */
export default async function QueuePage({ params, searchParams }: Props) {
  const { actor, course, decision, ids } = await openCoursePage(params, 'work-queue');
  const { done } = await searchParams;
  const now = new Date();
  const maySettle = decide(actor, 'settle-disagreements', course).allowed;
  const { set, rows, second, toSettle, stamp } = await pageOf(async () => {
    const found = await setForStaff(ids.courseId, ids.setId);
    const [waiting, own, differing, mark] = await Promise.all([
      queueOfSet({
        problemSetId: found.id,
        courseId: course.id,
        graderId: actor.userId,
        sections: sectionBound(actor, course, decision),
        now,
      }),
      ownSecondMarkings(found.id, actor.userId),
      maySettle ? disagreementsOf(found.id) : Promise.resolve([]),
      queueStamp(found.id),
    ]);
    return { set: found, rows: waiting, second: own, toSettle: differing, stamp: mark };
  });
  const named = canSeeStudentIdentities(actor, course, {
    released: set.state === 'released',
    headTaSeesIdentities: set.policy.headTaSeesIdentities,
  }).allowed;
  const free = rows.filter(({ state }) => state === 'waiting').length;
  const lines: QueueLine[] = rows.map((row) => ({
    ...row,
    href: paths.desk(course.id, set.id, row.id),
    script: named ? row.studentName : scriptCode(set.id, row.studentId),
    since: row.since.toISOString(),
    held: row.heldBy === actor.userId ? 'you' : (row.holderName ?? ''),
  }));
  const reasons = flagReasons
    .map((reason) => ({ reason, count: rows.filter((row) => row.reasons.includes(reason)).length }))
    .filter(({ count }) => count > 0);
  return (
    <>
      <SetHead actor={actor} course={course} set={set} place="Queue" page="queue" waiting={rows.length} />
      <ScriptPage>
        <Section
          stickyMargin
          margin={
            <div className="grid gap-5">
              <p className="flex items-baseline gap-x-2">
                <span className="text-mark font-semibold">{free}</span>
                <span className="text-small text-grey">waiting</span>
              </p>
              <TakeNext ids={{ courseId: course.id, problemSetId: set.id }} disabled={free === 0} />
              {reasons.length > 0 ? (
                <ul className="grid gap-1 text-small">
                  {reasons.map(({ reason, count }) => (
                    <li key={reason}>
                      <span className="font-semibold">{count}</span>{' '}
                      <span className="text-grey">{flagSentence(reason)}</span>
                    </li>
                  ))}
                </ul>
              ) : null}
              {named ? null : <MarginNote>Scripts stand without names until the set is released.</MarginNote>}
              <QueryProvider>
                <QueuePulse problemSetId={set.id} stamp={stamp} />
              </QueryProvider>
            </div>
          }
        >
          <PageTitle kicker={setName(set)}>Review queue</PageTitle>
          {done ? (
            <div className="mb-4">
              <Notice title="Done">Nothing more waits for you in this set just now.</Notice>
            </div>
          ) : null}
          <MarkingList
            title="To mark a second time"
            rows={second.map((row) => ({ ...row, href: paths.secondMarking(course.id, set.id, row.id) }))}
            setId={set.id}
            note="Assigned to you. You see the answer, never the first mark."
          />
          <MarkingList
            title="To settle"
            rows={toSettle.map((row) => ({ ...row, href: paths.settle(course.id, set.id, row.id) }))}
            setId={set.id}
            note="Two graders differ beyond this set’s tolerance."
          />
          {lines.length === 0 ? (
            <EmptyState title="Nothing waits">
              {set.state === 'open'
                ? 'What the checker leaves to a person appears here as answers come in.'
                : 'Every answer that needed a person has been ruled on.'}
            </EmptyState>
          ) : (
            <QueueTable lines={lines} />
          )}
        </Section>
      </ScriptPage>
    </>
  );
}

interface MarkingListProps {
  readonly title: string;
  readonly note: string;
  readonly setId: string;
  readonly rows: readonly { id: string; position: number; partKey: string; studentId: string; href: string }[];
}

/** A short list of answers that wait for this person by name; nothing at all where there are none. */
function MarkingList({ title, note, rows, setId }: MarkingListProps) {
  if (rows.length === 0) return null;
  return (
    <section aria-label={title} className="mb-6">
      <h2>
        {title} · {rows.length}
      </h2>
      <p className="text-small text-grey">{note}</p>
      <ul className="mt-1 flex max-h-48 flex-wrap gap-x-5 gap-y-1 overflow-y-auto" tabIndex={0}>
        {rows.map(({ id, href, position, partKey, studentId }) => (
          <li key={id}>
            <Link href={href}>
              question {position} {partKey}, {scriptCode(setId, studentId)}
            </Link>
          </li>
        ))}
      </ul>
    </section>
  );
}
