import { SiteHead } from '@/app/_components/page-head';
import { requireActor } from '@/app/_server/current-actor';
import { pageOf } from '@/app/_server/page';
import { ScriptPage } from '@/components/ui/script-page';
import { canTryReading } from '@/lib/policies/can-try-reading';
import { requireAllowed } from '@/lib/policies/decide';
import { ReadingDesk } from './_components/reading-desk';

export const metadata = { title: 'Try a reading' };

/** Where anyone in a course tries how typed mathematics is read. Nothing typed here leaves the browser. */
export default async function ReadingPage() {
  const actor = await requireActor();
  await pageOf(() => Promise.resolve().then(() => requireAllowed(canTryReading(actor))));
  return (
    <>
      <SiteHead actor={actor} here="reading" place="Try a reading" />
      <ScriptPage>
        <ReadingDesk />
      </ScriptPage>
    </>
  );
}
