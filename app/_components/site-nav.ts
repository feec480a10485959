import { type NavItem } from '@/components/ui/nav-line';
import { type PersonActor } from '@/lib/domain/actor';
import { isStaffRole } from '@/lib/domain/roles';
import { canAdminister } from '@/lib/policies/can-administer';
import { canUseCheckBench } from '@/lib/policies/can-use-check-bench';
import { decide, type CourseForPolicy } from '@/lib/policies/decide';
import { paths } from '@/lib/paths';

/** The pages of the whole service. */
export type SitePlace = 'courses' | 'work' | 'templates' | 'reading' | 'bench' | 'admin' | null;

/** The pages of one course. */
export type CoursePlace = 'sets' | 'templates' | 'roster' | 'tokens' | 'log' | null;

/** Where this person can go outside any course; only what is open to them. */
export function siteNav(actor: PersonActor, here: SitePlace): NavItem[] {
  const roles = [...actor.memberships.values()].map((membership) => membership.role);
  const isStaff = roles.some(isStaffRole);
  return [
    isStaff && { place: 'courses', label: 'Courses', href: paths.courses() },
    roles.includes('student') && { place: 'work', label: 'My work', href: paths.work() },
    (isStaff || actor.isAdministrator) && { place: 'templates', label: 'Templates', href: paths.templates() },
    { place: 'reading', label: 'Try a reading', href: paths.reading() },
    canUseCheckBench(actor).allowed && { place: 'bench', label: 'Check bench', href: paths.bench() },
    actor.isAdministrator && { place: 'admin', label: 'Administration', href: paths.adminCourses() },
  ]
    .filter((item) => item !== false)
    .map(({ place, ...item }) => ({ ...item, current: place === here }));
}

/** Where this person can go in a course; only what is open to them. */
export function courseNav(actor: PersonActor, course: CourseForPolicy, here: CoursePlace): NavItem[] {
  const may = (ability: Parameters<typeof decide>[1]) => decide(actor, ability, course).allowed;
  return [
    may('read-course-templates') && { place: 'sets', label: 'Sets', href: paths.course(course.id) },
    may('read-course-templates') && { place: 'templates', label: 'Templates', href: paths.templates() },
    may('read-roster') && { place: 'roster', label: 'Roster', href: paths.roster(course.id) },
    may('manage-tokens') && { place: 'tokens', label: 'Tokens', href: paths.tokens(course.id) },
    may('read-audit-log') && { place: 'log', label: 'Log', href: paths.log(course.id) },
  ]
    .filter((item) => item !== false)
    .map(({ place, ...item }) => ({ ...item, current: place === here }));
}

/** The pages of the administration; empty for everybody but administrators. */
export function adminNav(actor: PersonActor, here: 'courses' | 'accounts' | 'mail' | 'log'): NavItem[] {
  if (!canAdminister(actor, 'manage-accounts').allowed) return [];
  return [
    { place: 'courses', label: 'Courses', href: paths.adminCourses() },
    { place: 'accounts', label: 'Accounts', href: paths.adminAccounts() },
    { place: 'mail', label: 'Mail and jobs', href: paths.adminMail() },
    { place: 'log', label: 'Log', href: paths.adminLog() },
  ].map(({ place, ...item }) => ({ ...item, current: place === here }));
}
