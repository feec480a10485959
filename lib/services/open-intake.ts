import { StoredFile } from '@/models/stored-file';
import type { PersonActor } from '@/lib/domain/actor';
import type { IntakeState } from '@/models/intake';
import { inTransaction } from '@/lib/db/transaction';
import { HalfmarkError } from '@/lib/errors';
import { loadIntake } from './commit-intake';

/** An upload as its pages show it. */
export type OpenedIntake = {
  id: string;
  courseId: string;
  problemSetId: string;
  fileName: string;
  state: IntakeState;
  rowsTotal: number;
  rowsAccepted: number;
  rowsRefused: number;
  rowsCommitted: number;
  rowsChecked: number;
  failure: string | null;
  at: Date;
};

/** Opens an upload for who may work on it; elsewhere than at its own set it does not exist. */
export async function openIntake(
  actor: PersonActor,
  ids: { intakeId: string; problemSetId?: string; courseId?: string },
): Promise<OpenedIntake> {
  return inTransaction(async (transaction) => {
    const intake = await loadIntake({ actor, transaction, now: new Date() }, ids.intakeId);
    if (ids.problemSetId !== undefined && ids.problemSetId !== intake.problemSetId)
      throw new HalfmarkError('not-found');
    if (ids.courseId !== undefined && ids.courseId !== intake.courseId) throw new HalfmarkError('not-found');
    const file = await StoredFile.findByPk(intake.storedFileId, { transaction, rejectOnEmpty: true });
    return {
      id: intake.id,
      courseId: intake.courseId,
      problemSetId: intake.problemSetId,
      fileName: file.originalName,
      state: intake.state,
      rowsTotal: intake.rowsTotal,
      rowsAccepted: intake.rowsAccepted,
      rowsRefused: intake.rowsRefused,
      rowsCommitted: intake.rowsCommitted,
      rowsChecked: intake.rowsChecked,
      failure: intake.failure,
      at: intake.createdAt,
    };
  });
}
