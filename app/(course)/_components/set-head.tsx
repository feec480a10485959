import type { ReactNode } from 'react';
import { AccountLine } from '@/app/_components/account-line';
import { type NavItem } from '@/components/ui/nav-line';
import { RunningHead } from '@/components/ui/running-head';
import { type PersonActor } from '@/lib/domain/actor';
import { type Ability } from '@/lib/domain/permissions';
import { paths } from '@/lib/paths';
import { decide } from '@/lib/policies/decide';
import { type CourseView } from '@/lib/queries/course-for-actor';

/** The pages about one set. */
export type SetPlace = 'set' | 'intake' | 'queue' | 'release' | 'deliveries' | 'consistency' | null;

/** What the head of a page says of its set. */
export type SetInHead = { id: string; number: number; title: string };

interface SetHeadProps {
  readonly actor: PersonActor;
  readonly course: CourseView;
  readonly set: SetInHead;
  readonly here: SetPlace;
  /** The page itself, set bold; on the set's own page its name. */
  readonly place: string;
  readonly status?: ReactNode;
  /** Answers that wait for a person, where the page knows. */
  readonly waiting?: number;
}

/** The running head of a page about one set of a course, with the pages about it that this person may open. */
export function SetHead({ actor, course, set, here, place, status, waiting }: SetHeadProps) {
  const steps = [
    { label: course.code, href: paths.course(course.id) },
    ...(here === 'set' ? [] : [{ label: setName(set), href: paths.set(course.id, set.id) }]),
  ];
  return (
    <RunningHead
      steps={steps}
      place={place}
      status={status}
      nav={setNav(actor, course, set.id, here, waiting)}
      account={<AccountLine name={actor.name} />}
    />
  );
}

/** A set as it is called in a line: "Set 4, Spin in a field". */
export function setName(set: Pick<SetInHead, 'number' | 'title'>): string {
  return `Set ${set.number}, ${set.title}`;
}

function setNav(
  actor: PersonActor,
  course: CourseView,
  setId: string,
  here: SetPlace,
  waiting: number | undefined,
): NavItem[] {
  const at = [course.id, setId] as const;
  const pages: (NavItem & { needs: Ability; is: SetPlace })[] = [
    { label: 'Set', href: paths.set(...at), needs: 'view-problem-sets', is: 'set' },
    { label: 'Intake', href: paths.intakes(...at), needs: 'take-in-answers', is: 'intake' },
    { label: 'Queue', href: paths.queue(...at), needs: 'work-queue', is: 'queue', count: waiting },
    { label: 'Release', href: paths.release(...at), needs: 'release-scores', is: 'release' },
    { label: 'Deliveries', href: paths.deliveries(...at), needs: 'release-scores', is: 'deliveries' },
    { label: 'Consistency', href: paths.consistency(...at), needs: 'view-consistency', is: 'consistency' },
  ];
  return pages
    .filter((page) => decide(actor, page.needs, course).allowed)
    .map(({ label, href, count, is }) => ({ label, href, count, current: is === here }));
}
