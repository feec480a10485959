import Form from 'next/form';
import { z } from 'zod';
import { AdminHead } from '@/app/(admin)/_components/admin-head';
import { openAdminPage } from '@/app/_server/admin-page';
import { Button } from '@/components/ui/button';
import { DataTable } from '@/components/ui/data-table';
import { Field } from '@/components/ui/fields';
import { Pager } from '@/components/ui/pager';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { roleName } from '@/lib/domain/roles';
import { paths } from '@/lib/paths';
import { accounts, accountsPerPage, type AccountInList } from '@/lib/queries/accounts';
import { AccountForm } from './_components/account-form';

export const metadata = { title: 'Accounts' };

const querySchema = z.object({
  search: z.string().max(100).catch(''),
  page: z.coerce.number().int().min(1).max(100_000).catch(1),
});

type Props = { searchParams: Promise<Record<string, string | string[] | undefined>> };

/** Every account, found by name or address, and the making of one. */
export default async function AccountsPage({ searchParams }: Props) {
  const actor = await openAdminPage('manage-accounts');
  const query = querySchema.parse(await searchParams);
  const { rows, total } = await accounts(query);
  const hrefFor = (page: number) =>
    `${paths.adminAccounts()}?${new URLSearchParams({ search: query.search, page: String(page) }).toString()}`;
  return (
    <>
      <AdminHead actor={actor} here="accounts" place="Accounts" />
      <ScriptPage>
        <Section>
          <PageTitle>Accounts</PageTitle>
          <Form action={paths.adminAccounts()} className="mb-4 flex flex-wrap items-end gap-x-4 gap-y-3">
            <Field name="search" label="Name or e-mail" optional defaultValue={query.search} maxLength={100} />
            <Button type="submit">Find</Button>
          </Form>
          <DataTable
            caption={captionFor(query.search, total)}
            columns={columns}
            rows={rows.map(rowOf)}
            filterLabel={null}
            empty="No account has this in its name or e-mail."
          />
          <Pager page={query.page} pageCount={Math.ceil(total / accountsPerPage)} hrefFor={hrefFor} label="accounts" />
        </Section>
        <Section
          label="Invite somebody"
          margin={
            <MarginNote>
              For administrators, or before a course exists. People of a course are brought in on its roster.
            </MarginNote>
          }
        >
          <h2 className="mb-3">Invite somebody</h2>
          <AccountForm />
        </Section>
      </ScriptPage>
    </>
  );
}

function captionFor(search: string, total: number): string {
  const found = `${total} ${total === 1 ? 'account' : 'accounts'}`;
  return `${found}${search === '' ? '' : ` with “${search}”`}, shown here`;
}

function rowOf(account: AccountInList) {
  const state = account.isDeactivated ? 'closed' : account.hasPassword ? 'open' : 'invited';
  return {
    id: account.id,
    cells: {
      name: { value: account.name, href: paths.adminAccount(account.id) },
      email: account.email,
      courses: account.courses.map(({ code, role }) => `${code}: ${roleName(role)}`).join(', '),
      office: account.isAdministrator ? 'administrator' : '',
      state,
    },
  };
}

const columns = [
  { key: 'name', label: 'Name', heading: true },
  { key: 'email', label: 'E-mail' },
  { key: 'courses', label: 'Courses' },
  { key: 'office', label: 'Office' },
  { key: 'state', label: 'Account' },
] as const;
