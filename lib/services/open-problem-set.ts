import { z } from 'zod';
import { ProblemSetItem } from '@/models/problem-set-item';
import { mayPassTo } from '@/lib/domain/problem-set-state';
import { HalfmarkError } from '@/lib/errors';
import { type ServiceContext } from './context';
import { throwFaults } from './edit-problem-set';
import { loadSetForEdit } from './load-set-for-edit';
import { recordAuditEvent } from './record-audit-event';

export const openProblemSetInput = z.object({ problemSetId: z.uuid(), revision: z.int().positive() });

/**
 * Opens a draft set: at once, or by itself at its opening time where that is still to come (until then students see
 * nothing of it). Refused without a question, without a closing time, or with one that has passed.
 */
export async function openProblemSet(
  context: ServiceContext,
  input: z.output<typeof openProblemSetInput>,
): Promise<{ revision: number; opensAt: Date }> {
  const { transaction, now } = context;
  const { set, course } = await loadSetForEdit(context, input);
  if (set.state !== 'draft' || !mayPassTo(set.state, 'open')) {
    throw new HalfmarkError('wrong-state', 'Only a draft is opened this way. Reload the page to see its state.');
  }
  const items = await ProblemSetItem.count({ where: { problemSetId: set.id }, transaction });
  if (items === 0) throw new HalfmarkError('wrong-state', 'Put at least one question into the set before opening it.');
  if (set.closesAt === null) throwFaults({ closesAt: 'Give a closing time before opening the set.' });
  else if (set.closesAt <= now) throwFaults({ closesAt: 'The closing time has passed: choose a later one.' });
  const opensAt = set.opensAt !== null && set.opensAt > now ? set.opensAt : now;
  await set.update({ state: 'open', opensAt, revision: set.revision + 1 }, { transaction });
  await recordAuditEvent(context, {
    action: 'open-set',
    courseId: course.id,
    subject: { kind: 'problem-set', id: set.id },
    details: { opensAt, closesAt: set.closesAt, items },
  });
  return { revision: set.revision, opensAt };
}
