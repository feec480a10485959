import { type CreationAttributes } from 'sequelize';
import { type Answer } from '@/models/answer';
import { Appeal } from '@/models/appeal';
import { Delivery } from '@/models/delivery';
import { Draw } from '@/models/draw';
import { type ProblemSet } from '@/models/problem-set';
import { ScoreReport } from '@/models/score-report';
import { type SetRelease } from '@/models/set-release';
import { type User } from '@/models/user';
import { nextNumber } from './next-number';

/** The next score report of a student for a set. */
export async function buildScoreReport(
  problemSet: ProblemSet,
  student: User,
  overrides: Partial<CreationAttributes<ScoreReport>> = {},
): Promise<ScoreReport> {
  const whose = { problemSetId: problemSet.id, userId: student.id };
  return ScoreReport.create({
    ...whose,
    revision: (await ScoreReport.count({ where: whose })) + 1,
    content: { parts: [] },
    reason: 'Scores released.',
    ...overrides,
  });
}

/** A waiting delivery of a report. */
export function buildDelivery(
  report: ScoreReport,
  overrides: Partial<CreationAttributes<Delivery>> = {},
): Promise<Delivery> {
  return Delivery.create({
    scoreReportId: report.id,
    messageId: `<report-${nextNumber()}@wrenfield.example>`,
    ...overrides,
  });
}

/** An open appeal on an answer whose scores are out. */
export async function buildAppeal(
  answer: Answer,
  release: SetRelease,
  overrides: Partial<CreationAttributes<Appeal>> = {},
): Promise<Appeal> {
  const draw = await Draw.findByPk(answer.drawId, { rejectOnEmpty: true });
  return Appeal.create({
    setReleaseId: release.id,
    problemSetId: release.problemSetId,
    answerId: answer.id,
    drawId: draw.id,
    partKey: answer.partKey,
    userId: draw.userId,
    reason: 'My form is the same operator.',
    ...overrides,
  });
}
