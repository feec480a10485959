import { AuditLog } from '@/app/_components/audit-log';
import { CourseHead } from '@/app/_components/page-head';
import { openCoursePage } from '@/app/_server/course-page';
import { PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { paths } from '@/lib/paths';

export const metadata = { title: 'Log' };

type Props = {
  params: Promise<{ courseId: string }>;
  searchParams: Promise<Record<string, string | string[] | undefined>>;
};

/** What happened in a course: who did what, when. */
export default async function CourseLogPage({ params, searchParams }: Props) {
  const { actor, course } = await openCoursePage(params, 'read-audit-log');
  return (
    <>
      <CourseHead actor={actor} course={course} here="log" place="Log" />
      <ScriptPage margin="none">
        <Section>
          <PageTitle kicker={`${course.title}, ${course.term}`}>Log</PageTitle>
          <AuditLog
            courseId={course.id}
            timeZone={course.timeZone}
            path={paths.log(course.id)}
            searchParams={searchParams}
          />
        </Section>
      </ScriptPage>
    </>
  );
}
