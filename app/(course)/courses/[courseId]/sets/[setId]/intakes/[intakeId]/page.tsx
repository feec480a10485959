import Link from 'next/link';
import { setName, SetHead } from '@/app/(course)/_components/course-head';
import { openCoursePage } from '@/app/_server/course-page';
import { pageOf } from '@/app/_server/page';
import { ButtonLink } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { Pager } from '@/components/ui/pager';
import { QueryProvider } from '@/components/ui/query-provider';
import { PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { TimeStamp } from '@/components/ui/time-stamp';
import { intakeStateInWords } from '@/lib/presenters/intake-words';
import { intakeOutcome, intakeRows, type IntakeRowFilter } from '@/lib/queries/intake-rows';
import { setForStaff } from '@/lib/queries/set-for-staff';
import { openIntake } from '@/lib/services/open-intake';
import { paths } from '@/lib/paths';
import { Decide } from './_components/decide';
import { Outcome } from './_components/outcome';
import { RowTable } from './_components/row-table';
import { Watch } from './_components/watch';

export const metadata = { title: 'Upload' };

type Props = {
  params: Promise<{ courseId: string; setId: string; intakeId: string }>;
  searchParams: Promise<{ rows?: string; page?: string }>;
};

const perPage = 100;
const underWay = ['uploaded', 'reading', 'committing', 'checking'];

/** One upload: what would be taken in and what is refused and why; then its progress, and what came of it. */
export default async function UploadPage({ params, searchParams }: Props) {
  const { actor, course, ids } = await openCoursePage(params, 'take-in-answers');
  const { rows: wanted, page: pageText } = await searchParams;
  const { set, intake } = await pageOf(async () => ({
    set: await setForStaff(ids.courseId, ids.setId),
    intake: await openIntake(actor, { intakeId: ids.intakeId, problemSetId: ids.setId, courseId: ids.courseId }),
  }));
  const filter: IntakeRowFilter = wanted === 'refused' || wanted === 'noted' ? wanted : 'all';
  const page = Math.max(1, Math.trunc(Number(pageText ?? '1')) || 1);
  const outcome = await intakeOutcome(intake.id);
  const rows = await intakeRows(intake.id, { filter, from: (page - 1) * perPage, most: perPage });
  const shown = { all: intake.rowsTotal, refused: intake.rowsRefused, noted: outcome.noted };
  const here = paths.intake(course.id, set.id, intake.id);
  const address = (next: { rows?: string; page?: number }) =>
    `${here}?${new URLSearchParams({ rows: next.rows ?? filter, page: String(next.page ?? 1) }).toString()}`;
  return (
    <>
      <SetHead
        actor={actor}
        course={course}
        set={set}
        place={intake.fileName}
        page="intake"
        waiting={set.waiting}
        status={intakeStateInWords(intake.state)}
      />
      <ScriptPage>
        <Section
          stickyMargin
          margin={
            <div className="grid gap-5">
              <Outcome intake={intake} outcome={outcome} />
              {intake.state === 'previewed' ? (
                <Decide
                  ids={{ courseId: course.id, problemSetId: set.id, intakeId: intake.id }}
                  accepted={intake.rowsAccepted}
                  refused={intake.rowsRefused}
                />
              ) : null}
              {intake.rowsTotal > 0 && intake.state !== 'previewed' ? (
                <p className="text-small">
                  <a href={`/api/intakes/${intake.id}/outcome`} download>
                    Download the outcome sheet
                  </a>
                </p>
              ) : null}
            </div>
          }
        >
          <PageTitle
            kicker={
              <>
                {setName(set)} · uploaded <TimeStamp at={intake.at} zone={course.timeZone} />
              </>
            }
          >
            {intake.fileName}
          </PageTitle>
          {underWay.includes(intake.state) ? (
            <QueryProvider>
              <Watch intakeId={intake.id} state={intake.state} total={intake.rowsAccepted} done={intake.rowsChecked} />
            </QueryProvider>
          ) : null}
          {intake.state === 'failed' ? (
            <div className="grid gap-4">
              <Notice tone="error" title="This sheet cannot be read">
                {intake.failure} Nothing was taken in.
              </Notice>
              <div>
                <ButtonLink href={paths.intakes(course.id, set.id)}>Upload a mended sheet</ButtonLink>
              </div>
            </div>
          ) : null}
          {intake.state === 'cancelled' ? <Notice title="Given up">Nothing of this sheet was taken in.</Notice> : null}
          {intake.rowsTotal > 0 ? (
            <>
              <nav aria-label="Rows" className="mt-4 mb-2 flex flex-wrap gap-x-5 text-small">
                {(['all', 'refused', 'noted'] as const).map((each) => (
                  <Link key={each} href={address({ rows: each })} aria-current={each === filter ? 'page' : undefined}>
                    {{ all: 'All rows', refused: 'Refused', noted: 'With a note' }[each]} · {shown[each]}
                  </Link>
                ))}
              </nav>
              <RowTable rows={rows} caption={`Rows of ${intake.fileName}`} taken={intake.state !== 'previewed'} />
              <Pager
                page={page}
                pageCount={Math.max(1, Math.ceil(shown[filter] / perPage))}
                hrefFor={(to) => address({ page: to })}
                label="rows"
              />
            </>
          ) : null}
        </Section>
      </ScriptPage>
    </>
  );
}
