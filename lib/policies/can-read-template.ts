import type { Actor } from '@/lib/domain/actor';
import { grantOf } from '@/lib/domain/permissions';
import type { Decision } from './decide';

/** Where a template stands: its department's courses, and the courses whose sets use it. */
export type TemplateForPolicy = { departmentCourseIds: readonly string[]; usedInCourseIds: readonly string[] };

/**
 * Whoever is a student anywhere a template is used may not read its reference, solution or check-bench results, whatever
 * they are elsewhere; otherwise staff of a course of its department, or of a course that uses it, may.
 */
export function canReadTemplate(actor: Actor, template: TemplateForPolicy): Decision {
  if (actor.kind === 'system') return { allowed: true, grant: 'yes' };
  if (actor.kind === 'token') return { allowed: false, why: 'A token cannot read templates.' };
  const roleOf = (courseId: string) => actor.memberships.get(courseId)?.role;
  if (template.usedInCourseIds.some((id) => roleOf(id) === 'student')) {
    return {
      allowed: false,
      why: 'You are a student in a course that uses this template, so its reference stays closed to you.',
    };
  }
  const onShelf = template.departmentCourseIds.some((id) => {
    const role = roleOf(id);
    return role !== undefined && grantOf(role, 'read-shelf') !== null;
  });
  const inCourse = template.usedInCourseIds.some((id) => {
    const role = roleOf(id);
    return role !== undefined && grantOf(role, 'read-course-templates') !== null;
  });
  if (onShelf || inCourse || actor.isAdministrator) return { allowed: true, grant: 'yes' };
  return { allowed: false, why: 'Only staff of a course of this department may read its templates.' };
}
