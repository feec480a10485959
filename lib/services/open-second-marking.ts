import { ProblemSet } from '@/models/problem-set';
import { Ruling } from '@/models/ruling';
import { SecondMarking } from '@/models/second-marking';
import { User } from '@/models/user';
import type { PersonActor } from '@/lib/domain/actor';
import type { Thousandths } from '@/lib/domain/credit';
import { setPolicySchema } from '@/lib/domain/set-policy';
import { HalfmarkError } from '@/lib/errors';
import { canSeeStudentIdentities } from '@/lib/policies/can-see-student-identities';
import { decide, requireAllowed } from '@/lib/policies/decide';
import { answerForMarking } from '@/lib/queries/answer-for-marking';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { ownSecondMarkings } from '@/lib/queries/queue-of-set';
import { presentMarkedAnswer, type MarkedAnswer } from '@/lib/presenters/marked-answer';

type Ids = { courseId: string; problemSetId: string; secondMarkingId: string };
type SetInHead = { id: string; number: number; title: string };

/**
 * Opens a blind second marking for the grader to whom it is assigned; for anybody else it does not exist. Neither the
 * first mark nor its marker is read here, so neither can leave the server.
 */
export async function openSecondMarking(
  actor: PersonActor,
  ids: Ids,
): Promise<{ set: SetInHead; answer: MarkedAnswer; left: number }> {
  const marking = await SecondMarking.findByPk(ids.secondMarkingId, {
    attributes: ['id', 'answerId', 'problemSetId', 'graderId', 'state'],
  });
  if (!marking || marking.graderId !== actor.userId) throw new HalfmarkError('not-found');
  if (marking.state !== 'assigned' && marking.state !== 'taken') throw new HalfmarkError('not-found');
  const { set, answer } = await open(actor, ids, marking, 'work-queue');
  return { set, answer, left: (await ownSecondMarkings(set.id, actor.userId)).length };
}

/** A mark as the one who settles sees it. */
export type MarkToSettle = { order: 'First' | 'Second'; by: string; credit: Thousandths; comment: string };

/** Opens two marks that differ, for those who settle: both with their markers and reasons. */
export async function openSettling(
  actor: PersonActor,
  ids: Ids,
): Promise<{ set: SetInHead; answer: MarkedAnswer; marks: MarkToSettle[] }> {
  const marking = await SecondMarking.findByPk(ids.secondMarkingId);
  if (!marking || marking.state !== 'to-settle' || marking.credit === null) throw new HalfmarkError('not-found');
  const { set, answer } = await open(actor, ids, marking, 'settle-disagreements');
  const first = await Ruling.findByPk(marking.rulingId, { rejectOnEmpty: true });
  const nameOf = async (userId: string) => (await User.findByPk(userId, { rejectOnEmpty: true })).name;
  return {
    set,
    answer,
    marks: [
      { order: 'First', by: await nameOf(first.graderId), credit: first.credit, comment: first.comment },
      { order: 'Second', by: await nameOf(marking.graderId), credit: marking.credit, comment: marking.comment },
    ],
  };
}

async function open(
  actor: PersonActor,
  ids: Ids,
  marking: SecondMarking,
  ability: 'work-queue' | 'settle-disagreements',
): Promise<{ set: SetInHead; answer: MarkedAnswer }> {
  if (marking.problemSetId !== ids.problemSetId) throw new HalfmarkError('not-found');
  const set = await ProblemSet.findByPk(marking.problemSetId, { rejectOnEmpty: true });
  if (set.courseId !== ids.courseId) throw new HalfmarkError('not-found');
  const course = await courseForActor(actor, set.courseId);
  requireAllowed(decide(actor, ability, course));
  const named = canSeeStudentIdentities(actor, course, {
    released: set.state === 'released',
    headTaSeesIdentities: setPolicySchema.parse(set.policy).headTaSeesIdentities,
  }).allowed;
  const answer = presentMarkedAnswer(await answerForMarking(marking.answerId), { named });
  return { set: { id: set.id, number: set.number, title: set.title }, answer };
}
