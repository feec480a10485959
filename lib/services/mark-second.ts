import { z } from 'zod';
import { ProblemSet } from '@/models/problem-set';
import { QueueItem } from '@/models/queue-item';
import { Ruling } from '@/models/ruling';
import { SecondMarking } from '@/models/second-marking';
import { differBeyondTolerance } from '@/lib/domain/second-marking';
import { setPolicySchema } from '@/lib/domain/set-policy';
import { HalfmarkError } from '@/lib/errors';
import { decide, requireAllowed, requirePerson } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import type { ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';

export const markSecondInput = z.object({
  secondMarkingId: z.uuid(),
  /** In thousandths of a mark. */
  credit: z.int().min(0),
  comment: z.string().trim().max(8000).default(''),
  millisecondsSpent: z.int().min(0).max(86_400_000).nullable().default(null),
});

/**
 * The blind second marking by the grader to whom it was assigned. It gives no credit of its own: where the two differ
 * beyond the set's tolerance the answer waits to be settled by the head TA; otherwise the first ruling stands.
 */
export async function markSecond(context: ServiceContext, input: z.output<typeof markSecondInput>): Promise<void> {
  const { actor, transaction, now } = context;
  const grader = requirePerson(actor);
  const marking = await SecondMarking.findByPk(input.secondMarkingId, { transaction, lock: transaction.LOCK.UPDATE });
  if (!marking || marking.graderId !== grader.userId) throw new HalfmarkError('not-found');
  const set = await ProblemSet.findByPk(marking.problemSetId, { transaction, rejectOnEmpty: true });
  const course = await courseForActor(actor, set.courseId, transaction);
  requireAllowed(decide(actor, 'work-queue', course));
  if (marking.state !== 'assigned' && marking.state !== 'taken') {
    throw new HalfmarkError('wrong-state', 'This second marking is done already.');
  }
  const first = await Ruling.findByPk(marking.rulingId, { transaction, rejectOnEmpty: true });
  if (input.credit > first.outOf) {
    throw new HalfmarkError('invalid', undefined, {
      fields: { credit: 'Give a credit between zero and the full credit.' },
    });
  }
  const apart = differBeyondTolerance(
    first.credit,
    input.credit,
    first.outOf,
    setPolicySchema.parse(set.policy).settleTolerance,
  );
  await marking.update(
    {
      state: apart ? 'to-settle' : 'marked',
      heldUntil: null,
      credit: input.credit,
      comment: input.comment,
      millisecondsSpent: input.millisecondsSpent,
      markedAt: now,
    },
    { transaction },
  );
  if (apart) {
    await QueueItem.update({ state: 'to-settle' }, { where: { id: first.queueItemId, state: 'ruled' }, transaction });
  }
  await recordAuditEvent(context, {
    action: 'mark-second',
    courseId: course.id,
    subject: { kind: 'second-marking', id: marking.id },
  });
}
