import { z } from 'zod';
import { Course } from '@/models/course';
import { ProblemSet } from '@/models/problem-set';
import { defaultSetPolicy } from '@/lib/domain/set-policy';
import { HalfmarkError } from '@/lib/errors';
import { decide, requireAllowed } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { type ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';

export const createProblemSetInput = z.object({
  courseId: z.uuid(),
  title: z.string().trim().min(1, 'Give the set a title.').max(200, 'At most 200 characters.'),
});

const MOST_SETS = 999;

/** Makes a draft set with the next number of its course; nobody but staff sees it. Returns its id and number. */
export async function createProblemSet(
  context: ServiceContext,
  input: z.output<typeof createProblemSetInput>,
): Promise<{ problemSetId: string; number: number }> {
  const { actor, transaction } = context;
  const course = await courseForActor(actor, input.courseId, transaction);
  requireAllowed(decide(actor, 'edit-problem-sets', course));
  // One set at a time is numbered in a course: the course's row is held until the number is taken.
  await Course.findByPk(course.id, { transaction, lock: transaction.LOCK.UPDATE });
  const highest = await ProblemSet.max<number | null, ProblemSet>('number', {
    where: { courseId: course.id },
    transaction,
  });
  const number = (highest ?? 0) + 1;
  if (number > MOST_SETS) throw new HalfmarkError('wrong-state', `A course holds at most ${MOST_SETS} sets.`);
  const set = await ProblemSet.create(
    {
      courseId: course.id,
      number,
      title: input.title,
      opensAt: null,
      closesAt: null,
      appealsUntil: null,
      policy: defaultSetPolicy,
    },
    { transaction },
  );
  await recordAuditEvent(context, {
    action: 'create-set',
    courseId: course.id,
    subject: { kind: 'problem-set', id: set.id },
    details: { number, title: input.title },
  });
  return { problemSetId: set.id, number };
}
