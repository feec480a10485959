import { type Actor } from '@/lib/domain/actor';
import { grantOf } from '@/lib/domain/permissions';
import { canUseToken } from './can-use-token';
import { type Decision } from './decide';

/**
 * Whoever marks or teaches somewhere, or administers, may have any answer checked against any reference; a token, where
 * it was made for it. Who is a student in any course may not, whatever they are elsewhere: it would do their homework.
 */
export function canUseCheckBench(actor: Actor): Decision {
  if (actor.kind === 'token') return canUseToken(actor, 'check-answers', null);
  if (actor.kind === 'system') return { allowed: true, grant: 'yes' };
  const roles = [...actor.memberships.values()].map(({ role }) => role);
  if (roles.includes('student')) {
    return {
      allowed: false,
      why: 'You are a student in a course, so checking against a reference stays closed to you.',
    };
  }
  const staff = roles.some((role) => grantOf(role, 'use-check-bench') !== null);
  return staff || actor.isAdministrator
    ? { allowed: true, grant: 'yes' }
    : { allowed: false, why: 'Only the staff of a course may have answers checked here.' };
}
