import { redirect } from 'next/navigation';
import { CourseHead } from '@/app/(course)/_components/course-head';
import { requireActor } from '@/app/_server/current-actor';
import { idsOf, pageOf } from '@/app/_server/page';
import { ButtonLink } from '@/components/ui/button';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { EmptyState } from '@/components/ui/states';
import { roleIn } from '@/lib/domain/actor';
import { paths } from '@/lib/paths';
import { decide, requireAllowed } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { countStudents, setsOfCourse } from '@/lib/queries/sets-of-course';
import { SetsTable } from './_components/sets-table';

export const metadata = { title: 'Course' };

type Props = { params: Promise<{ courseId: string }> };

/** A course for its staff: its sets, where each stands, and what waits. */
export default async function CoursePage({ params }: Props) {
  const actor = await requireActor();
  const { courseId } = await idsOf(params);
  const { course, sets, students } = await pageOf(async () => {
    const found = await courseForActor(actor, courseId);
    if (roleIn(actor, courseId) === 'student') redirect(paths.work());
    requireAllowed(decide(actor, 'view-problem-sets', found));
    return { course: found, sets: await setsOfCourse(courseId), students: await countStudents(courseId) };
  });
  const mayEdit = decide(actor, 'edit-problem-sets', course).allowed;
  const make = mayEdit ? (
    <ButtonLink look="primary" href={paths.newSet(course.id)}>
      New problem set
    </ButtonLink>
  ) : null;
  const waiting = sets.reduce((sum, set) => sum + set.waiting, 0);
  return (
    <>
      <CourseHead actor={actor} course={course} place={course.code} page="sets" />
      <ScriptPage>
        <Section
          margin={
            <div className="grid gap-4">
              <p>
                <span className="text-mark font-semibold">{waiting}</span>{' '}
                <span className="text-small text-grey">
                  {waiting === 1 ? 'answer waits' : 'answers wait'} for a person
                </span>
              </p>
              {sets.length > 0 && make ? <div>{make}</div> : null}
              <MarginNote>
                {students} {students === 1 ? 'student' : 'students'}. Times are those of {course.timeZone}.
              </MarginNote>
              {course.notice ? <MarginNote>{course.notice}</MarginNote> : null}
            </div>
          }
        >
          <PageTitle kicker={`${course.code} · ${course.term}`}>{course.title}</PageTitle>
          {sets.length === 0 ? (
            <EmptyState title="No problem sets yet" action={make}>
              A set is a list of questions from the shelf, with points, dates and a marking policy.
            </EmptyState>
          ) : (
            <SetsTable course={course} sets={sets} students={students} now={new Date()} />
          )}
        </Section>
      </ScriptPage>
    </>
  );
}
