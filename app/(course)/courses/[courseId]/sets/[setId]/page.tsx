import { redirect } from 'next/navigation';
import { setName, SetHead } from '@/app/(course)/_components/course-head';
import { SetState } from '@/app/(course)/_components/set-state';
import { requireActor } from '@/app/_server/current-actor';
import { idsOf, pageOf } from '@/app/_server/page';
import { PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { roleIn } from '@/lib/domain/actor';
import { hasBegun } from '@/lib/domain/problem-set-change';
import { paths } from '@/lib/paths';
import { decide, requireAllowed } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { setForStaff } from '@/lib/queries/set-for-staff';
import { countStudents } from '@/lib/queries/sets-of-course';
import { shelfFor } from '@/lib/queries/shelf';
import { AddQuestion } from './_components/add-question';
import { Plan } from './_components/plan';
import { QuestionRow } from './_components/question-row';
import { SetMargin } from './_components/set-margin';

export const metadata = { title: 'Problem set' };

type Props = { params: Promise<{ courseId: string; setId: string }> };

/** A set for its staff: its questions and points, its times and policy, and the way it goes from draft to closed. */
export default async function SetPage({ params }: Props) {
  const actor = await requireActor();
  const { courseId, setId } = await idsOf(params);
  const { course, set, students } = await pageOf(async () => {
    const found = await courseForActor(actor, courseId);
    if (roleIn(actor, courseId) === 'student') redirect(paths.workSet(setId));
    requireAllowed(decide(actor, 'view-problem-sets', found));
    return { course: found, set: await setForStaff(courseId, setId), students: await countStudents(courseId) };
  });
  const now = new Date();
  const mayEdit = decide(actor, 'edit-problem-sets', course).allowed;
  const mayRelease = decide(actor, 'release-scores', course).allowed;
  const mayReorder = mayEdit && !hasBegun(set, now);
  const shelf = mayReorder ? await shelfFor(actor) : [];
  return (
    <>
      <SetHead
        actor={actor}
        course={course}
        set={set}
        place={setName(set)}
        page="set"
        waiting={set.waiting}
        status={<SetState set={set} zone={course.timeZone} now={now} />}
      />
      <ScriptPage>
        <Section
          margin={
            <SetMargin
              course={course}
              set={set}
              students={students}
              mayEdit={mayEdit}
              mayRelease={mayRelease}
              now={now}
            />
          }
        >
          <PageTitle kicker={`${course.code} · problem set ${set.number}`}>{set.title}</PageTitle>
          <Plan course={course} set={set} mayEdit={mayEdit} now={now} />
        </Section>
        {set.items.map((item) => (
          <QuestionRow key={item.id} course={course} set={set} item={item} mayChange={mayReorder} />
        ))}
        {set.items.length === 0 || mayReorder ? (
          <AddQuestion course={course} set={set} shelf={shelf} mayChange={mayReorder} />
        ) : null}
      </ScriptPage>
    </>
  );
}
