import { randomInt } from 'node:crypto';
import { QueryTypes } from 'sequelize';
import type { Ruling } from '@/models/ruling';
import { SecondMarking } from '@/models/second-marking';
import { database } from '@/lib/db/connection';
import { gradersFor } from '@/lib/queries/another-grader-exists';
import type { ServiceContext } from './context';

export type SecondMarkingDraw = {
  ruling: Ruling;
  courseId: string;
  problemSetId: string;
  studentId: string;
  /** Share of rulings drawn, in thousandths. */
  rate: number;
};

/**
 * Draws a ruling for blind second marking at the given rate, and assigns it to the grader who may mark the student, is
 * not the first, and has the fewest second markings in this set; among equals at random. Where the course has no second
 * grader nothing is drawn.
 *
 * @returns whether it was drawn
 */
export async function drawSecondMarking(context: ServiceContext, draw: SecondMarkingDraw): Promise<boolean> {
  if (randomInt(1000) >= draw.rate) return false;
  return assignSecondMarking(context, draw);
}

/** Assigns a second marking of a ruling without leaving it to chance; the same rule for who gets it. */
export async function assignSecondMarking(
  { transaction, now }: ServiceContext,
  { ruling, courseId, problemSetId, studentId }: Omit<SecondMarkingDraw, 'rate'>,
): Promise<boolean> {
  const graders = (await gradersFor({ courseId, studentId, except: [ruling.graderId] }, transaction)).filter(
    ({ role }) => role !== 'instructor',
  );
  if (graders.length === 0) return false;
  const load = await loadByGrader(problemSetId, transaction);
  const least = Math.min(...graders.map(({ userId }) => load.get(userId) ?? 0));
  const idle = graders.filter(({ userId }) => (load.get(userId) ?? 0) === least);
  const chosen = idle[randomInt(idle.length)];
  if (!chosen) return false;
  await SecondMarking.create(
    {
      rulingId: ruling.id,
      firstGraderId: ruling.graderId,
      problemSetId,
      answerId: ruling.answerId,
      graderId: chosen.userId,
      heldUntil: null,
      credit: null,
      millisecondsSpent: null,
      markedAt: null,
      settledBy: null,
      settledCredit: null,
      settledAt: null,
      createdAt: now,
    },
    { transaction },
  );
  return true;
}

async function loadByGrader(
  problemSetId: string,
  transaction: ServiceContext['transaction'],
): Promise<Map<string, number>> {
  const rows = await database().query<{ graderId: string; count: number }>(
    `select grader_id as "graderId", count(*)::int as count
       from second_markings
      where problem_set_id = :problemSetId and state <> 'cancelled'
      group by grader_id`,
    { type: QueryTypes.SELECT, transaction, replacements: { problemSetId } },
  );
  return new Map(rows.map(({ graderId, count }) => [graderId, count]));
}
