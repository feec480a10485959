import { SetHead } from '@/app/(course)/_components/course-head';
import { openCoursePage } from '@/app/_server/course-page';
import { pageOf } from '@/app/_server/page';
import { ButtonLink } from '@/components/ui/button';
import { DefinitionList } from '@/components/ui/definition-list';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { EmptyState } from '@/components/ui/states';
import { deliveryWords, needsPerson } from '@/lib/presenters/delivery-words';
import { paths } from '@/lib/paths';
import { deliveriesOf, type DeliveryRow } from '@/lib/queries/deliveries';
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
      <ScriptPage>
        <Section margin={<Counts rows={rows} />}>
          <PageTitle kicker={`${course.code} · set ${set.number}, ${set.title}`}>Deliveries of score reports</PageTitle>
          <p className="mb-4 max-w-measure text-grey">
            No report goes out twice by itself. One whose hand-over to the mail server was cut short may have gone out
            or not; a person decides whether it is sent again.
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

function Counts({ rows }: { rows: readonly DeliveryRow[] }) {
  const states = [...new Set(rows.map(({ state }) => state))];
  const count = (state: DeliveryRow['state']) => rows.filter((row) => row.state === state).length;
  if (states.length === 0) return null;
  const looks = rows.filter(({ state }) => needsPerson(state)).length;
  return (
    <div className="grid gap-3">
      <DefinitionList items={states.map((state) => ({ term: deliveryWords[state], value: String(count(state)) }))} />
      {looks === 0 ? null : (
        <MarginNote>{looks === 1 ? 'One needs' : `${looks} need`} a person’s look; they stand first.</MarginNote>
      )}
    </div>
  );
}
