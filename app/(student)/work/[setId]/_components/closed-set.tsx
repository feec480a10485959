import { ButtonLink } from '@/components/ui/button';
import { ScriptPage, Section } from '@/components/ui/script-page';
import { type StudentSet } from '@/lib/presenters/student-set';
import { paths } from '@/lib/paths';
import { QuestionHead, QuestionMargin } from './question-head';
import { ShownPart } from './shown-part';

/** A set that takes no more answers: one's own questions and answers to read, and the way to the report. */
export function ClosedSet({ set }: { set: StudentSet }) {
  return (
    <ScriptPage>
      <Section
        margin={
          set.isReleased ? <ButtonLink href={paths.workReport(set.setId)}>Read the score report</ButtonLink> : null
        }
      >
        <h1>
          Set {set.number}, {set.title}
        </h1>
        <p className="mt-1 max-w-measure text-grey">
          {set.isReleased
            ? 'Your score report is out. It tells how each part was marked; here are your questions and answers.'
            : 'This set is closed and being marked. You will get a score report by e-mail when it is released.'}
        </p>
      </Section>
      {set.questions.map((question) => [
        <Section
          key={question.drawId}
          label={`Question ${question.place}`}
          margin={<QuestionMargin question={question} isReleased={set.isReleased} />}
        >
          <QuestionHead question={question} of={set.questions.length} />
        </Section>,
        ...question.parts.map((part) => (
          <ShownPart
            key={`${question.drawId}-${part.key}`}
            place={question.place}
            part={part}
            zone={set.course.timeZone}
          />
        )),
      ])}
    </ScriptPage>
  );
}
