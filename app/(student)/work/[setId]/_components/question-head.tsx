import { Markdown } from '@/components/math/markdown';
import { MarginNote } from '@/components/ui/script-page';
import { type StudentQuestion } from '@/lib/presenters/student-set';
import { inMarks } from './part-margin';

/** Place, title and prompt of a question, with the student's own values in it. */
export function QuestionHead({ question, of }: { question: StudentQuestion; of: number }) {
  return (
    <>
      <p className="mb-1.5 text-small text-grey">
        Question {question.place} of {of} · your draw
      </p>
      <h2 className="mb-3 text-title font-semibold tracking-normal text-ink normal-case">{question.title}</h2>
      <Markdown source={question.prompt} />
    </>
  );
}

/** The margin beside it: what will stand here, and what the question is worth. */
export function QuestionMargin({ question, isReleased }: { question: StudentQuestion; isReleased: boolean }) {
  const isFirst = question.place === 1;
  return (
    <MarginNote>
      {isFirst && !isReleased ? 'Marks appear in this margin after release. ' : null}
      {inMarks(question.marks)} in all.
    </MarginNote>
  );
}
