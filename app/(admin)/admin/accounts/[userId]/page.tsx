import { AdminHead } from '@/app/(admin)/_components/admin-head';
import { ActionButton } from '@/app/_components/action-button';
import { openAdminPage } from '@/app/_server/admin-page';
import { idsOf, pageOf } from '@/app/_server/page';
import { DefinitionList } from '@/components/ui/definition-list';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { Notice } from '@/components/ui/notice';
import { roleName } from '@/lib/domain/roles';
import { paths } from '@/lib/paths';
import { accountById, type AccountInList } from '@/lib/queries/accounts';
import { saveAccount } from '../actions';

export const metadata = { title: 'An account' };

type Props = { params: Promise<{ userId: string }> };

/** One account: closing and opening it, and whether it administers. */
export default async function AccountPage({ params }: Props) {
  const actor = await openAdminPage('manage-accounts');
  const { userId } = await idsOf(params);
  const account = await pageOf(() => accountById(userId));
  const isOwn = account.id === actor.userId;
  return (
    <>
      <AdminHead
        actor={actor}
        here="accounts"
        steps={[{ label: 'Accounts', href: paths.adminAccounts() }]}
        place={account.name}
      />
      <ScriptPage>
        <Section margin={<Courses account={account} />}>
          <PageTitle kicker={account.email}>{account.name}</PageTitle>
          {isOwn ? (
            <Notice>
              Your own account is for another administrator to change, so that nobody locks themselves out.
            </Notice>
          ) : (
            <div className="flex flex-wrap gap-3">
              <Access account={account} />
              <Administration account={account} />
            </div>
          )}
        </Section>
      </ScriptPage>
    </>
  );
}

function Courses({ account }: { account: AccountInList }) {
  if (account.courses.length === 0) return <MarginNote>In no course.</MarginNote>;
  return <DefinitionList items={account.courses.map(({ code, role }) => ({ term: code, value: roleName(role) }))} />;
}

function Access({ account }: { account: AccountInList }) {
  return account.isDeactivated ? (
    <ActionButton
      action={saveAccount}
      fields={{ userId: account.id, change: 'reactivate' }}
      label="Open the account again"
      done="The account is open."
    />
  ) : (
    <ActionButton
      action={saveAccount}
      fields={{ userId: account.id, change: 'deactivate' }}
      label="Close the account"
      look="danger"
      done="The account is closed."
      confirm={{
        title: `Close the account of ${account.name}`,
        words: 'They are signed out at once and cannot sign in. Their work and marks stay, and you can open it again.',
      }}
    />
  );
}

function Administration({ account }: { account: AccountInList }) {
  return account.isAdministrator ? (
    <ActionButton
      action={saveAccount}
      fields={{ userId: account.id, change: 'unmake-administrator' }}
      label="No longer an administrator"
      done="No longer an administrator."
    />
  ) : (
    <ActionButton
      action={saveAccount}
      fields={{ userId: account.id, change: 'make-administrator' }}
      label="Make an administrator"
      done="Now an administrator."
      confirm={{
        title: `Make ${account.name} an administrator`,
        words: 'Administrators see every course’s roster and log, and can close any other account.',
      }}
    />
  );
}
