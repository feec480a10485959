import type { PersonActor } from '@/lib/domain/actor';
import { grantOf } from '@/lib/domain/permissions';
import { isStaffRole } from '@/lib/domain/roles';
import { canWriteTemplate } from './can-write-template';
import type { Decision } from './decide';

/**
 * Whoever is on the staff of a course, and administrators, may open the shelf; which of its templates they see is decided
 * for each one by `canReadTemplate`.
 */
export function canUseShelf(actor: PersonActor): Decision {
  const roles = [...actor.memberships.values()].map((membership) => membership.role);
  const reads = roles.some((role) => isStaffRole(role) && grantOf(role, 'read-course-templates') !== null);
  if (reads || actor.isAdministrator) return { allowed: true, grant: 'yes' };
  return { allowed: false, why: 'The shelf is for the staff of courses.' };
}

/** The departments on whose shelf a person may put a new template. */
export function writableDepartments<Department extends { courseIds: readonly string[] }>(
  actor: PersonActor,
  departments: readonly Department[],
): Department[] {
  return departments.filter(
    ({ courseIds }) => canWriteTemplate(actor, { departmentCourseIds: courseIds, usedInCourseIds: [] }).allowed,
  );
}
