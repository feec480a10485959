import { RunningHead } from '@/components/ui/running-head';
import { ButtonLink } from '@/components/ui/button';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { EmptyState } from '@/components/ui/states';
import { type LinkPurpose } from '@/lib/auth/link-token';
import { paths } from '@/lib/paths';
import { linkState } from '@/lib/queries/link-state';
import { SetPasswordForm } from './set-password-form';

type Props = { purpose: LinkPurpose; token: string; place: string; greeting: (name: string) => string };

/** The page behind a mailed link: the form, or why the link does not work any more. */
export async function LinkPage({ purpose, token, place, greeting }: Props) {
  const person = await linkState(purpose, token, new Date());
  return (
    <>
      <RunningHead place={place} />
      <ScriptPage>
        <Section margin={<MarginNote>Setting a password signs you out wherever you were signed in before.</MarginNote>}>
          {person === null ? (
            <>
              <h1 className="sr-only">{place}</h1>
              <EmptyState
                title="This link does not work any more."
                action={<ButtonLink href={paths.forgottenPassword()}>Ask for a new link</ButtonLink>}
              >
                It was used already, was replaced by a later one, or has run out.
              </EmptyState>
            </>
          ) : (
            <>
              <PageTitle>{greeting(person.name)}</PageTitle>
              <SetPasswordForm purpose={purpose} token={token} email={person.email} />
            </>
          )}
        </Section>
      </ScriptPage>
    </>
  );
}
