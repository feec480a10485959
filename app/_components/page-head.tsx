import { RunningHead, type HeadStep, type RunningHeadProps } from '@/components/ui/running-head';
import { type PersonActor } from '@/lib/domain/actor';
import { isStaffRole } from '@/lib/domain/roles';
import { roleIn } from '@/lib/domain/actor';
import { paths } from '@/lib/paths';
import { type CourseView } from '@/lib/queries/course-for-actor';
import { AccountLine } from './account-line';
import { courseNav, siteNav, type CoursePlace, type SitePlace } from './site-nav';

type Shared = { actor: PersonActor; place: string; status?: RunningHeadProps['status'] };

/** The running head of a page outside any course; `nav` replaces the usual line of words. */
export function SiteHead({
  actor,
  here,
  nav = siteNav(actor, here),
  ...head
}: Shared & { here: SitePlace; nav?: RunningHeadProps['nav']; steps?: readonly HeadStep[] }) {
  return <RunningHead {...head} nav={nav} account={<AccountLine name={actor.name} />} />;
}

/** The running head of a page of a course: its code first, then `steps` (the set, for instance), then the place. */
export function CourseHead({
  actor,
  course,
  here,
  steps = [],
  ...head
}: Shared & { course: CourseView; here: CoursePlace; steps?: readonly HeadStep[] }) {
  const role = roleIn(actor, course.id);
  const first = { label: course.code, ...(role && isStaffRole(role) ? { href: paths.course(course.id) } : {}) };
  return (
    <RunningHead
      {...head}
      steps={[first, ...steps]}
      nav={courseNav(actor, course, here)}
      account={<AccountLine name={actor.name} />}
    />
  );
}
