import 'server-only';
import { cache } from 'react';
import { inTransaction } from '@/lib/db/transaction';
import { type PersonActor } from '@/lib/domain/actor';
import { decide, requireAllowed } from '@/lib/policies/decide';
import { presentStudentSet, type StudentSet } from '@/lib/presenters/student-set';
import { attemptsOfDraws } from '@/lib/queries/attempts-of-draws';
import { ownSet } from '@/lib/queries/own-set';
import { savedAnswers } from '@/lib/queries/saved-answers';
import { drawSet } from '@/lib/services/draw-for';

/**
 * A set as its student sees it, drawn now where it was not yet; read once per request. A set that has not begun is
 * not there for students.
 */
export const loadOwnWork = cache(async (actor: PersonActor, problemSetId: string): Promise<StudentSet> => {
  const now = new Date();
  return inTransaction(async (transaction) => {
    const { userId } = actor;
    const set = await ownSet(actor, { problemSetId, userId }, transaction);
    requireAllowed(decide(actor, 'answer-own-draws', set.course));
    const questions = await drawSet({ actor, transaction, now }, { problemSetId, userId });
    const drawIds = questions.map(({ drawId }) => drawId);
    const own = {
      attempts: await attemptsOfDraws(drawIds, transaction),
      saved: await savedAnswers(drawIds, transaction),
    };
    return presentStudentSet(set, questions, own, now);
  });
});
