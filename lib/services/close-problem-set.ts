import { z } from 'zod';
import { type ProblemSet } from '@/models/problem-set';
import { hasBegun } from '@/lib/domain/problem-set-change';
import { mayPassTo } from '@/lib/domain/problem-set-state';
import { HalfmarkError } from '@/lib/errors';
import { type ServiceContext } from './context';
import { loadSetForEdit } from './load-set-for-edit';
import { recordAuditEvent } from './record-audit-event';

export const closeProblemSetInput = z.object({ problemSetId: z.uuid(), revision: z.int().positive() });

/**
 * Closes an open set now, also before its closing time, which then becomes the present. Students with a running
 * extension may still hand in. Refused for a set that has not begun: its opening time can be changed instead.
 */
export async function closeProblemSet(
  context: ServiceContext,
  input: z.output<typeof closeProblemSetInput>,
): Promise<{ revision: number; closesAt: Date }> {
  const { set } = await loadSetForEdit(context, input);
  if (!mayPassTo(set.state, 'closed')) {
    throw new HalfmarkError('wrong-state', 'Only an open set can be closed. Reload the page to see its state.');
  }
  if (!hasBegun(set, context.now)) {
    throw new HalfmarkError('wrong-state', 'This set has not opened yet; move its opening time instead.');
  }
  return closeSet(context, set);
}

/** Writes the closing of a set whose row is held, for the service above and for the job that closes due sets. */
export async function closeSet(
  context: ServiceContext,
  set: ProblemSet,
): Promise<{ revision: number; closesAt: Date }> {
  const { now, transaction } = context;
  const planned = set.closesAt;
  const closesAt = planned !== null && planned <= now ? planned : now;
  await set.update({ state: 'closed', closesAt, revision: set.revision + 1 }, { transaction });
  await recordAuditEvent(context, {
    action: 'close-set',
    courseId: set.courseId,
    subject: { kind: 'problem-set', id: set.id },
    details: { planned, closesAt },
  });
  return { revision: set.revision, closesAt };
}
