import type { Actor } from '@/lib/domain/actor';
import { grantOf } from '@/lib/domain/permissions';
import { canReadTemplate, type TemplateForPolicy } from './can-read-template';
import type { Decision } from './decide';

/** Instructors of the department's courses and administrators write its shelf, unless they may not even read the template. */
export function canWriteTemplate(actor: Actor, template: TemplateForPolicy): Decision {
  const readable = canReadTemplate(actor, template);
  if (!readable.allowed || actor.kind !== 'user') return readable;
  const instructs = template.departmentCourseIds.some((id) => {
    const role = actor.memberships.get(id)?.role;
    return role !== undefined && grantOf(role, 'write-shelf') !== null;
  });
  if (instructs || actor.isAdministrator) return { allowed: true, grant: 'yes' };
  return { allowed: false, why: 'Only instructors of this department may change its templates.' };
}
