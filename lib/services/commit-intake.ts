import { z } from 'zod';
import { Intake } from '@/models/intake';
import { isConstraintViolation } from '@/lib/db/constraints';
import { HalfmarkError } from '@/lib/errors';
import { decide, requireAllowed, requirePerson } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { enqueue } from '@/lib/queue/enqueue';
import type { ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';
import { assertMayTakeIn } from './receive-intake';

export const commitIntakeInput = z.object({
  intakeId: z.uuid(),
  /** Commit the accepted rows although others were refused. */
  goodRowsOnly: z.boolean().default(false),
});

/** Has the accepted rows of a previewed intake turned into attempts by the worker. */
export async function commitIntake(context: ServiceContext, input: z.output<typeof commitIntakeInput>): Promise<void> {
  const { transaction, now } = context;
  const intake = await loadIntake(context, input.intakeId);
  await assertMayTakeIn(context, intake.problemSetId);
  if (intake.state !== 'previewed') throw new HalfmarkError('wrong-state', 'This sheet is not waiting to be taken in.');
  if (intake.rowsAccepted === 0) throw new HalfmarkError('wrong-state', 'No row of this sheet can be taken in.');
  if (intake.rowsRefused > 0 && !input.goodRowsOnly) {
    throw new HalfmarkError('wrong-state', 'Some rows are refused. Mend the sheet, or take in the good rows only.');
  }
  try {
    await intake.update({ state: 'committing', committedAt: now }, { transaction });
  } catch (error) {
    if (!isConstraintViolation(error, 'intakes_committed_content_unique')) throw error;
    throw new HalfmarkError('conflict', 'This very file was taken in for this set meanwhile. Nothing was done twice.');
  }
  await enqueue('commit-intake', { intakeId: intake.id }, { transaction, priority: 5 });
  await recordAuditEvent(context, {
    action: 'commit-intake',
    courseId: intake.courseId,
    subject: { kind: 'intake', id: intake.id },
    details: { accepted: intake.rowsAccepted, refused: intake.rowsRefused },
  });
}

export const cancelIntakeInput = z.object({ intakeId: z.uuid() });

/** Gives up an intake before it is committed; nothing of it was written to any student's work. */
export async function cancelIntake(context: ServiceContext, input: z.output<typeof cancelIntakeInput>): Promise<void> {
  const intake = await loadIntake(context, input.intakeId);
  if (intake.state !== 'uploaded' && intake.state !== 'reading' && intake.state !== 'previewed') {
    throw new HalfmarkError('wrong-state', 'This sheet has been taken in already.');
  }
  await intake.update({ state: 'cancelled' }, { transaction: context.transaction });
}

/** An intake that the actor may work on: their own, or anyone's for who takes in answers in the whole course. */
export async function loadIntake(context: ServiceContext, intakeId: string): Promise<Intake> {
  const { actor, transaction } = context;
  const person = requirePerson(actor);
  const intake = await Intake.findByPk(intakeId, { transaction, lock: transaction.LOCK.UPDATE });
  if (!intake) throw new HalfmarkError('not-found');
  const course = await courseForActor(actor, intake.courseId, transaction);
  const decision = decide(actor, 'take-in-answers', course);
  requireAllowed(decision);
  if (decision.allowed && decision.grant === 'own-sections' && intake.uploadedBy !== person.userId) {
    throw new HalfmarkError('not-found');
  }
  return intake;
}
