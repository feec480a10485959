import { Intake } from '@/models/intake';
import { IntakeRow } from '@/models/intake-row';
import { loadActor } from '@/lib/auth/load-actor';
import { inTransaction } from '@/lib/db/transaction';
import { HalfmarkError, isHalfmarkError } from '@/lib/errors';
import { rowMatcher, type MatchedRow } from '@/lib/intake/match-row';
import { readAnswerRows, type AnswerRow } from '@/lib/intake/read-answer-rows';
import { decide, sectionBound } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { intakeRoster, partOf } from '@/lib/queries/intake-roster';

/** Rows written at once: the file streams through, so memory does not grow with it. */
const BATCH = 500;

/**
 * Reads an uploaded sheet into rows, matched or refused, for a person to look at before anything is committed. A sheet
 * that cannot be read as a whole makes the intake `failed`, with the reason in words and no row kept. Run again after it
 * was cut short, it begins anew.
 */
export async function readIntake(
  intakeId: string,
  open: (contentHash: string) => AsyncIterable<Uint8Array>,
): Promise<void> {
  const intake = await Intake.findByPk(intakeId);
  if (!intake || (intake.state !== 'uploaded' && intake.state !== 'reading')) return;
  await intake.update({ state: 'reading' });
  try {
    const match = await matcherFor(intake);
    await inTransaction(async (transaction) => {
      await IntakeRow.destroy({ where: { intakeId: intake.id }, transaction });
      const counts = { rowsTotal: 0, rowsAccepted: 0, rowsRefused: 0 };
      let batch: ReturnType<typeof rowValues>[] = [];
      const write = async () => {
        await IntakeRow.bulkCreate(batch, { transaction });
        batch = [];
      };
      for await (const row of readAnswerRows(open(intake.contentHash))) {
        const matched = match(row);
        counts.rowsTotal += 1;
        counts[matched.state === 'accepted' ? 'rowsAccepted' : 'rowsRefused'] += 1;
        batch.push(rowValues(intake.id, row, matched));
        if (batch.length >= BATCH) await write();
      }
      await write();
      await intake.update({ state: 'previewed', ...counts }, { transaction });
    });
  } catch (error) {
    if (!isHalfmarkError(error)) throw error;
    await intake.update({ state: 'failed', failure: error.message });
  }
}

async function matcherFor(intake: Intake): Promise<(row: AnswerRow) => MatchedRow> {
  const uploader = await loadActor(intake.uploadedBy);
  if (uploader === null) throw new HalfmarkError('forbidden', 'Whoever uploaded this sheet has no account any more.');
  const course = await courseForActor(uploader, intake.courseId);
  const decision = decide(uploader, 'take-in-answers', course);
  if (!decision.allowed) throw new HalfmarkError('forbidden', decision.why);
  const roster = await intakeRoster(intake.problemSetId);
  return rowMatcher({
    ...roster,
    sections: sectionBound(uploader, course, decision),
    standingAttempt: (userId, itemId, partKey) => roster.standing.get(partOf(userId, itemId, partKey)),
  });
}

function rowValues(intakeId: string, row: AnswerRow, matched: MatchedRow) {
  const { student, question, part, answer } = row;
  const shared = { intakeId, line: row.line, fields: { student, question, part, answer }, answerId: null };
  return matched.state === 'accepted'
    ? { ...shared, ...matched, reasonCode: null }
    : {
        ...shared,
        state: matched.state,
        reasonCode: matched.reason,
        message: matched.message,
        userId: null,
        itemId: null,
        partKey: null,
        text: null,
      };
}
