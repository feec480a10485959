import { AdminHead } from '@/app/(admin)/_components/admin-head';
import { openAdminPage } from '@/app/_server/admin-page';
import { idsOf, pageOf } from '@/app/_server/page';
import { ButtonLink } from '@/components/ui/button';
import { PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { paths } from '@/lib/paths';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { EditCourseForm } from '../_components/edit-course-form';

export const metadata = { title: 'A course' };

type Props = { params: Promise<{ courseId: string }> };

/** What a course is called and how it runs. */
export default async function AdminCoursePage({ params }: Props) {
  const actor = await openAdminPage('manage-courses');
  const { courseId } = await idsOf(params);
  const course = await pageOf(() => courseForActor(actor, courseId));
  const { code, title, term, timeZone, tasSeeOwnSectionsOnly, notice, retentionMonths } = course;
  const values = { code, title, term, timeZone, tasSeeOwnSectionsOnly, notice, retentionMonths };
  return (
    <>
      <AdminHead
        actor={actor}
        here="courses"
        steps={[{ label: 'Courses', href: paths.adminCourses() }]}
        place={course.code}
      />
      <ScriptPage>
        <Section
          margin={
            <div className="grid gap-3 justify-items-start">
              <ButtonLink href={paths.roster(course.id)}>Roster</ButtonLink>
              <ButtonLink href={paths.log(course.id)}>Log</ButtonLink>
            </div>
          }
        >
          <PageTitle kicker={`${course.code}, ${course.term}`}>{course.title}</PageTitle>
          <EditCourseForm courseId={course.id} values={values} />
        </Section>
      </ScriptPage>
    </>
  );
}
