import { z } from 'zod';
import { faultsOfChange, type PlanFaults, type SetPlan } from '@/lib/domain/problem-set-change';
import { setPolicySchema } from '@/lib/domain/set-policy';
import { HalfmarkError } from '@/lib/errors';
import { type ServiceContext } from './context';
import { loadSetForEdit } from './load-set-for-edit';
import { recordAuditEvent } from './record-audit-event';

const time = z.date().nullable();

export const editProblemSetInput = z.object({
  problemSetId: z.uuid(),
  /** The revision that the editor saw. */
  revision: z.int().positive(),
  title: z.string().trim().min(1, 'Give the set a title.').max(200, 'At most 200 characters.'),
  opensAt: time,
  closesAt: time,
  appealsUntil: time,
  attemptsAllowed: z.int().min(1, 'At least one attempt.').max(100, 'At most 100 attempts.'),
  policy: setPolicySchema,
});

/**
 * Changes title, times, attempts and policy of a set. Once students may have seen it a change may only give them more;
 * what would harm someone is refused as `invalid`, each fault at its field. Returns the next revision.
 */
export async function editProblemSet(
  context: ServiceContext,
  input: z.output<typeof editProblemSetInput>,
): Promise<{ revision: number }> {
  const { set, course } = await loadSetForEdit(context, input);
  const { title, opensAt, closesAt, appealsUntil, attemptsAllowed, policy } = input;
  const next: SetPlan = { title, opensAt, closesAt, appealsUntil, attemptsAllowed, policy };
  const faults = faultsOfChange({ ...planOf(set), state: set.state }, next, context.now);
  throwFaults(faults);
  await set.update({ ...next, revision: set.revision + 1 }, { transaction: context.transaction });
  await recordAuditEvent(context, {
    action: 'edit-set',
    courseId: course.id,
    subject: { kind: 'problem-set', id: set.id },
    details: { opensAt, closesAt, appealsUntil, attemptsAllowed, policy },
  });
  return { revision: set.revision };
}

/** Throws `invalid` with the faults by field unless there are none. */
export function throwFaults(faults: PlanFaults): void {
  const fields = Object.fromEntries(Object.entries(faults).filter(([, fault]) => fault !== undefined));
  if (Object.keys(fields).length > 0) throw new HalfmarkError('invalid', undefined, { fields });
}

function planOf(set: SetPlan): SetPlan {
  return {
    title: set.title,
    opensAt: set.opensAt,
    closesAt: set.closesAt,
    appealsUntil: set.appealsUntil,
    attemptsAllowed: set.attemptsAllowed,
    policy: setPolicySchema.parse(set.policy),
  };
}
