import { Answer } from '@/models/answer';
import { ConflictOfInterest } from '@/models/conflict-of-interest';
import { Draw } from '@/models/draw';
import { Membership } from '@/models/membership';
import { ProblemSet } from '@/models/problem-set';
import { ProblemSetItem } from '@/models/problem-set-item';
import { QueueItem } from '@/models/queue-item';
import { TemplateVersion } from '@/models/template-version';
import type { PersonActor } from '@/lib/domain/actor';
import type { Thousandths } from '@/lib/domain/credit';
import { HalfmarkError } from '@/lib/errors';
import { decide, requireAllowed, requirePerson, sectionBound } from '@/lib/policies/decide';
import { courseForActor, type CourseView } from '@/lib/queries/course-for-actor';
import { pointsOfPart } from '@/lib/templates/points-of-part';
import type { ServiceContext } from './context';

/** A queue item that a grader may work on, its row held for the rest of the transaction, with what it belongs to. */
export type ItemForGrading = {
  grader: PersonActor;
  course: CourseView;
  set: ProblemSet;
  item: QueueItem;
  answer: Answer;
  draw: Draw;
  /** The full credit of the part. */
  outOf: Thousandths;
};

/**
 * Loads a queue item for a grader. An item of a course the grader may not know of is `not-found`; one outside their
 * sections, or of a student with whom a conflict of interest is declared, is `forbidden`.
 */
export async function loadItemForGrading(context: ServiceContext, queueItemId: string): Promise<ItemForGrading> {
  const { actor, transaction } = context;
  const grader = requirePerson(actor);
  const item = await QueueItem.findByPk(queueItemId, { transaction, lock: transaction.LOCK.UPDATE });
  if (!item) throw new HalfmarkError('not-found');
  const set = await ProblemSet.findByPk(item.problemSetId, { transaction, rejectOnEmpty: true });
  const course = await courseForActor(actor, set.courseId, transaction);
  const decision = decide(actor, 'work-queue', course);
  requireAllowed(decision);
  const answer = await Answer.findByPk(item.answerId, { transaction, rejectOnEmpty: true });
  const draw = await Draw.findByPk(answer.drawId, { transaction, rejectOnEmpty: true });
  await assertMayMark(context, course, draw.userId, sectionBound(actor, course, decision));
  const version = await TemplateVersion.findByPk(draw.templateVersionId, { transaction, rejectOnEmpty: true });
  const inSet = await ProblemSetItem.findByPk(draw.itemId, { transaction, rejectOnEmpty: true });
  const outOf = pointsOfPart(version.content, inSet.points, answer.partKey);
  return { grader, course, set, item, answer, draw, outOf };
}

/** Refuses a student outside the given sections, and one with whom the acting grader has a conflict of interest. */
export async function assertMayMark(
  { actor, transaction }: ServiceContext,
  course: { id: string },
  studentId: string,
  sections: readonly string[] | null,
): Promise<void> {
  const grader = requirePerson(actor);
  const conflict = await ConflictOfInterest.count({
    where: { courseId: course.id, graderId: grader.userId, studentId },
    transaction,
  });
  if (conflict > 0 || studentId === grader.userId) {
    throw new HalfmarkError(
      'forbidden',
      'A conflict of interest is declared here, so another grader marks this answer.',
    );
  }
  if (sections === null) return;
  const student = await Membership.findOne({ where: { courseId: course.id, userId: studentId }, transaction });
  if (!student?.sectionId || !sections.includes(student.sectionId)) {
    throw new HalfmarkError('forbidden', 'This answer is from a section that you do not grade.');
  }
}

/** Throws `lease-lost` unless the acting grader holds the item now. */
export function assertHeldBy(item: QueueItem, graderId: string, now: Date): void {
  if (item.state !== 'taken' || item.heldBy !== graderId || item.heldUntil === null || item.heldUntil <= now) {
    throw new HalfmarkError('lease-lost');
  }
}
