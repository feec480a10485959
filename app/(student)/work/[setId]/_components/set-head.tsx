import { type ReactNode } from 'react';
import { PageHead } from '@/app/_components/page-head';
import { siteNav } from '@/app/_components/site-nav';
import { TimeStamp } from '@/components/ui/time-stamp';
import { type PersonActor } from '@/lib/domain/actor';
import { paths } from '@/lib/paths';
import { type StudentSet } from '@/lib/presenters/student-set';

/** The running head of a student's set: course, set, and when it closes for this student. */
export function SetHead({ actor, set, saved }: { actor: PersonActor; set: StudentSet; saved?: ReactNode }) {
  return (
    <PageHead
      actor={actor}
      nav={siteNav(actor, 'work').map((item) => ({ ...item, current: false }))}
      steps={[{ label: set.course.code, href: paths.work() }]}
      place={`Set ${set.number}, ${set.title}`}
      status={
        <>
          <ClosingTime set={set} />
          {saved}
        </>
      }
    />
  );
}

function ClosingTime({ set }: { set: StudentSet }) {
  if (set.isReleased) return 'released';
  if (set.closesAt === null) return set.takesAnswers ? 'open' : 'closed';
  const verb = set.isExtended ? 'extended to' : 'closes';
  return (
    <>
      {set.takesAnswers ? verb : 'closed'} <TimeStamp at={set.closesAt} zone={set.course.timeZone} />
    </>
  );
}
