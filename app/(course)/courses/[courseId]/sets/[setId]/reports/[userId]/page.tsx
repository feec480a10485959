import { SetHead } from '@/app/(course)/_components/course-head';
import { requireActor } from '@/app/_server/current-actor';
import { idsOf, pageOf } from '@/app/_server/page';
import { AppealState } from '@/components/report/appeal-state';
import { EarlierReports } from '@/components/report/earlier-reports';
import { ReportChanges, ReportTotal, ScoreReport } from '@/components/report/score-report';
import { Notice } from '@/components/ui/notice';
import { PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { TimeStamp } from '@/components/ui/time-stamp';
import { deliveryWords } from '@/lib/presenters/delivery-words';
import { staffReport } from '@/lib/queries/staff-report';

export const metadata = { title: 'Score report' };

type Props = { params: Promise<{ courseId: string; setId: string; userId: string }> };

/** One student's report as the staff sees it; before release, what it would be now. */
export default async function StaffReportPage({ params }: Props) {
  const actor = await requireActor();
  const ids = await idsOf(params);
  const { course, set, studentName, content, reports, appeals, witnesses } = await pageOf(() =>
    staffReport(actor, ids),
  );
  const zone = course.timeZone;
  const [latest] = reports;
  return (
    <>
      <SetHead
        actor={actor}
        course={course}
        set={set}
        place={latest ? 'Score report' : 'Preview of a score report'}
        page="release"
        status={studentName}
      />
      <ScriptPage>
        <Section
          margin={
            <div className="grid gap-4">
              <ReportTotal content={content} />
              {latest ? <p className="text-small text-grey">E-mail: {deliveryWords[latest.delivery]}</p> : null}
              <EarlierReports reports={reports} zone={zone} />
            </div>
          }
        >
          <PageTitle kicker={`Score report, set ${content.set.number}: ${content.set.title}`}>
            {studentName ?? 'A student'}
          </PageTitle>
          {latest ? (
            <>
              <p className="text-grey">
                <TimeStamp at={latest.createdAt} zone={zone} />. {latest.reason}
              </p>
              <ReportChanges content={content} revision={latest.revision} />
            </>
          ) : (
            <Notice title="Preview">
              Nothing of this has been sent. It changes while marking goes on, and shows what the student would get if
              the scores were released now.
              {studentName === null ? ' This set is marked without names until it is released.' : null}
            </Notice>
          )}
        </Section>
        <ScoreReport
          content={content}
          witnesses={witnesses}
          appealOf={(part) => {
            const made = appeals.findLast(({ answerId }) => answerId === part.answerId);
            return made ? <AppealState appeal={made} zone={zone} who="The student" /> : null;
          }}
        />
      </ScriptPage>
    </>
  );
}
