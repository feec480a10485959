import { AppealState } from '@/components/report/appeal-state';
import { appealRuleInWords } from '@/lib/presenters/report-words';
import { type ReportedPart } from '@/lib/presenters/score-report';
import { type OwnReport } from '@/lib/queries/own-report';
import { AppealForm } from './appeal-form';

interface OwnAppealProps {
  readonly report: OwnReport;
  readonly part: ReportedPart;
  readonly position: number;
  readonly now: Date;
}

/** Under a part: where its appeal stands, or the way to make one while there is time. */
export function OwnAppeal({ report: { set, appeals }, part, position, now }: OwnAppealProps) {
  if (part.answerId === null) return null;
  const made = appeals.findLast(({ answerId }) => answerId === part.answerId);
  if (made) return <AppealState appeal={made} zone={set.course.timeZone} who="You" />;
  if (part.state !== 'marked' || (set.appealsUntil !== null && now >= set.appealsUntil)) return null;
  return (
    <AppealForm
      problemSetId={set.id}
      answerId={part.answerId}
      place={`question ${position}, part ${part.key}`}
      rule={appealRuleInWords(set.policy.appealMayLower)}
    />
  );
}
