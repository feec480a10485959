import { SiteHead } from '@/app/_components/page-head';
import { currentSession, requireActor } from '@/app/_server/current-actor';
import { DefinitionList } from '@/components/ui/definition-list';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { roleName } from '@/lib/domain/roles';
import { ownAccount } from '@/lib/queries/own-account';
import { ownSessions } from '@/lib/queries/own-sessions';
import { NameForm } from './_components/name-form';
import { PasswordForm } from './_components/password-form';
import { Sessions } from './_components/sessions';

export const metadata = { title: 'Your account' };

/** One's own account: name, password, where one is signed in. */
export default async function AccountPage() {
  const actor = await requireActor();
  const currentId = (await currentSession())?.id ?? '';
  const [account, sessions] = await Promise.all([
    ownAccount(actor.userId),
    ownSessions({ userId: actor.userId, currentId, now: new Date() }),
  ]);
  const courses = account.courses.map((course) => ({
    term: `${course.code}, ${course.term}`,
    value: roleName(course.role),
  }));
  return (
    <>
      <SiteHead actor={actor} here={null} place="Your account" />
      <ScriptPage>
        <Section
          margin={
            courses.length > 0 ? <DefinitionList items={courses} /> : <MarginNote>You are in no course.</MarginNote>
          }
        >
          <PageTitle kicker={account.email}>{account.name}</PageTitle>
          <NameForm name={account.name} />
        </Section>
        <Section
          label="Password"
          margin={<MarginNote>A new password signs you out everywhere but in this browser.</MarginNote>}
        >
          <h2 className="mb-3">Password</h2>
          <PasswordForm email={account.email} />
        </Section>
        <Section
          label="Signed in"
          margin={<MarginNote>A browser that is not used for a week is signed out.</MarginNote>}
        >
          <h2 className="mb-3">Signed in</h2>
          <Sessions sessions={sessions} zone={account.timeZone} />
        </Section>
      </ScriptPage>
    </>
  );
}
