import { RunningHead, type HeadStep, type RunningHeadProps } from '@/components/ui/running-head';
import { roleIn, type PersonActor } from '@/lib/domain/actor';
import { isStaffRole } from '@/lib/domain/roles';
import { paths } from '@/lib/paths';
import { type CourseView } from '@/lib/queries/course-for-actor';
import { AccountLine } from './account-line';
import { courseNav, siteNav, type CoursePlace, type SitePlace } from './site-nav';

type Props = Omit<RunningHeadProps, 'account'> & { actor: PersonActor };

/** The running head of a page for signed-in people: the head itself, and who is signed in. */
export function PageHead({ actor, ...head }: Props) {
  return <RunningHead {...head} account={<AccountLine name={actor.name} />} />;
}

/** The running head of a page outside any course, with the line of pages open to this person. */
export function SiteHead({ here, ...head }: Omit<Props, 'nav'> & { here: SitePlace }) {
  return <PageHead {...head} nav={siteNav(head.actor, here)} />;
}

/** The running head of a page of a course: its code first, then `steps` (the set, for instance), then the place. */
export function CourseHead({
  course,
  here,
  steps = [],
  ...head
}: Omit<Props, 'nav' | 'steps'> & { course: CourseView; here: CoursePlace; steps?: readonly HeadStep[] }) {
  const role = roleIn(head.actor, course.id);
  const first = { label: course.code, ...(role && isStaffRole(role) ? { href: paths.course(course.id) } : {}) };
  return <PageHead {...head} steps={[first, ...steps]} nav={courseNav(head.actor, course, here)} />;
}
