import type { ReactNode } from 'react';
import { Markdown } from '@/components/math/markdown';
import { Typeset } from '@/components/math/typeset';
import { Mark } from '@/components/ui/mark';
import { PartRow } from '@/components/ui/script-page';
import { VerdictSign } from '@/components/ui/verdict-sign';
import { formatCredit } from '@/lib/domain/credit';
import { slipAsSentence } from '@/lib/presenters/report-words';
import { type ReportedPart } from '@/lib/presenters/score-report';
import { Witness, type WitnessProps } from './witness';

interface ReportPartProps {
  /** The question's place in the set. */
  readonly position: number;
  readonly part: ReportedPart;
  readonly witness: WitnessProps['witness'] | undefined;
  /** Where an appeal of this part stands. */
  readonly appeal: ReactNode;
  /** The way to an appeal, under the marks. */
  readonly appealForm: ReactNode;
}

/** One part of a report: what was asked, written and read in the body; verdict, credit and the grader's note in the margin. */
export function ReportPart({ position, part, witness, appeal, appealForm }: ReportPartProps) {
  return (
    <PartRow
      id={`question-${position}-${part.key}`}
      letter={part.key}
      label={`Question ${position}, part ${part.key}`}
      prompt={part.prompt === '' ? null : <Markdown source={part.prompt} inline />}
      margin={
        <>
          <PartMarks part={part} />
          {appealForm}
        </>
      }
    >
      <Written part={part} />
      {part.slip === null ? null : <p className="mt-3">{slipAsSentence(part.slip)}</p>}
      {part.followThrough ? (
        <p className="mt-3">Right given your own earlier answer, which this part builds on.</p>
      ) : null}
      {witness ? <Witness witness={witness} /> : null}
      {appeal}
    </PartRow>
  );
}

function Written({ part }: { part: ReportedPart }) {
  if (part.answer === null) return <p className="text-small text-grey">No answer was submitted.</p>;
  return (
    <div>
      <p className="text-note text-grey">You wrote</p>
      <p className="font-mono text-small break-words whitespace-pre-wrap">{part.answer}</p>
      {part.readingLatex === '' ? null : (
        <div className="mt-2.5 border-y border-hairline py-2.5">
          <p className="text-note text-grey">Read as</p>
          <div className="text-center">
            <Typeset latex={part.readingLatex} plain={part.readingPlain} display />
          </div>
        </div>
      )}
    </div>
  );
}

function PartMarks({ part }: { part: ReportedPart }) {
  const { state, verdict, credit, outOf, comment, markedBy } = part;
  if (state === 'waiting') {
    return (
      <Mark credit={null} of={formatCredit(outOf)} state="still being marked">
        <p className="text-grey">You get a corrected report when it is.</p>
      </Mark>
    );
  }
  return (
    <div className="grid gap-2">
      {verdict === null ? null : <VerdictSign verdict={verdict} size="margin" />}
      <Mark
        credit={formatCredit(credit)}
        of={formatCredit(outOf)}
        state={state === 'no-answer' ? 'no answer' : undefined}
      >
        {comment === '' ? null : <Markdown source={comment} />}
        {markedBy === null ? null : (
          <p className="mt-1 text-grey">{markedBy === 'checker' ? 'marked by the checker' : 'marked by a person'}</p>
        )}
      </Mark>
    </div>
  );
}
