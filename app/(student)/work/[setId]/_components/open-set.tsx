import { randomUUID } from 'node:crypto';
import { Markdown } from '@/components/math/markdown';
import { ScriptPage } from '@/components/ui/script-page';
import { type StudentSet } from '@/lib/presenters/student-set';
import { Question } from './question';
import { QuestionHead, QuestionMargin } from './question-head';
import { ShownPart } from './shown-part';
import { RefreshWhileChecked } from './refresh-while-checked';

/** A set that takes answers. */
export function OpenSet({ set }: { set: StudentSet }) {
  const zone = set.course.timeZone;
  const parts = set.questions.flatMap((question) => question.parts);
  return (
    <ScriptPage>
      <h1 className="sr-only">
        Set {set.number}, {set.title}
      </h1>
      {set.questions.map((question) => (
        <Question
          key={question.drawId}
          question={question}
          zone={zone}
          head={<QuestionHead question={question} of={set.questions.length} />}
          headMargin={<QuestionMargin question={question} isReleased={set.isReleased} />}
          prompts={Object.fromEntries(
            question.parts.map(({ key, prompt }) => [key, <Markdown key={key} source={prompt} inline />]),
          )}
          choices={Object.fromEntries(
            question.parts.map(({ key, reading }) => [
              key,
              (reading.options.choices ?? []).map((choice) => <Markdown key={choice} source={choice} inline />),
            ]),
          )}
          locked={Object.fromEntries(
            question.parts
              .filter((part) => part.attemptsLeft === 0)
              .map((part) => [part.key, <ShownPart key={part.key} place={question.place} part={part} zone={zone} />]),
          )}
          formKey={randomUUID()}
        />
      ))}
      {parts.some((part) => part.handedIn?.verdict === 'waiting') ? <RefreshWhileChecked /> : null}
    </ScriptPage>
  );
}
