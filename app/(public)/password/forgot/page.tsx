import { RunningHead } from '@/components/ui/running-head';
import { PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { ForgottenPasswordForm } from './_components/forgotten-password-form';

export const metadata = { title: 'Forgotten password' };

/** Where a person asks for a mail with which to set a new password. */
export default function ForgottenPasswordPage() {
  return (
    <>
      <RunningHead place="Forgotten password" />
      <ScriptPage>
        <Section>
          <PageTitle>A new password</PageTitle>
          <ForgottenPasswordForm />
        </Section>
      </ScriptPage>
    </>
  );
}
