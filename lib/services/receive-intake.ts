import { Op } from 'sequelize';
import { Intake } from '@/models/intake';
import { ProblemSet } from '@/models/problem-set';
import { StoredFile } from '@/models/stored-file';
import { hasBegun } from '@/lib/domain/problem-set-change';
import { HalfmarkError } from '@/lib/errors';
import { decide, requireAllowed, requirePerson } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { enqueue } from '@/lib/queue/enqueue';
import type { KeptFile } from '@/lib/uploads/storage';
import type { ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';

/** The largest answer sheet: 25 MB. */
export const MAX_SHEET_BYTES = 25 * 1024 * 1024;

/** Whether the actor may take in answers for a set; asked before a byte of the file is accepted. */
export async function assertMayTakeIn(context: ServiceContext, problemSetId: string): Promise<ProblemSet> {
  const { actor, transaction, now } = context;
  requirePerson(actor);
  const set = await ProblemSet.findByPk(problemSetId, { transaction });
  if (!set) throw new HalfmarkError('not-found');
  const course = await courseForActor(actor, set.courseId, transaction);
  requireAllowed(decide(actor, 'take-in-answers', course));
  if (set.state === 'released') {
    throw new HalfmarkError('wrong-state', 'The scores of this set are released; it takes no further answers.');
  }
  if (!hasBegun(set, now)) throw new HalfmarkError('wrong-state', 'This set has not opened yet.');
  return set;
}

/**
 * Records an uploaded answer sheet and has the worker read it. A file that was committed to this set before does nothing
 * twice: `conflict`, saying when.
 */
export async function receiveIntake(
  context: ServiceContext,
  input: { problemSetId: string; file: KeptFile; originalName: string },
): Promise<{ intakeId: string }> {
  const { actor, transaction, now } = context;
  const uploader = requirePerson(actor);
  const set = await assertMayTakeIn(context, input.problemSetId);
  const before = await Intake.findOne({
    where: {
      problemSetId: set.id,
      contentHash: input.file.contentHash,
      state: { [Op.in]: ['committing', 'checking', 'done'] },
    },
    transaction,
  });
  if (before) {
    throw new HalfmarkError(
      'conflict',
      'This very file was taken in for this set before. Nothing was done; its answers are all there.',
    );
  }
  const stored = await StoredFile.create(
    {
      courseId: set.courseId,
      contentHash: input.file.contentHash,
      byteSize: input.file.byteSize,
      mediaType: 'text/csv',
      originalName: input.originalName,
      uploadedBy: uploader.userId,
      createdAt: now,
    },
    { transaction },
  );
  const intake = await Intake.create(
    {
      courseId: set.courseId,
      problemSetId: set.id,
      uploadedBy: uploader.userId,
      storedFileId: stored.id,
      contentHash: input.file.contentHash,
      encoding: null,
      mapping: null,
      failure: null,
      committedAt: null,
      finishedAt: null,
      createdAt: now,
    },
    { transaction },
  );
  await enqueue('parse-intake', { intakeId: intake.id }, { transaction, priority: 5 });
  await recordAuditEvent(context, {
    action: 'upload-intake',
    courseId: set.courseId,
    subject: { kind: 'intake', id: intake.id },
    details: { bytes: input.file.byteSize },
  });
  return { intakeId: intake.id };
}
