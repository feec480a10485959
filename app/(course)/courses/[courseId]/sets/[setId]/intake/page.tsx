import { setName, SetHead } from '@/app/(course)/_components/course-head';
import { openCoursePage } from '@/app/_server/course-page';
import { pageOf } from '@/app/_server/page';
import { Notice } from '@/components/ui/notice';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { hasBegun } from '@/lib/domain/problem-set-change';
import { intakeStateInWords } from '@/lib/presenters/intake-words';
import { intakesOfSet } from '@/lib/queries/intakes-of-set';
import { setForStaff } from '@/lib/queries/set-for-staff';
import { paths } from '@/lib/paths';
import { IntakeTable } from './_components/intake-table';
import { UploadForm } from './_components/upload-form';

export const metadata = { title: 'Intake' };

type Props = { params: Promise<{ courseId: string; setId: string }> };

/** Bulk intake of a set: the sheet to fill in, the upload, and what was uploaded before. */
export default async function IntakePage({ params }: Props) {
  const { actor, course, decision, ids } = await openCoursePage(params, 'take-in-answers');
  const onlyOwn = decision.allowed && decision.grant === 'own-sections' ? actor.userId : null;
  const { set, intakes } = await pageOf(async () => {
    const found = await setForStaff(ids.courseId, ids.setId);
    return { set: found, intakes: await intakesOfSet(found.id, onlyOwn) };
  });
  const begun = hasBegun(set, new Date());
  return (
    <>
      <SetHead actor={actor} course={course} set={set} place="Intake" page="intake" waiting={set.waiting} />
      <ScriptPage>
        <Section
          margin={
            <div className="grid gap-3">
              <MarginNote>
                An answer that a student typed is never overwritten: a row for it becomes a new attempt, and the earlier
                one is kept.
              </MarginNote>
              <MarginNote>The same file twice does nothing twice.</MarginNote>
            </div>
          }
        >
          <PageTitle kicker={setName(set)}>Answers in bulk</PageTitle>
          {set.state === 'released' ? (
            <Notice title="Released">The scores of this set are released; it takes no further answers.</Notice>
          ) : begun ? (
            <UploadForm
              problemSetId={set.id}
              blankHref={`/api/intakes/blank?set=${set.id}`}
              onward={paths.intake(course.id, set.id, '')}
            />
          ) : (
            <Notice title="Not open yet">Answers can be taken in once the set has opened.</Notice>
          )}
        </Section>
        <Section>
          <IntakeTable
            zone={course.timeZone}
            lines={intakes.map(({ at, ...line }) => ({
              ...line,
              at: at.toISOString(),
              words: intakeStateInWords(line.state),
              href: paths.intake(course.id, set.id, line.id),
            }))}
          />
        </Section>
      </ScriptPage>
    </>
  );
}
