import { ProblemSet } from '@/models/problem-set';
import { HalfmarkError } from '@/lib/errors';
import { decide, requireAllowed } from '@/lib/policies/decide';
import { courseForActor, type CourseView } from '@/lib/queries/course-for-actor';
import { type ServiceContext } from './context';

/**
 * A set that the actor may change, held for the rest of the transaction, with its course. A set of a course that the
 * actor may not know of is `not-found`; who may not change it is `forbidden`. A `revision` that is not the present one
 * is a `conflict`: somebody else changed the set since the page was loaded.
 */
export async function loadSetForEdit(
  { actor, transaction }: ServiceContext,
  input: { problemSetId: string; revision?: number },
): Promise<{ set: ProblemSet; course: CourseView }> {
  const set = await ProblemSet.findByPk(input.problemSetId, { transaction, lock: transaction.LOCK.UPDATE });
  if (set === null) throw new HalfmarkError('not-found');
  const course = await courseForActor(actor, set.courseId, transaction);
  requireAllowed(decide(actor, 'edit-problem-sets', course));
  if (input.revision !== undefined && input.revision !== set.revision) throw new HalfmarkError('conflict');
  return { set, course };
}
