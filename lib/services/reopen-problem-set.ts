import { z } from 'zod';
import { mayPassTo } from '@/lib/domain/problem-set-state';
import { HalfmarkError } from '@/lib/errors';
import { type ServiceContext } from './context';
import { throwFaults } from './edit-problem-set';
import { loadSetForEdit } from './load-set-for-edit';
import { recordAuditEvent } from './record-audit-event';

export const reopenProblemSetInput = z.object({
  problemSetId: z.uuid(),
  revision: z.int().positive(),
  closesAt: z.date(),
});

/**
 * Opens a closed set again until a later time. The end of appeals moves by as much as the closing time, so that students
 * keep what they were promised. A released set stays closed: its reports have told the answers.
 */
export async function reopenProblemSet(
  context: ServiceContext,
  input: z.output<typeof reopenProblemSetInput>,
): Promise<{ revision: number }> {
  const { now, transaction } = context;
  const { set, course } = await loadSetForEdit(context, input);
  if (set.state !== 'closed' || !mayPassTo(set.state, 'open')) {
    throw new HalfmarkError('wrong-state', 'Only a closed set that is not released can be opened again.');
  }
  if (input.closesAt <= now) throwFaults({ closesAt: 'Choose a closing time that has not passed.' });
  const moved = set.closesAt === null ? 0 : Math.max(0, input.closesAt.getTime() - set.closesAt.getTime());
  const appealsUntil = set.appealsUntil && new Date(set.appealsUntil.getTime() + moved);
  const before = { closesAt: set.closesAt, appealsUntil: set.appealsUntil };
  await set.update(
    { state: 'open', closesAt: input.closesAt, appealsUntil, revision: set.revision + 1 },
    { transaction },
  );
  await recordAuditEvent(context, {
    action: 'reopen-set',
    courseId: course.id,
    subject: { kind: 'problem-set', id: set.id },
    details: { before, closesAt: input.closesAt, appealsUntil },
  });
  return { revision: set.revision };
}
