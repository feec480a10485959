import { ButtonLink } from '@/components/ui/button';
import { RunningHead } from '@/components/ui/running-head';
import { ScriptPage, Section } from '@/components/ui/script-page';
import { EmptyState } from '@/components/ui/states';

/** What a member of a course sees where their role ends. */
export default function Forbidden() {
  return (
    <>
      <title>Not open to you · Halfmark</title>
      <RunningHead place="Not open to you" />
      <ScriptPage>
        <Section>
          <h1 className="sr-only">Not open to you</h1>
          <EmptyState
            title="Your role in this course does not open this page."
            action={<ButtonLink href="/">To your courses</ButtonLink>}
          >
            If your work needs it, ask the instructor of the course to change your role.
          </EmptyState>
        </Section>
      </ScriptPage>
    </>
  );
}
