import type { Actor } from '@/lib/domain/actor';
import { decide, type CourseForPolicy, type Decision } from './decide';

/**
 * An appeal is answered by another person than the first marker. Where the course has no other grader the first marker
 * may answer, and the answer says so; the caller tells whether there is another.
 */
export function canAnswerAppeal(
  actor: Actor,
  course: CourseForPolicy,
  appeal: { firstGraderIds: readonly string[]; anotherGraderExists: boolean },
): Decision {
  const decision = decide(actor, 'answer-appeals', course);
  if (!decision.allowed || actor.kind !== 'user') return decision;
  if (appeal.firstGraderIds.includes(actor.userId) && appeal.anotherGraderExists) {
    return { allowed: false, why: 'You marked this part first, so another grader answers the appeal.' };
  }
  return decision;
}
