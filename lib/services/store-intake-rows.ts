import { Op } from 'sequelize';
import { Intake } from '@/models/intake';
import { IntakeRow } from '@/models/intake-row';
import { ProblemSet } from '@/models/problem-set';
import { closingTime } from '@/lib/domain/problem-set-state';
import { extendedUntil } from '@/lib/queries/extended-until';
import { isHalfmarkError } from '@/lib/errors';
import { enqueue } from '@/lib/queue/enqueue';
import type { ServiceContext } from './context';
import { drawFor, type DrawnItem } from './draw-for';
import { storeSubmission } from './store-submission';

/**
 * Turns the next rows of an intake into attempts, one submission a student and question, and asks for their checking, all
 * in the caller's transaction: rows done are marked with their answer, so that a job cut short goes on where it stopped.
 * An answer that a student typed stays as an earlier attempt.
 *
 * @returns whether rows are left
 */
export async function storeIntakeRows(
  context: ServiceContext,
  { intakeId, most }: { intakeId: string; most: number },
): Promise<boolean> {
  const { transaction } = context;
  const intake = await Intake.findByPk(intakeId, { transaction, lock: transaction.LOCK.UPDATE });
  if (intake?.state !== 'committing') return false;
  const rows = await IntakeRow.findAll({
    where: { intakeId, state: 'accepted', answerId: { [Op.is]: null } },
    order: [['line', 'ASC']],
    limit: most,
    transaction,
  });
  const answerIds: string[] = [];
  let refused = 0;
  for (const group of groupBy(rows, (row) => `${row.userId} ${row.itemId}`)) {
    const stored = await storeGroup(context, intake, group);
    if (stored === null) refused += group.length;
    else answerIds.push(...stored);
  }
  if (answerIds.length > 0) await enqueue('check-answers', { answerIds }, { transaction, priority: 10 });
  const rowsCommitted = intake.rowsCommitted + answerIds.length;
  const isDone = rows.length < most;
  const counts = { rowsAccepted: intake.rowsAccepted - refused, rowsRefused: intake.rowsRefused + refused };
  await intake.update({ rowsCommitted, ...counts, ...(isDone ? { state: 'checking' } : {}) }, { transaction });
  return !isDone;
}

/** The answers that a group of rows became; null where the student has left the course since the preview. */
async function storeGroup(
  context: ServiceContext,
  intake: Intake,
  rows: readonly IntakeRow[],
): Promise<string[] | null> {
  const { transaction, now } = context;
  const [first] = rows;
  if (!first?.userId || !first.itemId) return [];
  const draw = await drawOrNull(context, { itemId: first.itemId, userId: first.userId });
  if (draw === null) {
    const message = 'The student has left the course since the preview.';
    for (const row of rows)
      await row.update({ state: 'refused', reasonCode: 'unknown-student', message }, { transaction });
    return null;
  }
  const set = await ProblemSet.findByPk(intake.problemSetId, { transaction, rejectOnEmpty: true });
  const closes = closingTime(set.closesAt, await extendedUntil(set.id, first.userId, transaction));
  const stored = await storeSubmission(context, {
    drawId: draw.drawId,
    answers: rows.map((row) => ({ partKey: row.partKey ?? '', text: row.text ?? '' })),
    source: 'intake',
    late: closes !== null && (intake.committedAt ?? now) > closes,
    intakeId: intake.id,
  });
  for (const row of rows) {
    const answer = stored.answers.find(({ partKey }) => partKey === row.partKey);
    await row.update({ answerId: answer?.answerId ?? null }, { transaction });
  }
  return stored.answers.map(({ answerId }) => answerId);
}

async function drawOrNull(context: ServiceContext, of: { itemId: string; userId: string }): Promise<DrawnItem | null> {
  try {
    return await drawFor(context, of);
  } catch (error) {
    if (isHalfmarkError(error, 'not-found')) return null;
    throw error;
  }
}

function groupBy<Row>(rows: readonly Row[], keyOf: (row: Row) => string): Row[][] {
  const groups = new Map<string, Row[]>();
  for (const row of rows) groups.set(keyOf(row), [...(groups.get(keyOf(row)) ?? []), row]);
  return [...groups.values()];
}
