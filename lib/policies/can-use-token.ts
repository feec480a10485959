import type { Actor } from '@/lib/domain/actor';
import type { TokenScope } from '@/lib/domain/token-scopes';
import type { Decision } from './decide';

/** A token opens the doors its scopes name, and where a course is concerned only that of its own course. */
export function canUseToken(actor: Actor, scope: TokenScope, courseId: string | null): Decision {
  if (actor.kind !== 'token') return { allowed: false, why: 'This is for callers with a token.' };
  if (!actor.scopes.includes(scope)) return { allowed: false, why: 'This token was not made for this.' };
  if (courseId !== null && actor.courseId !== courseId) {
    return { allowed: false, why: 'This token belongs to another course.' };
  }
  return { allowed: true, grant: 'yes' };
}
