import { z } from 'zod';
import { HalfmarkError } from '@/lib/errors';
import { canAdminister } from '@/lib/policies/can-administer';
import { requireAllowed } from '@/lib/policies/decide';
import { retryFailedJob } from '@/lib/queue/failed-jobs';
import { type ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';

export const retryJobSchema = z.object({ jobId: z.string().regex(/^\d{1,18}$/) });

/**
 * Gives a job that was set aside as failed all its tries again.
 *
 * @throws HalfmarkError `forbidden`; `not-found` where it has been tried again or is done
 */
export async function retryJob(context: ServiceContext, input: z.output<typeof retryJobSchema>): Promise<void> {
  requireAllowed(canAdminister(context.actor, 'manage-accounts'));
  if (!(await retryFailedJob(input.jobId, context.transaction))) {
    throw new HalfmarkError('not-found', 'This job is being tried again already, or is done.');
  }
  await recordAuditEvent(context, { action: 'retry-job', subject: { kind: 'job', id: input.jobId } });
}
