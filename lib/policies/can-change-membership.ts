import type { Actor } from '@/lib/domain/actor';
import { roleIn } from '@/lib/domain/actor';
import type { CourseRole } from '@/lib/domain/roles';
import { decide, type CourseForPolicy, type Decision } from './decide';

/** Roles that a head TA may give and take; the others are for the instructor, or nobody would be above the head TA. */
const rolesOfHeadTa: readonly CourseRole[] = ['student', 'ta'];

/** A change of what somebody is in a course: from which role (null for a newcomer) to which (null for leaving). */
export type MembershipChange = { userId: string | null; from: CourseRole | null; to: CourseRole | null };

/**
 * Who may change the roster may bring in, move and let go; a head TA only students and TAs. Nobody but an administrator
 * changes their own place, so that no course loses its last instructor by a slip and nobody raises themselves.
 */
export function canChangeMembership(actor: Actor, course: CourseForPolicy, change: MembershipChange): Decision {
  const decision = decide(actor, 'change-roster', course);
  if (!decision.allowed || actor.kind !== 'user' || actor.isAdministrator) return decision;
  if (change.userId === actor.userId) {
    return { allowed: false, why: 'Your own place in the course is for an administrator to change.' };
  }
  const touched = [change.from, change.to].filter((role) => role !== null);
  if (roleIn(actor, course.id) === 'head-ta' && touched.some((role) => !rolesOfHeadTa.includes(role))) {
    return { allowed: false, why: 'A head TA changes students and TAs; other roles are for the instructor.' };
  }
  return decision;
}
