import { type ReactNode } from 'react';
import { TimeStamp } from '@/components/ui/time-stamp';
import { VerdictSign } from '@/components/ui/verdict-sign';
import { type StudentPart } from '@/lib/presenters/student-set';

interface PartMarginProps {
  readonly part: StudentPart;
  readonly zone: string;
  /** Nothing can be submitted any more: what is to be done, and attempts, are not told. */
  readonly isClosed?: boolean;
  /** Buttons and what became of pressing them. */
  readonly children?: ReactNode;
}

/** The margin of a part: its marks, what was submitted and when, the attempts, and never a word on correctness but by policy. */
export function PartMargin({ part, zone, isClosed = false, children }: PartMarginProps) {
  const { handedIn, attemptsAllowed, attemptsLeft } = part;
  const used = attemptsAllowed - attemptsLeft;
  return (
    <>
      <p className="font-semibold">{inMarks(part.marks)}</p>
      <div className="mt-0.5 grid gap-0.5 text-small text-grey">
        {handedIn ? (
          <>
            <p>
              {handedIn.byStaff ? 'taken in' : 'submitted'}{' '}
              <TimeStamp at={handedIn.submittedAt} zone={zone} style="short" />
            </p>
            <p>
              receipt <span className="font-mono text-note">{handedIn.receipt}</span>
            </p>
          </>
        ) : isClosed ? null : (
          <p>not submitted</p>
        )}
        {handedIn && !handedIn.readable ? <p>a person will read it; it cost no attempt</p> : null}
        {isClosed ? null : (
          <p>
            attempt {used} of {attemptsAllowed}
            {attemptsLeft === 0 ? ', none left' : null}
          </p>
        )}
      </div>
      {handedIn?.verdict ? <Told verdict={handedIn.verdict} /> : null}
      {children ? <div className="mt-2.5 grid justify-items-start gap-2.5">{children}</div> : null}
    </>
  );
}

function Told({ verdict }: { verdict: NonNullable<NonNullable<StudentPart['handedIn']>['verdict']> }) {
  return (
    <div className="mt-2 text-small" role="status">
      {verdict === 'waiting' ? (
        <span className="text-grey">being checked…</span>
      ) : (
        <VerdictSign verdict={verdict} detail={verdict === 'undecided' ? 'a person will look at it' : undefined} />
      )}
    </div>
  );
}

/** "3 marks", "1 mark", "0.5 marks". */
export function inMarks(marks: string): string {
  return marks === '1' ? '1 mark' : `${marks} marks`;
}
