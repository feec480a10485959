import { Markdown } from '@/components/math/markdown';
import { Typeset } from '@/components/math/typeset';
import { PageTitle } from '@/components/ui/script-page';
import { TimeStamp } from '@/components/ui/time-stamp';
import { type MarkedAnswer } from '@/lib/presenters/marked-answer';
import { type ReactNode } from 'react';
import { MatrixGrid } from './matrix-grid';

/** The body of every page on which an answer is marked: the question with its draw, reference and answer, and why. */
export function AnswerSheet({ answer, zone }: { answer: MarkedAnswer; zone: string }) {
  return (
    <>
      <PageTitle
        kicker={
          <>
            Question {answer.position}, part {answer.partKey} · script <code>{answer.script}</code> · attempt{' '}
            {answer.attempt}, {answer.byStaff ? 'taken in from a file' : 'typed'},{' '}
            <TimeStamp at={answer.submittedAt} zone={zone} />
          </>
        }
      >
        {answer.title}
      </PageTitle>
      <div className="max-w-measure">
        <Markdown source={answer.prompt} />
        <Markdown source={answer.asked} />
      </div>
      <h2 className="mt-6 mb-2">Reference and answer</h2>
      <div className="grid border-y border-hairline sm:grid-cols-2">
        <Side words="Reference for this draw">
          {answer.referenceLatex ? <Typeset latex={answer.referenceLatex} display /> : <p>Not worked out.</p>}
        </Side>
        <Side words="Answer, as read" second>
          {answer.reading ? (
            <Typeset latex={answer.reading.latex} plain={answer.reading.plain} display />
          ) : (
            <p className="text-grey">It could not be read.</p>
          )}
          {answer.elements ? (
            <>
              <p className="mt-2 text-small text-grey">Worked out, what differs underlined</p>
              <MatrixGrid elements={answer.elements.answer} differ={answer.elements.differ} />
            </>
          ) : null}
        </Side>
      </div>
      <p className="mt-3 border-l-4 border-edge bg-wash px-3 py-2 font-mono text-small break-words whitespace-pre-wrap">
        <span className="sr-only">As it was typed: </span>
        {answer.text}
      </p>
      <Why answer={answer} />
    </>
  );
}

const headings = {
  agrees: 'Why it agrees',
  differs: 'Why it differs',
  undecided: 'Why it is undecided',
  unreadable: 'Where it cannot be read',
} as const;

function Why({ answer }: { answer: MarkedAnswer }) {
  if (answer.verdict === null) return <p className="mt-4 text-grey">The checker has not looked at this answer yet.</p>;
  return (
    <section aria-labelledby="why" className="mt-6 max-w-measure">
      <h2 id="why" className="mb-2">
        {headings[answer.verdict]}
      </h2>
      <p>{[answer.message, ...answer.evidence].filter(distinct).join(' ')}</p>
      {answer.slips.length > 0 ? (
        <>
          <p className="mt-2">It agrees, by an exact test, with the reference after one named change:</p>
          <ul className="list-disc ps-6">
            {answer.slips.map((slip) => (
              <li key={slip}>{slip}</li>
            ))}
          </ul>
        </>
      ) : null}
      {answer.solution ? (
        <details className="mt-3 text-small">
          <summary className="w-fit text-grey">Solution note</summary>
          <Markdown source={answer.solution} />
        </details>
      ) : null}
    </section>
  );
}

function distinct(sentence: string, index: number, all: readonly string[]): boolean {
  return sentence !== '' && all.indexOf(sentence) === index;
}

function Side({ words, second = false, children }: { words: string; second?: boolean; children: ReactNode }) {
  return (
    <div className={`min-w-0 px-4 py-3 ${second ? 'border-hairline max-sm:border-t sm:border-s' : ''}`}>
      <p className="text-small text-grey">{words}</p>
      {children}
    </div>
  );
}
