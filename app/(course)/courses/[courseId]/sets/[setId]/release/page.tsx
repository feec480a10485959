import { SetHead } from '@/app/(course)/_components/course-head';
import { SetState } from '@/app/(course)/_components/set-state';
import { requireActor } from '@/app/_server/current-actor';
import { idsOf, pageOf } from '@/app/_server/page';
import { Notice } from '@/components/ui/notice';
import { PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { decide } from '@/lib/policies/decide';
import { releaseOverview } from '@/lib/queries/release-overview';
import { ReleaseStep } from './_components/release-step';
import { ReleaseTable } from './_components/release-table';
import { WhatWaits } from './_components/what-waits';

export const metadata = { title: 'Release' };

type Props = { params: Promise<{ courseId: string; setId: string }> };

/** The release of a set's scores: what waits, who is held back, any student's report beforehand, and the step itself. */
export default async function ReleasePage({ params }: Props) {
  const actor = await requireActor();
  const ids = await idsOf(params);
  const now = new Date();
  const overview = await pageOf(() => releaseOverview(actor, ids, now));
  const { course, set, named } = overview;
  const mayClose = decide(actor, 'edit-problem-sets', course).allowed;
  const begun = set.state === 'closed' || set.state === 'released';
  return (
    <>
      <SetHead
        actor={actor}
        course={course}
        set={set}
        place="Release"
        page="release"
        waiting={set.waiting}
        status={<SetState set={set} zone={course.timeZone} now={now} />}
      />
      <ScriptPage>
        <Section margin={<ReleaseStep overview={overview} mayClose={mayClose} />}>
          <PageTitle kicker={`${course.code} · set ${set.number}, ${set.title}`}>
            {set.state === 'released' ? 'The scores are released' : 'Release the scores'}
          </PageTitle>
          <p className="max-w-measure">
            Release is recorded student by student. Each gets a score report by e-mail and can appeal from then on; the
            set is released when all are.
          </p>
          <div className="mt-4">
            <Notice tone="caution">
              Reports reveal answers, and students talk: those with a running extension are held back. Verdicts of the
              checker are advice until the set’s policy or a person makes them marks, and a student can always ask for a
              person. The rules of your course and institution on grading, appeals, accommodations, academic integrity
              and student records govern.
            </Notice>
          </div>
        </Section>
        {begun ? <WhatWaits overview={overview} /> : null}
        <Section
          label="Students"
          margin={
            <p className="text-small text-grey">
              {named ? 'A name leads to' : 'A number leads to'} the report as it is, or as it would be now.
              {named ? null : ' This set is marked without names until it is released.'}
            </p>
          }
        >
          <ReleaseTable overview={overview} />
        </Section>
      </ScriptPage>
    </>
  );
}
