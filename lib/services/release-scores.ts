import { z } from 'zod';
import { ProblemSet } from '@/models/problem-set';
import { SetRelease } from '@/models/set-release';
import { HalfmarkError } from '@/lib/errors';
import { decide, requireAllowed, requirePerson } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { releaseState } from '@/lib/queries/release-state';
import { composeScoreReport } from './compose-score-report';
import type { ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';

export const releaseScoresInput = z.object({
  problemSetId: z.uuid(),
  /** Only these students; all who can be released where left out. */
  userIds: z.array(z.uuid()).min(1).max(5000).optional(),
  /** Release although parts wait; each such part is reported as still being marked. */
  reportWaitingParts: z.boolean().default(false),
});

/** What a release did: whose scores went out, and who was held back by a running extension. */
export type ReleaseResult = { released: number; heldBack: number; setReleased: boolean };

/**
 * Releases the scores of a closed set, student by student, and queues one score report for each. Refused while parts
 * wait, unless each is to be reported as still being marked. Students with a running extension are held back; the set
 * is released when all are. Releasing twice sends nothing twice.
 */
export async function releaseScores(
  context: ServiceContext,
  input: z.output<typeof releaseScoresInput>,
): Promise<ReleaseResult> {
  const { actor, transaction, now } = context;
  const releaser = requirePerson(actor);
  const set = await ProblemSet.findByPk(input.problemSetId, { transaction, lock: transaction.LOCK.UPDATE });
  if (!set) throw new HalfmarkError('not-found');
  const course = await courseForActor(actor, set.courseId, transaction);
  requireAllowed(decide(actor, 'release-scores', course));
  if (set.state !== 'closed' && set.state !== 'released') {
    throw new HalfmarkError('wrong-state', 'Close the set before releasing its scores.');
  }
  const students = await releaseState(set.id, now, transaction);
  const wanted = students.filter(
    ({ userId, releasedAt }) => releasedAt === null && (input.userIds?.includes(userId) ?? true),
  );
  const ready = wanted.filter(({ extendedUntil }) => extendedUntil === null);
  const waiting = ready.reduce((sum, { partsWaiting }) => sum + partsWaiting, 0);
  if (waiting > 0 && !input.reportWaitingParts) {
    throw new HalfmarkError(
      'wrong-state',
      `${waiting} ${waiting === 1 ? 'part waits' : 'parts wait'} for a verdict or a ruling. Work the queue first, or release with those parts reported as still being marked.`,
    );
  }
  for (const { userId } of ready) {
    await SetRelease.create(
      { problemSetId: set.id, userId, releasedAt: now, releasedBy: releaser.userId },
      { transaction },
    );
    await composeScoreReport(context, { problemSetId: set.id, userId, reason: 'Your scores are released.' });
  }
  const setReleased = students.every(
    ({ userId, releasedAt }) => releasedAt !== null || ready.some((student) => student.userId === userId),
  );
  if (setReleased && set.state === 'closed') {
    await set.update({ state: 'released', revision: set.revision + 1 }, { transaction });
  }
  if (ready.length > 0) {
    await recordAuditEvent(context, {
      action: 'release-scores',
      courseId: course.id,
      subject: { kind: 'problem-set', id: set.id },
      details: { students: ready.length, partsStillWaiting: waiting, setReleased },
    });
  }
  return { released: ready.length, heldBack: wanted.length - ready.length, setReleased };
}
