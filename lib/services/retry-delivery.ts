import { z } from 'zod';
import { Delivery } from '@/models/delivery';
import { ProblemSet } from '@/models/problem-set';
import { ScoreReport } from '@/models/score-report';
import { HalfmarkError } from '@/lib/errors';
import { decide, requireAllowed } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { enqueue } from '@/lib/queue/enqueue';
import type { ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';

export const retryDeliveryInput = z.object({ deliveryId: z.uuid() });

/**
 * A person's decision to send a failed or unconfirmed report again. It keeps its Message-ID, so a mail server that has
 * taken it already can tell the repeat.
 */
export async function retryDelivery(
  context: ServiceContext,
  input: z.output<typeof retryDeliveryInput>,
): Promise<void> {
  const { actor, transaction } = context;
  const delivery = await Delivery.findByPk(input.deliveryId, { transaction, lock: transaction.LOCK.UPDATE });
  if (!delivery) throw new HalfmarkError('not-found');
  const report = await ScoreReport.findByPk(delivery.scoreReportId, { transaction, rejectOnEmpty: true });
  const set = await ProblemSet.findByPk(report.problemSetId, { transaction, rejectOnEmpty: true });
  const course = await courseForActor(actor, set.courseId, transaction);
  requireAllowed(decide(actor, 'release-scores', course));
  if (delivery.state !== 'failed' && delivery.state !== 'unconfirmed') {
    throw new HalfmarkError('wrong-state', 'Only a failed or unconfirmed report can be sent again.');
  }
  await delivery.update({ state: 'waiting', lastError: null }, { transaction });
  await enqueue('send-score-report', { deliveryId: delivery.id }, { transaction });
  await recordAuditEvent(context, {
    action: 'retry-delivery',
    courseId: course.id,
    subject: { kind: 'delivery', id: delivery.id },
  });
}
