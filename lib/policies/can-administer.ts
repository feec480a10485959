import type { Actor } from '@/lib/domain/actor';
import { grantOf, type Ability } from '@/lib/domain/permissions';
import type { Decision } from './decide';

/** What concerns the whole service and no one course is for administrators, and for nobody by a role in a course. */
export function canAdminister(actor: Actor, ability: Ability): Decision {
  if (actor.kind === 'system') return { allowed: true, grant: 'yes' };
  const grant = actor.kind === 'user' && actor.isAdministrator ? grantOf('administrator', ability) : null;
  return grant === null ? { allowed: false, why: 'Only an administrator may do this.' } : { allowed: true, grant };
}
