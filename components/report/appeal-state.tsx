import { TimeStamp } from '@/components/ui/time-stamp';

export interface AppealStateProps {
  readonly appeal: {
    reason: string;
    createdAt: Date;
    outcome: 'upheld' | 'kept' | 'lowered' | null;
    answeredAt: Date | null;
    /** Answered by who marked the part before, for want of another grader. */
    sameGrader: boolean;
  };
  readonly zone: string;
  /** Whose appeal it is, as the reader is to be told: "You", "The student". */
  readonly who: string;
}

const outcomes = { upheld: 'the credit was raised', kept: 'the credit was kept', lowered: 'the credit was lowered' };

/** Where an appeal stands: made when and why, waiting, or answered with what outcome. */
export function AppealState({ appeal, zone, who }: AppealStateProps) {
  return (
    <div className="mt-4 border-l-4 border-blue bg-wash px-4 py-2.5 text-small">
      <p>
        <span className="font-semibold">{who} appealed</span> on{' '}
        <TimeStamp at={appeal.createdAt} zone={zone} style="short" />
        {appeal.outcome !== null && appeal.answeredAt !== null ? (
          <>
            ; answered on <TimeStamp at={appeal.answeredAt} zone={zone} style="short" />: {outcomes[appeal.outcome]}.
            {appeal.sameGrader ? ' The course has no other grader, so the person who marked it before answered.' : null}
          </>
        ) : (
          '. A grader will look at it.'
        )}
      </p>
      <p className="mt-1 break-words whitespace-pre-wrap">{appeal.reason}</p>
    </div>
  );
}
