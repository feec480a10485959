import type { Actor } from '@/lib/domain/actor';
import { decide, type CourseForPolicy, type Decision } from './decide';

/** Before release only the instructor, and the head TA where the set's policy says so, see whose answer it is. */
export function canSeeStudentIdentities(
  actor: Actor,
  course: CourseForPolicy,
  set: { released: boolean; headTaSeesIdentities: boolean },
): Decision {
  if (set.released) return decide(actor, 'work-queue', course);
  const decision = decide(actor, 'see-identities-before-release', course);
  if (decision.allowed && decision.grant === 'set-policy' && !set.headTaSeesIdentities) {
    return { allowed: false, why: 'This set is marked without names until it is released.' };
  }
  return decision;
}
