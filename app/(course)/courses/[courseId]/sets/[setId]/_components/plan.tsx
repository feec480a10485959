import { DefinitionList } from '@/components/ui/definition-list';
import { TimeStamp } from '@/components/ui/time-stamp';
import { hasBegun } from '@/lib/domain/problem-set-change';
import { type SetPolicy } from '@/lib/domain/set-policy';
import { localOf } from '@/lib/domain/zoned-time';
import { type CourseView } from '@/lib/queries/course-for-actor';
import { type SetForStaff } from '@/lib/queries/set-for-staff';
import { PlanForm } from './plan-form';

interface PlanProps {
  readonly course: CourseView;
  readonly set: SetForStaff;
  readonly mayEdit: boolean;
  readonly now: Date;
}

/** Times, attempts and policy of a set: what is planned, and for who may, the form that changes it. */
export function Plan({ course, set, mayEdit, now }: PlanProps) {
  const time = (at: Date | null) => (at ? <TimeStamp at={at} zone={course.timeZone} /> : <NotYet />);
  const local = (at: Date | null) => (at ? localOf(at, course.timeZone) : '');
  return (
    <>
      <DefinitionList
        items={[
          { term: 'Opens', value: time(set.opensAt) },
          { term: 'Closes', value: time(set.closesAt) },
          { term: 'Appeals until', value: time(set.appealsUntil) },
          { term: 'Attempts', value: `${set.attemptsAllowed} for each part` },
          { term: 'A person looks at', value: seenByPerson(set.policy) },
          { term: 'Second marking', value: `${set.policy.secondMarkingRate / 10} % of rulings` },
          { term: 'Students are told', value: toldToStudents(set.policy) },
        ]}
      />
      {mayEdit ? (
        <details className="mt-5" open={set.state === 'draft' && set.closesAt === null}>
          <summary className="text-blue">Change times, attempts and policy</summary>
          <div className="mt-4">
            <PlanForm
              key={set.revision}
              ids={{ courseId: course.id, problemSetId: set.id, revision: String(set.revision) }}
              zone={course.timeZone}
              begun={hasBegun(set, now)}
              closed={set.state === 'closed' || set.state === 'released'}
              plan={{
                title: set.title,
                opensAt: local(set.opensAt),
                closesAt: local(set.closesAt),
                appealsUntil: local(set.appealsUntil),
                attemptsAllowed: set.attemptsAllowed,
                policy: set.policy,
              }}
            />
          </div>
        </details>
      ) : null}
    </>
  );
}

function NotYet() {
  return <span className="text-grey">not set yet</span>;
}

function seenByPerson(policy: SetPolicy): string {
  const also = [
    policy.flag.includes('no-credited-slip') && 'wrong answers that no credited slip explains',
    policy.flag.includes('follow-through') && 'answers that follow through',
    policy.flag.includes('scan') && 'answers with a scan',
  ].filter((words) => words !== false);
  return ['what cannot be decided or read', ...also].join(', ');
}

function toldToStudents(policy: SetPolicy): string {
  const verdict = policy.showVerdictAtOnce ? 'the verdict at once' : 'the verdict after release';
  return `${verdict}; ${policy.reportShowsTotal ? 'reports show the total' : 'reports show no total'}`;
}
