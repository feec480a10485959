import { CourseHead } from '@/app/(course)/_components/course-head';
import { requireActor } from '@/app/_server/current-actor';
import { idsOf, pageOf } from '@/app/_server/page';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { decide, requireAllowed } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { NewSetForm } from './_components/new-set-form';

export const metadata = { title: 'New problem set' };

type Props = { params: Promise<{ courseId: string }> };

/** Where an instructor begins a problem set; everything but its title comes on its page. */
export default async function NewSetPage({ params }: Props) {
  const actor = await requireActor();
  const { courseId } = await idsOf(params);
  const course = await pageOf(async () => {
    const found = await courseForActor(actor, courseId);
    requireAllowed(decide(actor, 'edit-problem-sets', found));
    return found;
  });
  return (
    <>
      <CourseHead actor={actor} course={course} place="New problem set" page="sets" />
      <ScriptPage>
        <Section margin={<MarginNote>A draft is seen by staff only, until you open it.</MarginNote>}>
          <PageTitle kicker={course.code}>New problem set</PageTitle>
          <NewSetForm courseId={course.id} />
        </Section>
      </ScriptPage>
    </>
  );
}
