import { ProblemSet } from '@/models/problem-set';
import type { PersonActor } from '@/lib/domain/actor';
import { HalfmarkError } from '@/lib/errors';
import { decide, requireAllowed } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { queueStamp } from '@/lib/queries/queue-of-set';

/** A mark that changes whenever the queue of a set does, for graders of its course. */
export async function watchQueue(actor: PersonActor, problemSetId: string): Promise<string> {
  const set = await ProblemSet.findByPk(problemSetId);
  if (!set) throw new HalfmarkError('not-found');
  requireAllowed(decide(actor, 'work-queue', await courseForActor(actor, set.courseId)));
  return queueStamp(set.id);
}
