import { PageHead } from '@/app/_components/page-head';
import { type NavItem } from '@/components/ui/nav-line';
import { type PersonActor } from '@/lib/domain/actor';
import { type Ability } from '@/lib/domain/permissions';
import { paths } from '@/lib/paths';
import { decide } from '@/lib/policies/decide';
import { type CourseView } from '@/lib/queries/course-for-actor';
import type { ReactNode } from 'react';

type CoursePage = 'sets' | 'roster' | 'templates' | 'tokens' | 'log';
type SetPage = 'set' | 'intake' | 'queue' | 'release' | 'deliveries' | 'consistency';

interface HeadProps {
  readonly actor: PersonActor;
  readonly course: CourseView;
  /** The page itself, set bold. */
  readonly place: string;
  readonly status?: ReactNode;
}

/** The running head of a page about a course; the line of pages holds those that this person may open. */
export function CourseHead({ actor, course, place, status, page }: HeadProps & { page: CoursePage }) {
  const nav: (NavItem & { needs: Ability; is: CoursePage })[] = [
    { label: 'Sets', href: paths.course(course.id), needs: 'view-problem-sets', is: 'sets' },
    { label: 'Roster', href: paths.roster(course.id), needs: 'read-roster', is: 'roster' },
    { label: 'Templates', href: paths.templates(), needs: 'read-course-templates', is: 'templates' },
    { label: 'API tokens', href: paths.tokens(course.id), needs: 'manage-tokens', is: 'tokens' },
    { label: 'Log', href: paths.log(course.id), needs: 'read-audit-log', is: 'log' },
  ];
  const steps = place === course.code ? [] : [{ label: course.code, href: paths.course(course.id) }];
  return <PageHead actor={actor} steps={steps} place={place} status={status} nav={allowed(nav, actor, course, page)} />;
}

/** What the head of a page says of its set. */
export interface SetInHead {
  readonly id: string;
  readonly number: number;
  readonly title: string;
}

/** The running head of a page about one set of a course. */
export function SetHead({
  actor,
  course,
  set,
  place,
  status,
  page,
  waiting,
}: HeadProps & { set: SetInHead; page: SetPage; waiting?: number }) {
  const at = [course.id, set.id] as const;
  const nav: (NavItem & { needs: Ability; is: SetPage })[] = [
    { label: 'Set', href: paths.set(...at), needs: 'view-problem-sets', is: 'set' },
    { label: 'Intake', href: paths.intakes(...at), needs: 'take-in-answers', is: 'intake' },
    { label: 'Queue', href: paths.queue(...at), needs: 'work-queue', is: 'queue', count: waiting || undefined },
    { label: 'Release', href: paths.release(...at), needs: 'release-scores', is: 'release' },
    { label: 'Deliveries', href: paths.deliveries(...at), needs: 'release-scores', is: 'deliveries' },
    { label: 'Consistency', href: paths.consistency(...at), needs: 'view-consistency', is: 'consistency' },
  ];
  const steps = [
    { label: course.code, href: paths.course(course.id) },
    ...(page === 'set' ? [] : [{ label: setName(set), href: paths.set(...at) }]),
  ];
  return <PageHead actor={actor} steps={steps} place={place} status={status} nav={allowed(nav, actor, course, page)} />;
}

/** A set as it is called in a line: "Set 4, Spin in a field". */
export function setName(set: Pick<SetInHead, 'number' | 'title'>): string {
  return `Set ${set.number}, ${set.title}`;
}

function allowed<Page>(
  items: readonly (NavItem & { needs: Ability; is: Page })[],
  actor: PersonActor,
  course: CourseView,
  page: Page,
): NavItem[] {
  return items
    .filter((item) => decide(actor, item.needs, course).allowed)
    .map(({ label, href, count, is }) => ({ label, href, count, current: is === page }));
}
