import { type Transaction } from 'sequelize';
import { type Actor } from '@/lib/domain/actor';
import { type ProblemSetState } from '@/lib/domain/problem-set-state';
import { setPolicySchema, type SetPolicy } from '@/lib/domain/set-policy';
import { HalfmarkError } from '@/lib/errors';
import { ProblemSet } from '@/models/problem-set';
import { SetRelease } from '@/models/set-release';
import { courseForActor, type CourseView } from './course-for-actor';
import { extendedUntil } from './extended-until';

/** A set with what concerns one student of it. */
export type OwnSet = {
  id: string;
  number: number;
  title: string;
  state: ProblemSetState;
  opensAt: Date | null;
  closesAt: Date | null;
  appealsUntil: Date | null;
  attemptsAllowed: number;
  policy: SetPolicy;
  course: CourseView;
  extendedUntil: Date | null;
  releasedAt: Date | null;
};

/**
 * A set for its student. Not yet authorised: the caller asks whether the actor answers draws in its course.
 *
 * @throws HalfmarkError `not-found`, also for a set of a course that the actor may not know of
 */
export async function ownSet(
  actor: Actor,
  input: { problemSetId: string; userId: string },
  transaction?: Transaction,
): Promise<OwnSet> {
  const set = await ProblemSet.findByPk(input.problemSetId, { transaction });
  if (set === null) throw new HalfmarkError('not-found');
  const course = await courseForActor(actor, set.courseId, transaction);
  const release = await SetRelease.findOne({
    where: { problemSetId: set.id, userId: input.userId },
    transaction,
  });
  return {
    id: set.id,
    number: set.number,
    title: set.title,
    state: set.state,
    opensAt: set.opensAt,
    closesAt: set.closesAt,
    appealsUntil: set.appealsUntil,
    attemptsAllowed: set.attemptsAllowed,
    policy: setPolicySchema.parse(set.policy),
    course,
    extendedUntil: await extendedUntil(set.id, input.userId, transaction),
    releasedAt: release?.releasedAt ?? null,
  };
}
