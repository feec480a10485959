import { redirect } from 'next/navigation';
import { SiteHead } from '@/app/_components/page-head';
import { requireActor } from '@/app/_server/current-actor';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { EmptyState } from '@/components/ui/states';
import { isStaffRole } from '@/lib/domain/roles';
import { paths } from '@/lib/paths';
import { presentOwnSets } from '@/lib/presenters/own-sets';
import { ownSets } from '@/lib/queries/own-sets';
import { SetLines } from './_components/set-lines';

export const metadata = { title: 'My work' };

/** A student's sets in all their courses: what is open first, then what is being marked, then what is out. */
export default async function WorkPage() {
  const actor = await requireActor();
  const roles = [...actor.memberships.values()].map(({ role }) => role);
  if (!roles.includes('student') && roles.some(isStaffRole)) redirect(paths.courses());
  const now = new Date();
  const rows = await ownSets(actor.userId, now);
  const work = presentOwnSets(rows, now);
  const notices = new Map(rows.filter((row) => row.courseNotice).map((row) => [row.courseCode, row.courseNotice]));
  const isEmpty = Object.values(work).every((lines) => lines.length === 0);
  return (
    <>
      <SiteHead actor={actor} here="work" place="My work" />
      <ScriptPage>
        <Section
          margin={
            notices.size > 0
              ? [...notices].map(([code, notice]) => (
                  <MarginNote key={code}>
                    {code}: {notice}
                  </MarginNote>
                ))
              : null
          }
        >
          <PageTitle>My work</PageTitle>
          {isEmpty ? (
            <EmptyState title={roles.length === 0 ? 'You are in no course yet' : 'No set is open yet'}>
              {roles.length === 0
                ? 'Your instructor puts you on the roster of a course; its sets appear here then.'
                : 'Your sets appear here when they open. There is nothing to do until then.'}
            </EmptyState>
          ) : (
            <p className="max-w-measure text-grey">
              Times are those of each course. Every student has their own numbers, so answers differ from student to
              student.
            </p>
          )}
        </Section>
        <SetLines heading="Open" lines={work.open} />
        <SetLines heading="Being marked" lines={work['being-marked']} />
        <SetLines heading="Released" lines={work.released} />
      </ScriptPage>
    </>
  );
}
