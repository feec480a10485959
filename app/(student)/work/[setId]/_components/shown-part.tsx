import { Markdown } from '@/components/math/markdown';
import { PartRow } from '@/components/ui/script-page';
import { type StudentPart } from '@/lib/presenters/student-set';
import { PartMargin } from './part-margin';
import { SubmittedAnswer } from './submitted-answer';

interface ShownPartProps {
  /** The question's place in the set. */
  readonly place: number;
  readonly part: StudentPart;
  readonly zone: string;
  /** The whole set takes no more answers; otherwise only this part's attempts are used up. */
  readonly isClosed?: boolean;
}

/** A part that takes no more answers: one's own answer, and what was typed and never submitted. */
export function ShownPart({ place, part, zone, isClosed = false }: ShownPartProps) {
  return (
    <PartRow
      letter={part.key}
      label={`Question ${place}, part ${part.key}`}
      prompt={<Markdown source={part.prompt} inline />}
      margin={<PartMargin part={part} zone={zone} isClosed={isClosed} />}
    >
      {part.handedIn ? (
        <SubmittedAnswer text={part.handedIn.text} reading={part.reading} />
      ) : (
        <p className="text-small text-grey">No answer was submitted.</p>
      )}
      {part.unsent?.trim() ? (
        <p className="mt-2 text-small text-grey">
          Typed and never submitted: <code className="break-words whitespace-pre-wrap text-ink">{part.unsent}</code>
        </p>
      ) : null}
    </PartRow>
  );
}
