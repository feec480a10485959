import Link from 'next/link';
import { PageHead } from '@/app/_components/page-head';
import { siteNav } from '@/app/_components/site-nav';
import { requireActor } from '@/app/_server/current-actor';
import { idsOf, pageOf } from '@/app/_server/page';
import { EarlierReports } from '@/components/report/earlier-reports';
import { ReportChanges, ReportTotal, ScoreReport } from '@/components/report/score-report';
import { ButtonLink } from '@/components/ui/button';
import { PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { EmptyState } from '@/components/ui/states';
import { TimeStamp } from '@/components/ui/time-stamp';
import { paths } from '@/lib/paths';
import { ownReport } from '@/lib/queries/own-report';
import { OwnAppeal, WayToAppeal } from './_components/own-appeal';

export const metadata = { title: 'Score report' };

type Props = { params: Promise<{ setId: string }> };

/** A student's score report: the same as was mailed, with formulas typeset, and the way to appeal. */
export default async function ReportPage({ params }: Props) {
  const actor = await requireActor();
  const { setId } = await idsOf(params);
  const report = await pageOf(() => ownReport(actor, setId));
  const { set, reports, witnesses } = report;
  const zone = set.course.timeZone;
  const name = `Set ${set.number}, ${set.title}`;
  const [latest] = reports;
  const now = new Date();
  // As the set has it now: the time for appeals may have been made longer since the report was written.
  const appeals = { until: set.appealsUntil?.toISOString() ?? null, mayLower: set.policy.appealMayLower };
  return (
    <>
      <PageHead
        actor={actor}
        nav={siteNav(actor, 'work').map((item) => ({ ...item, current: false }))}
        steps={[
          { label: set.course.code, href: paths.work() },
          { label: name, href: paths.workSet(set.id) },
        ]}
        place="Score report"
        status={
          set.releasedAt ? (
            <>
              released <TimeStamp at={set.releasedAt} zone={zone} />
            </>
          ) : (
            'not released'
          )
        }
      />
      <ScriptPage>
        {latest ? (
          <>
            <Section
              margin={
                <div className="grid gap-4">
                  <ReportTotal content={latest.content} />
                  <EarlierReports reports={reports} zone={zone} />
                </div>
              }
            >
              <PageTitle kicker={`${latest.content.course.code} · ${latest.content.course.title}`}>
                Score report, set {latest.content.set.number}: {latest.content.set.title}
              </PageTitle>
              <p className="text-grey">
                For {latest.content.student}, <TimeStamp at={latest.createdAt} zone={zone} />. {latest.reason}
              </p>
              <ReportChanges content={latest.content} revision={latest.revision} />
              <p className="no-print mt-3 text-small text-grey">
                It has also been sent to you by e-mail. It prints well.{' '}
                <Link href={paths.workSet(set.id)}>Back to the set</Link>
              </p>
            </Section>
            <ScoreReport
              content={{ ...latest.content, appeals }}
              witnesses={witnesses}
              appealOf={(part) => <OwnAppeal report={report} part={part} />}
              appealFormOf={(part, item) => (
                <WayToAppeal report={report} part={part} position={item.position} now={now} />
              )}
            />
          </>
        ) : (
          <Section>
            <PageTitle kicker={name}>Score report</PageTitle>
            <EmptyState
              title="Your scores are not out yet"
              action={<ButtonLink href={paths.workSet(set.id)}>Back to the set</ButtonLink>}
            >
              When they are released, your report comes by e-mail and stands here: part by part how you were marked, and
              how to appeal.
            </EmptyState>
          </Section>
        )}
      </ScriptPage>
    </>
  );
}
