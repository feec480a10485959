import { Fragment, type ReactNode } from 'react';
import { Markdown } from '@/components/math/markdown';
import { Mark } from '@/components/ui/mark';
import { MarginNote, Section } from '@/components/ui/script-page';
import { TimeStamp } from '@/components/ui/time-stamp';
import { formatCredit } from '@/lib/domain/credit';
import { appealRuleInWords, changeInWords, reportCaution } from '@/lib/presenters/report-words';
import { type ReportedItem, type ReportedPart, type ScoreReportContent } from '@/lib/presenters/score-report';
import { ReportPart } from './report-part';
import type { WitnessProps } from './witness';

export interface ScoreReportProps {
  readonly content: ScoreReportContent;
  readonly witnesses: readonly (WitnessProps['witness'] & { answerId: string })[];
  /** What stands under a part about its appeal. */
  readonly appealOf: (part: ReportedPart) => ReactNode;
  /** What stands under its marks: the way to an appeal. */
  readonly appealFormOf?: (part: ReportedPart, item: ReportedItem) => ReactNode;
}

/** The questions of a report, part by part, and how to appeal: the same for the student and the staff. */
export function ScoreReport({ content, witnesses, appealOf, appealFormOf }: ScoreReportProps) {
  return (
    <>
      {content.items.map((item) => (
        <Fragment key={item.position}>
          <Section label={`Question ${item.position}`} margin={<ItemMark item={item} />}>
            <p className="mb-1.5 text-small text-grey">
              Question {item.position} of {content.items.length}
              {item.prompt === '' ? null : ' · your draw'}
            </p>
            <h2 className="mb-3 text-title font-semibold tracking-normal text-ink normal-case">{item.title}</h2>
            {item.prompt === '' ? (
              <p className="text-grey">This question was never opened, so it has no draw and no answer.</p>
            ) : (
              <Markdown source={item.prompt} />
            )}
          </Section>
          {item.prompt === ''
            ? null
            : item.parts.map((part) => (
                <ReportPart
                  key={part.key}
                  position={item.position}
                  part={part}
                  witness={witnesses.find(({ answerId }) => answerId === part.answerId && part.state === 'marked')}
                  appeal={appealOf(part)}
                  appealForm={appealFormOf?.(part, item)}
                />
              ))}
        </Fragment>
      ))}
      <HowToAppeal content={content} />
    </>
  );
}

function ItemMark({ item }: { item: ReportedItem }) {
  const waiting = item.parts.filter(({ state }) => state === 'waiting').length;
  return (
    <MarginNote>
      {formatCredit(item.credit)} of {formatCredit(item.outOf)} marks
      {waiting === 0 ? null : `, ${waiting} ${waiting === 1 ? 'part' : 'parts'} still being marked`}
    </MarginNote>
  );
}

/** The total of a report for its margin; nothing where the set's policy shows none. */
export function ReportTotal({ content: { total } }: Pick<ScoreReportProps, 'content'>) {
  if (total === null) return null;
  const { partsWaiting } = total;
  return (
    <Mark credit={formatCredit(total.credit)} of={`${formatCredit(total.outOf)} marks in all`}>
      {partsWaiting === 0 ? null : (
        <p>
          {partsWaiting} {partsWaiting === 1 ? 'part is' : 'parts are'} still being marked and not counted yet.
        </p>
      )}
    </Mark>
  );
}

/** What is different from the report before; nothing for a first one. */
export function ReportChanges({ content, revision }: Pick<ScoreReportProps, 'content'> & { revision: number }) {
  if (revision === 1) return null;
  const { changes } = content;
  if (changes.length === 0) return <p className="mt-3">No credit has changed since the report before.</p>;
  return (
    <div className="mt-3">
      <p className="font-semibold">Changed since the report before</p>
      <ul className="list-disc ps-6">
        {changes.map((change) => (
          <li key={`${change.position}-${change.key}`}>
            <a href={`#question-${change.position}-${change.key}`}>{changeInWords(change)}</a>
          </li>
        ))}
      </ul>
    </div>
  );
}

function HowToAppeal({ content: { course, appeals } }: Pick<ScoreReportProps, 'content'>) {
  return (
    <Section
      label="Appeals"
      margin={
        appeals.until === null ? null : (
          <p className="text-small">
            Appeals until
            <br />
            <TimeStamp at={appeals.until} zone={course.timeZone} style="short" />
          </p>
        )
      }
    >
      <h2 className="mb-3">If you think a part is marked wrongly</h2>
      <p className="max-w-measure">
        You can appeal each part once; say why, and a person looks at it again, another one than marked it first where
        the course has another. {appealRuleInWords(appeals.mayLower)}
      </p>
      {course.notice.trim() === '' ? null : (
        <div className="mt-3 max-w-measure">
          <p className="text-small font-semibold">A notice from your course</p>
          <Markdown source={course.notice} />
        </div>
      )}
      <p className="mt-3 max-w-measure text-small text-grey">{reportCaution}</p>
    </Section>
  );
}
