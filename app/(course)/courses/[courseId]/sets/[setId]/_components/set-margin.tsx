import Link from 'next/link';
import { SetState } from '@/app/(course)/_components/set-state';
import { TimeStamp } from '@/components/ui/time-stamp';
import { formatCredit } from '@/lib/domain/credit';
import { hasBegun } from '@/lib/domain/problem-set-change';
import { localOf } from '@/lib/domain/zoned-time';
import { paths } from '@/lib/paths';
import { type CourseView } from '@/lib/queries/course-for-actor';
import { type SetForStaff } from '@/lib/queries/set-for-staff';
import { SetMoves } from './set-moves';

interface SetMarginProps {
  readonly course: CourseView;
  readonly set: SetForStaff;
  readonly students: number;
  readonly mayEdit: boolean;
  readonly mayRelease: boolean;
  readonly now: Date;
}

const day = 86_400_000;

/** The state of a set in its margin: points, who answered, what waits, and the next step. */
export function SetMargin({ course, set, students, mayEdit, mayRelease, now }: SetMarginProps) {
  const begun = hasBegun(set, now);
  return (
    <div className="grid gap-4">
      <div>
        <p className="text-lead">
          <SetState set={set} zone={course.timeZone} now={now} wordOnly />
        </p>
        <p className="mt-1 flex items-baseline gap-x-2">
          <span className="text-mark font-semibold">{formatCredit(set.points)}</span>
          <span className="text-small text-grey">
            marks in {set.items.length} {set.items.length === 1 ? 'question' : 'questions'}
          </span>
        </p>
      </div>
      {begun ? (
        <p className="text-small">
          {set.answeredBy} of {students} students answered
          <br />
          {set.waiting === 0 ? 'nothing waits for a person' : `${set.waiting} waiting for a person`}
        </p>
      ) : null}
      {mayRelease && (set.state === 'closed' || set.state === 'released') ? (
        <p>
          <Link href={paths.release(course.id, set.id)}>
            {set.state === 'closed' ? 'Release the scores' : 'Scores and reports'}
          </Link>
        </p>
      ) : null}
      {mayEdit ? (
        <SetMoves
          ids={{ courseId: course.id, problemSetId: set.id, revision: String(set.revision) }}
          state={set.state}
          begun={begun}
          items={set.items.length}
          students={students}
          opensLater={set.opensAt !== null && set.opensAt > now}
          hasClosingTime={set.closesAt !== null && set.closesAt > now}
          opening={set.opensAt ? <TimeStamp at={set.opensAt} zone={course.timeZone} /> : null}
          closing={set.closesAt ? <TimeStamp at={set.closesAt} zone={course.timeZone} /> : null}
          tomorrow={localOf(new Date(now.getTime() + day), course.timeZone)}
          zone={course.timeZone}
        />
      ) : null}
    </div>
  );
}
