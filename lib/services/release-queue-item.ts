import { z } from 'zod';
import { leaseUntil } from '@/lib/domain/queue-item-state';
import { HalfmarkError } from '@/lib/errors';
import type { ServiceContext } from './context';
import { assertHeldBy, loadItemForGrading } from './load-item-for-grading';
import { recordAuditEvent } from './record-audit-event';

export const releaseQueueItemInput = z.object({ queueItemId: z.uuid() });

/** Puts an item that the acting grader holds back into the queue; putting back what they no longer hold does nothing. */
export async function releaseQueueItem(
  context: ServiceContext,
  input: z.output<typeof releaseQueueItemInput>,
): Promise<void> {
  const { item, grader } = await loadItemForGrading(context, input.queueItemId);
  if (item.state !== 'taken' || item.heldBy !== grader.userId) return;
  const state = item.question === null ? 'waiting' : 'escalated';
  await item.update({ state, heldBy: null, heldUntil: null }, { transaction: context.transaction });
}

export const renewHoldInput = releaseQueueItemInput;

/** A sign of life from the desk: the hold lasts a whole lease from now. `lease-lost` where it has run out. */
export async function renewHold(
  context: ServiceContext,
  input: z.output<typeof renewHoldInput>,
): Promise<{ heldUntil: Date }> {
  const { item, grader } = await loadItemForGrading(context, input.queueItemId);
  assertHeldBy(item, grader.userId, context.now);
  const heldUntil = leaseUntil(context.now);
  await item.update({ heldUntil }, { transaction: context.transaction });
  return { heldUntil };
}

export const escalateQueueItemInput = z.object({
  queueItemId: z.uuid(),
  question: z.string().trim().min(1, 'Say what you would like to know.').max(4000),
});

/** Hands an item that the acting grader holds to the head TA, with a question. */
export async function escalateQueueItem(
  context: ServiceContext,
  input: z.output<typeof escalateQueueItemInput>,
): Promise<void> {
  const { item, grader, course } = await loadItemForGrading(context, input.queueItemId);
  assertHeldBy(item, grader.userId, context.now);
  if (item.kind === 'appeal') {
    throw new HalfmarkError(
      'wrong-state',
      'An appeal is answered, not handed on. Put it back for another grader instead.',
    );
  }
  await item.update(
    { state: 'escalated', heldBy: null, heldUntil: null, question: input.question },
    { transaction: context.transaction },
  );
  await recordAuditEvent(context, {
    action: 'escalate-answer',
    courseId: course.id,
    subject: { kind: 'queue-item', id: item.id },
  });
}
