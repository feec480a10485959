import { AdminHead } from '@/app/(admin)/_components/admin-head';
import { openAdminPage } from '@/app/_server/admin-page';
import { DefinitionList } from '@/components/ui/definition-list';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { environment } from '@/lib/env';
import { mailState } from '@/lib/queries/mail-state';
import { countJobs, listFailedJobs } from '@/lib/queue/failed-jobs';
import { DeliveryTable } from './_components/delivery-table';
import { JobTable } from './_components/job-table';

export const metadata = { title: 'Mail and jobs' };

/** How the mail and the background work stand, and what needs a person. */
export default async function MailPage() {
  const actor = await openAdminPage('manage-accounts');
  const [mail, jobs, failed] = await Promise.all([mailState(), countJobs(), listFailedJobs()]);
  const { smtpUrl, mailFrom } = environment();
  const server = smtpUrl === null ? 'none set' : new URL(smtpUrl).host;
  return (
    <>
      <AdminHead actor={actor} here="mail" place="Mail and jobs" />
      <ScriptPage>
        <Section
          margin={
            <DefinitionList
              items={[
                { term: 'waiting', value: jobs.waiting },
                { term: 'running', value: jobs.running },
                { term: 'failed', value: jobs.failed },
              ]}
            />
          }
        >
          <PageTitle kicker={`Mail server: ${server} · from ${mailFrom}`}>Mail and jobs</PageTitle>
          <JobTable jobs={failed} />
        </Section>
        <Section
          margin={
            <div className="grid gap-4">
              <DefinitionList items={Object.entries(mail.counts).map(([term, value]) => ({ term, value }))} />
              <MarginNote>An unconfirmed mail may have arrived; it is never sent again by itself.</MarginNote>
            </div>
          }
        >
          <h2 className="mb-3">Score reports</h2>
          <DeliveryTable deliveries={mail.troubled} />
        </Section>
      </ScriptPage>
    </>
  );
}
