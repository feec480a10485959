import { SetHead } from '@/app/(course)/_components/course-head';
import { openCoursePage } from '@/app/_server/course-page';
import { pageOf } from '@/app/_server/page';
import { ButtonLink } from '@/components/ui/button';
import { PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { EmptyState } from '@/components/ui/states';
import { paths } from '@/lib/paths';
import { deliveriesOf } from '@/lib/queries/deliveries';
import { setForStaff } from '@/lib/queries/set-for-staff';
import { LiveDeliveries } from './_components/live-deliveries';

export const metadata = { title: 'Deliveries' };

type Props = { params: Promise<{ courseId: string; setId: string }> };

/** What became of the e-mail of each score report of a set. */
export default async function DeliveriesPage({ params }: Props) {
  const { actor, course, ids } = await openCoursePage<'setId'>(params, 'release-scores');
  const { set, rows } = await pageOf(async () => ({
    set: await setForStaff(course.id, ids.setId),
    rows: await deliveriesOf(actor, ids.setId),
  }));
  return (
    <>
      <SetHead actor={actor} course={course} set={set} place="Deliveries" page="deliveries" waiting={set.waiting} />
      <ScriptPage margin="none">
        <Section>
          <PageTitle kicker={`${course.code} · set ${set.number}, ${set.title}`}>Deliveries of score reports</PageTitle>
          <p className="mb-4 max-w-measure text-grey">
            “Sent” means that the mail server has taken the report. One whose hand-over was cut short is unconfirmed: it
            may have gone out or not, and is not sent again by itself. What failed or is unconfirmed waits for a person
            and stands first.
          </p>
          {rows.length === 0 ? (
            <EmptyState
              title="No report has been written yet"
              action={<ButtonLink href={paths.release(course.id, set.id)}>To the release</ButtonLink>}
            >
              Reports are written and sent when the scores of this set are released.
            </EmptyState>
          ) : (
            <LiveDeliveries courseId={course.id} problemSetId={set.id} zone={course.timeZone} rows={rows} />
          )}
        </Section>
      </ScriptPage>
    </>
  );
}
