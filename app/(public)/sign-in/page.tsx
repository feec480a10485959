import { redirect } from 'next/navigation';
import { currentActor } from '@/app/_server/current-actor';
import { RunningHead } from '@/components/ui/running-head';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { safeNext } from '@/lib/auth/safe-next';
import { SignInForm } from './_components/sign-in-form';

export const metadata = { title: 'Sign in' };

type Props = { searchParams: Promise<{ next?: string | string[]; set?: string | string[] }> };

/** Where people sign in; someone who is signed in goes on at once. */
export default async function SignInPage({ searchParams }: Props) {
  const { next, set } = await searchParams;
  const target = safeNext(next);
  if ((await currentActor()) !== null) redirect(target);
  return (
    <>
      <RunningHead place="Sign in" />
      <ScriptPage>
        <Section margin={<Help />}>
          <PageTitle kicker="Homework on two-level systems, checked and marked">Sign in</PageTitle>
          {set === 'yes' ? <p className="mb-4">Your password is set. Sign in with it.</p> : null}
          <SignInForm next={target} />
        </Section>
      </ScriptPage>
    </>
  );
}

function Help() {
  return (
    <MarginNote>
      Accounts are made by invitation. If you have none, ask your instructor; if the invitation ran out, ask for a new
      password with the address it was sent to.
    </MarginNote>
  );
}
