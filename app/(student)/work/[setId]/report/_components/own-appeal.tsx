import { AppealState } from '@/components/report/appeal-state';
import { appealRuleInWords } from '@/lib/presenters/report-words';
import { type ReportedPart } from '@/lib/presenters/score-report';
import { type OwnReport } from '@/lib/queries/own-report';
import { AppealForm } from './appeal-form';

type Of = { report: OwnReport; part: ReportedPart };

/** Where the student's appeal of a part stands; nothing where none was made. */
export function OwnAppeal({ report, part }: Of) {
  const made = madeOf(report, part);
  return made ? <AppealState appeal={made} zone={report.set.course.timeZone} who="You" /> : null;
}

/** The way to an appeal of a marked part, while there is time and none was made. */
export function WayToAppeal({ report, part, position, now }: Of & { position: number; now: Date }) {
  const { set } = report;
  const isOver = set.appealsUntil !== null && now >= set.appealsUntil;
  if (part.answerId === null || part.state !== 'marked' || isOver || madeOf(report, part)) return null;
  return (
    <AppealForm
      problemSetId={set.id}
      answerId={part.answerId}
      place={`question ${position}, part ${part.key}`}
      rule={appealRuleInWords(set.policy.appealMayLower)}
    />
  );
}

const madeOf = ({ appeals }: OwnReport, part: ReportedPart) =>
  appeals.findLast(({ answerId }) => answerId === part.answerId);
