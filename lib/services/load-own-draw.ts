import { Draw } from '@/models/draw';
import { ProblemSet } from '@/models/problem-set';
import { ProblemSetItem } from '@/models/problem-set-item';
import { TemplateVersion } from '@/models/template-version';
import { acceptsAnswers } from '@/lib/domain/problem-set-state';
import { HalfmarkError, isHalfmarkError } from '@/lib/errors';
import { canAnswerDraw } from '@/lib/policies/can-answer-draw';
import { requireAllowed } from '@/lib/policies/decide';
import { courseForActor, type CourseView } from '@/lib/queries/course-for-actor';
import { extendedUntil } from '@/lib/queries/extended-until';
import { type TemplateContent } from '@/lib/templates/content';
import { type ServiceContext } from './context';

/** A draw that is held for the rest of the transaction, by the student whose it is. */
export type OwnDraw = { draw: Draw; set: ProblemSet; course: CourseView; content: TemplateContent };

/**
 * The actor's own draw, held so that hand-ins and saves for it come one after the other; its set is held against being
 * closed meanwhile. Anybody else's draw is `not-found`: nobody learns that it exists.
 */
export async function loadOwnDraw({ actor, transaction }: ServiceContext, drawId: string): Promise<OwnDraw> {
  const draw = await Draw.findByPk(drawId, { transaction, lock: transaction.LOCK.UPDATE });
  if (draw === null || actor.kind !== 'user' || draw.userId !== actor.userId) throw new HalfmarkError('not-found');
  const item = await ProblemSetItem.findByPk(draw.itemId, { transaction, rejectOnEmpty: true });
  const set = await ProblemSet.findByPk(item.problemSetId, {
    transaction,
    lock: transaction.LOCK.SHARE,
    rejectOnEmpty: true,
  });
  const course = await courseOf(actor, set.courseId, transaction);
  requireAllowed(canAnswerDraw(actor, course, draw));
  const version = await TemplateVersion.findByPk(draw.templateVersionId, { transaction, rejectOnEmpty: true });
  return { draw, set, course, content: version.content };
}

/** A student who has left the course still owns the draw, and is told so rather than that nothing is there. */
async function courseOf(...[actor, courseId, transaction]: Parameters<typeof courseForActor>): Promise<CourseView> {
  try {
    return await courseForActor(actor, courseId, transaction);
  } catch (error) {
    if (!isHalfmarkError(error, 'not-found')) throw error;
    throw new HalfmarkError('forbidden', 'You are not a student of this course any more. Ask your instructor.');
  }
}

/** Throws `wrong-state` unless the set takes this student's answers at `now`. */
export async function requireOpenFor({ transaction, now }: ServiceContext, { draw, set }: OwnDraw): Promise<void> {
  const until = await extendedUntil(set.id, draw.userId, transaction);
  if (acceptsAnswers(set, until, now)) return;
  throw new HalfmarkError(
    'wrong-state',
    'This set is closed and takes no more answers. What you typed is kept in this browser; if you need more time, ask your instructor.',
  );
}
