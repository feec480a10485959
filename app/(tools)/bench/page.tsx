import { SiteHead } from '@/app/_components/page-head';
import { requireActor } from '@/app/_server/current-actor';
import { pageOf } from '@/app/_server/page';
import { Notice } from '@/components/ui/notice';
import { PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { countAttempt } from '@/lib/auth/attempt-limits';
import { checkMany } from '@/lib/jobs/check-many';
import { canUseCheckBench } from '@/lib/policies/can-use-check-bench';
import { requireAllowed } from '@/lib/policies/decide';
import { BenchForm } from './_components/bench-form';
import { benchInputSchema, declarationsIn } from './_components/bench-input';
import { Examples } from './_components/examples';
import { figuresOfPair } from './_components/figures-of-pair';
import { Outcome } from './_components/outcome';
import { Pictures } from './_components/pictures';

export const metadata = { title: 'Check bench' };

type Props = { searchParams: Promise<Record<string, string | string[] | undefined>> };

/** Where staff try any answer against any reference. All of it is worked out on the server, in a checker thread. */
export default async function BenchPage({ searchParams }: Props) {
  const actor = await requireActor();
  await pageOf(() => Promise.resolve().then(() => requireAllowed(canUseCheckBench(actor))));
  const input = benchInputSchema.parse(await searchParams);
  const { symbols, faults } = declarationsIn(input.symbols);
  const { kind, reference, answer, upToPhase } = input;
  const ready = reference.trim() !== '' && answer.trim() !== '' && faults.length === 0;
  const counted = ready ? await countAttempt('checks', `user ${actor.userId}`) : null;
  const options = upToPhase ? { upToPhase: true } : {};
  const [pair] = counted?.allowed ? await checkMany([{ id: 'bench', kind, reference, answer, symbols, options }]) : [];
  const outcome = pair?.outcome;
  const readable = outcome !== undefined && 'verdict' in outcome && outcome.verdict !== 'unreadable' ? outcome : null;
  const figures =
    readable && (await figuresOfPair({ kind, reference, answer, symbols }, readable.evidence.witness?.values));
  return (
    <>
      <SiteHead actor={actor} here="bench" place="Check bench" />
      <ScriptPage>
        <Section
          margin={
            <nav aria-labelledby="examples">
              <h2 id="examples" className="mb-2">
                Examples
              </h2>
              <Examples />
            </nav>
          }
        >
          <PageTitle>Check bench</PageTitle>
          <p className="mb-4 max-w-measure text-grey">
            Try any answer against any reference: how both are read, what the checker decides, and on what it rests. The
            pair stands in the address of the page; nothing else is kept.
          </p>
          <BenchForm input={input} faults={faults} />
        </Section>
        {counted?.allowed === false ? (
          <Section>
            <Notice tone="caution">
              These are too many checks for now. Try again in {counted.retryAfterSeconds} seconds.
            </Notice>
          </Section>
        ) : null}
        {pair ? <Outcome pair={pair} /> : null}
        {figures ? <Pictures figures={figures} /> : null}
      </ScriptPage>
    </>
  );
}
