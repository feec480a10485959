import { z } from 'zod';
import { Ruling } from '@/models/ruling';
import type { QueueItem } from '@/models/queue-item';
import { hasExpired, leaseUntil } from '@/lib/domain/queue-item-state';
import { HalfmarkError } from '@/lib/errors';
import { canAnswerAppeal } from '@/lib/policies/can-answer-appeal';
import { requireAllowed } from '@/lib/policies/decide';
import { anotherGraderExists } from '@/lib/queries/another-grader-exists';
import type { ServiceContext } from './context';
import { loadItemForGrading, type ItemForGrading } from './load-item-for-grading';

export const takeQueueItemInput = z.object({ queueItemId: z.uuid() });

/**
 * Takes one queue item for the acting grader until the lease runs out. Taking what one holds already renews the hold;
 * what another holds is `conflict`; what needs nobody any more is `wrong-state`. An escalated item is for those who
 * settle disagreements.
 */
export async function takeQueueItem(
  context: ServiceContext,
  input: z.output<typeof takeQueueItemInput>,
): Promise<{ heldUntil: Date }> {
  const loaded = await loadItemForGrading(context, input.queueItemId);
  const { item, grader } = loaded;
  const role = grader.memberships.get(loaded.course.id)?.role;
  if (item.state === 'escalated' && role === 'ta') {
    throw new HalfmarkError('forbidden', 'This answer was handed to the head TA with a question.');
  }
  if (!isFreeFor(item, grader.userId, context.now)) throw refusalOf(item);
  if (item.kind === 'appeal') await assertMayAnswer(context, loaded);
  return hold(context, item, grader.userId);
}

/** Writes a new hold of a queue item that is free for the grader. */
export async function hold(
  { transaction, now }: ServiceContext,
  item: QueueItem,
  graderId: string,
): Promise<{ heldUntil: Date }> {
  const heldUntil = leaseUntil(now);
  await item.update({ state: 'taken', heldBy: graderId, heldUntil }, { transaction });
  return { heldUntil };
}

function isFreeFor(item: QueueItem, graderId: string, now: Date): boolean {
  if (item.state === 'waiting' || item.state === 'escalated') return true;
  if (item.state !== 'taken') return false;
  return item.heldBy === graderId || item.heldUntil === null || hasExpired(item.heldUntil, now);
}

function refusalOf(item: QueueItem): HalfmarkError {
  return item.state === 'taken'
    ? new HalfmarkError('conflict', 'Another grader holds this answer. Take the next one.')
    : new HalfmarkError('wrong-state', 'This answer needs nobody any more. Take the next one.');
}

/** An appeal goes to another person than the first marker, where there is one. */
async function assertMayAnswer(context: ServiceContext, { course, answer, draw }: ItemForGrading): Promise<void> {
  const { actor, transaction } = context;
  const rulings = await Ruling.findAll({ where: { answerId: answer.id }, attributes: ['graderId'], transaction });
  const firstGraderIds = rulings.map(({ graderId }) => graderId);
  requireAllowed(
    canAnswerAppeal(actor, course, {
      firstGraderIds,
      anotherGraderExists: await anotherGraderExists(
        { courseId: course.id, studentId: draw.userId, except: firstGraderIds },
        transaction,
      ),
    }),
  );
}
