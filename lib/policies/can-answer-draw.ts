import { type Actor } from '@/lib/domain/actor';
import { decide, type CourseForPolicy, type Decision } from './decide';

/** A student answers their own draws and nobody else's. Whether the set still takes answers is its state's affair. */
export function canAnswerDraw(actor: Actor, course: CourseForPolicy, draw: { userId: string }): Decision {
  if (actor.kind !== 'user' || actor.userId !== draw.userId) {
    return { allowed: false, why: 'These are not your questions.' };
  }
  return decide(actor, 'answer-own-draws', course);
}
