import { CourseHead } from '@/app/_components/page-head';
import { openCoursePage } from '@/app/_server/course-page';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { apiTokensOf } from '@/lib/queries/api-tokens';
import { TokenForm } from './_components/token-form';
import { TokenTable } from './_components/token-table';

export const metadata = { title: 'Tokens' };

type Props = { params: Promise<{ courseId: string }> };

/** The course's tokens for programs. */
export default async function TokensPage({ params }: Props) {
  const { actor, course } = await openCoursePage(params, 'manage-tokens');
  const tokens = await apiTokensOf(course.id, new Date());
  return (
    <>
      <CourseHead actor={actor} course={course} here="tokens" place="Tokens" />
      <ScriptPage>
        <Section
          margin={
            <MarginNote>
              A token is good for this course only. It also ends when whoever made it leaves the course.
            </MarginNote>
          }
        >
          <PageTitle kicker={`${course.title}, ${course.term}`}>Tokens for programs</PageTitle>
          <TokenTable courseId={course.id} tokens={tokens} zone={course.timeZone} />
        </Section>
        <Section
          label="Make a token"
          margin={
            <MarginNote>Marks are records of students: your institution’s rules govern where they may go.</MarginNote>
          }
        >
          <h2 className="mb-3">Make a token</h2>
          <TokenForm courseId={course.id} />
        </Section>
      </ScriptPage>
    </>
  );
}
