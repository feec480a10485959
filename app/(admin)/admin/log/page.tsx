import { AdminHead } from '@/app/(admin)/_components/admin-head';
import { AuditLog } from '@/app/_components/audit-log';
import { openAdminPage } from '@/app/_server/admin-page';
import { PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { paths } from '@/lib/paths';

export const metadata = { title: 'Log' };

type Props = { searchParams: Promise<Record<string, string | string[] | undefined>> };

/** What happened in the whole service. */
export default async function AdminLogPage({ searchParams }: Props) {
  const actor = await openAdminPage('read-audit-log');
  return (
    <>
      <AdminHead actor={actor} here="log" place="Log" />
      <ScriptPage margin="none">
        <Section>
          <PageTitle>Log</PageTitle>
          <AuditLog courseId={null} timeZone="UTC" path={paths.adminLog()} searchParams={searchParams} />
        </Section>
      </ScriptPage>
    </>
  );
}
