import { SetHead } from '@/app/(course)/_components/course-head';
import { SetState } from '@/app/(course)/_components/set-state';
import { requireActor } from '@/app/_server/current-actor';
import { idsOf, pageOf } from '@/app/_server/page';
import { EmptyState } from '@/components/ui/states';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { agreementSentence } from '@/lib/presenters/agreement-words';
import { presentConsistency } from '@/lib/presenters/consistency';
import { consistencyOfSet } from '@/lib/queries/consistency-of-set';
import { AgreementPlot } from './_components/agreement-plot';
import { Figures } from './_components/figures';
import { PairsTable } from './_components/pairs-table';
import { SettleList } from './_components/settle-list';

export const metadata = { title: 'Consistency' };

type Props = { params: Promise<{ courseId: string; setId: string }> };

/** How alike a set was marked: the first markings against the blind second ones, overall and for each two graders. */
export default async function ConsistencyPage({ params }: Props) {
  const actor = await requireActor();
  const ids = await idsOf(params);
  const found = await pageOf(() => consistencyOfSet(actor, ids));
  const { course, set, ownOnly, maySettle, outstanding } = found;
  const { overall, rows, toSettle } = presentConsistency(found.pairs, {
    ownOnly,
    tolerance: set.policy.settleTolerance,
  });
  return (
    <>
      <SetHead
        actor={actor}
        course={course}
        set={set}
        place="Consistency"
        page="consistency"
        waiting={set.waiting}
        status={<SetState set={set} zone={course.timeZone} now={new Date()} />}
      />
      <ScriptPage>
        <Section margin={<Figures row={overall} outstanding={outstanding} />}>
          <PageTitle kicker={`${course.code} · set ${set.number}, ${set.title}`}>
            {ownOnly === null ? 'How alike was it marked?' : 'How alike did you mark?'}
          </PageTitle>
          <p className="mb-3 max-w-measure">
            Some answers are marked a second time by another grader who does not see the first marking. The two credits
            are compared here as they were given, before any settling.
            {ownOnly === null ? null : ' You see your own pairs only; your co-markers are not named.'}
          </p>
          <p className="max-w-measure font-semibold">{agreementSentence(overall.agreement)}</p>
        </Section>
        {rows.length === 0 ? (
          <Section>
            <EmptyState title="No pair of markings yet">
              {outstanding === 0
                ? 'Second markings are drawn while answers are ruled on, at the share that the set’s policy gives.'
                : `${outstanding === 1 ? 'One second marking is' : `${outstanding} second markings are`} still to be done; figures appear with the first.`}
            </EmptyState>
          </Section>
        ) : (
          <>
            <Section
              label="Agreement in a picture"
              margin={
                <MarginNote>
                  A mark is the figure, the line through it its 95 % interval: where the true share may well lie, given
                  so many pairs. Long lines mean little evidence, not bad marking.
                </MarginNote>
              }
            >
              <AgreementPlot rows={[overall, ...rows]} />
            </Section>
            <Section
              label="Graders in pairs"
              margin={
                <MarginNote>
                  Kappa is 1 where all credits are the same and 0 where they are the same no more often than chance
                  would make them. It is told with its interval only from 12 pairs on and where some differ. Leaning is
                  how much more of the full credit the first named gave, on average; apart are the pairs beyond the
                  set’s tolerance.
                </MarginNote>
              }
            >
              <PairsTable rows={rows} />
              <ul className="mt-4 grid max-w-measure gap-2 text-small">
                {rows.map((row) => (
                  <li key={row.id}>
                    <span className="font-semibold">{row.name}.</span> {agreementSentence(row.agreement)}
                  </li>
                ))}
              </ul>
            </Section>
          </>
        )}
        {maySettle ? (
          <Section label="To settle">
            <h2 className="mb-3">To settle</h2>
            <SettleList courseId={course.id} setId={set.id} items={toSettle} />
          </Section>
        ) : null}
      </ScriptPage>
    </>
  );
}
