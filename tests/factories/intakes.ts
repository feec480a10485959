import { createHash } from 'node:crypto';
import { type CreationAttributes } from 'sequelize';
import { Intake } from '@/models/intake';
import { IntakeRow } from '@/models/intake-row';
import { type ProblemSet } from '@/models/problem-set';
import { StoredFile } from '@/models/stored-file';
import { type User } from '@/models/user';
import { nextNumber } from './next-number';

/** A row of `stored_files`; the bytes themselves are the storage door's and are not written. */
export function buildStoredFile(
  courseId: string,
  uploadedBy: User,
  overrides: Partial<CreationAttributes<StoredFile>> = {},
): Promise<StoredFile> {
  return StoredFile.create({
    courseId,
    contentHash: createHash('sha256').update(`file ${nextNumber()}`).digest('hex'),
    byteSize: 120,
    mediaType: 'text/csv',
    originalName: 'answers.csv',
    uploadedBy: uploadedBy.id,
    ...overrides,
  });
}

/** An uploaded intake of a set, with its file. */
export async function buildIntake(
  problemSet: ProblemSet,
  uploadedBy: User,
  overrides: Partial<CreationAttributes<Intake>> = {},
): Promise<Intake> {
  const file = await buildStoredFile(problemSet.courseId, uploadedBy);
  return Intake.create({
    courseId: problemSet.courseId,
    problemSetId: problemSet.id,
    uploadedBy: uploadedBy.id,
    storedFileId: file.id,
    contentHash: file.contentHash,
    ...overrides,
  });
}

/** A refused row; give the matched fields and `state: 'accepted'` for a good one. */
export function buildIntakeRow(
  intake: Intake,
  overrides: Partial<CreationAttributes<IntakeRow>> = {},
): Promise<IntakeRow> {
  const refused = { state: 'refused', reasonCode: 'unknown-student', message: 'Nobody on the roster.' } as const;
  return IntakeRow.create({
    intakeId: intake.id,
    line: nextNumber(),
    fields: { student: 'nobody@wrenfield.example', answer: '1' },
    ...(overrides.state === 'accepted' ? {} : refused),
    ...overrides,
    state: overrides.state ?? 'refused',
  });
}
