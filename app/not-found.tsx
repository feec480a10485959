import { RunningHead } from '@/components/ui/running-head';
import { ButtonLink } from '@/components/ui/button';
import { ScriptPage, Section } from '@/components/ui/script-page';
import { EmptyState } from '@/components/ui/states';

/** Also what a person sees who may not know that something exists. */
export default function NotFound() {
  return (
    <>
      <title>Nothing here · Halfmark</title>
      <RunningHead place="Nothing here" />
      <ScriptPage>
        <Section>
          <h1 className="sr-only">Nothing here</h1>
          <EmptyState
            title="There is nothing here, or it is not yours to see."
            action={<ButtonLink href="/">To your courses</ButtonLink>}
          >
            The address may be mistyped, or the page belongs to a course or a role you do not have. If you followed a
            link from a message, sign in with the account it was sent to.
          </EmptyState>
        </Section>
      </ScriptPage>
    </>
  );
}
