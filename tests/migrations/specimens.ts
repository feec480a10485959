import { ApiToken } from '@/models/api-token';
import { AuditEvent } from '@/models/audit-event';
import { CommentSnippet } from '@/models/comment-snippet';
import { ConflictOfInterest } from '@/models/conflict-of-interest';
import { CreditRule } from '@/models/credit-rule';
import { Extension } from '@/models/extension';
import { LinkToken } from '@/models/link-token';
import { RulingReversal } from '@/models/ruling-reversal';
import { SavedAnswer } from '@/models/saved-answer';
import { Session } from '@/models/session';
import { buildAnswer, buildAnswerCheck, buildCreditEntry } from '../factories/answers';
import { buildClassroom, type Classroom } from '../factories/classroom';
import { buildIntake, buildIntakeRow } from '../factories/intakes';
import { buildQueueItem, buildRuling, buildSecondMarking } from '../factories/marking';
import { buildRelease } from '../factories/problem-sets';
import { buildAppeal, buildDelivery, buildScoreReport } from '../factories/reports';

/** The first of a list that is known not to be empty. */
export function first<Thing>(things: readonly Thing[]): Thing {
  const [thing] = things;
  if (thing === undefined) throw new RangeError('The list is empty.');
  return thing;
}

/** At least one row in every table that has a model, all of them valid. */
export async function buildSpecimens(): Promise<Classroom> {
  const room = await buildClassroom({ tas: 2, students: 1 });
  const { course, instructor, problemSet, item } = room;
  const student = first(room.students).user;
  const [ta, other] = room.tas.map((member) => member.user);
  if (!ta || !other) throw new RangeError('There are two TAs.');
  const later = new Date(Date.now() + 86_400_000);
  const by = instructor.user.id;

  await Session.create({ id: 'a'.repeat(64), userId: student.id, expiresAt: later });
  await LinkToken.create({ userId: student.id, purpose: 'invitation', expiresAt: later, createdBy: by });
  await ConflictOfInterest.create({ courseId: course.id, graderId: ta.id, studentId: student.id, declaredBy: ta.id });
  await ApiToken.create({
    courseId: course.id,
    name: 'Marks export',
    tokenHash: 'b'.repeat(64),
    scopes: ['marks:read'],
    createdBy: by,
    expiresAt: later,
  });
  await Extension.create({ problemSetId: problemSet.id, userId: student.id, closesAt: later, grantedBy: by });
  await SavedAnswer.create({ drawId: first(room.draws).id, partKey: 'a', text: 'i hbar' });
  await CommentSnippet.create({ problemSetId: problemSet.id, text: 'Mind the sign.', createdBy: ta.id });

  const answer = await buildAnswer(first(room.draws), { text: '-i hbar S_z' });
  await buildAnswerCheck(answer, { verdict: 'differs', slip: 'sign', slips: ['sign'], kinKey: 'slip:sign' });
  await buildCreditEntry(answer, { credit: 0 });
  const queueItem = await buildQueueItem(answer);
  const ruling = await buildRuling(queueItem, ta);
  await buildCreditEntry(answer, { credit: 1500, source: 'ruling', rulingId: ruling.id, actorId: ta.id });
  await buildSecondMarking(ruling, other);
  await RulingReversal.create({ rulingId: ruling.id, reversedBy: ta.id });
  await CreditRule.create({
    problemSetId: problemSet.id,
    itemId: item.id,
    partKey: 'a',
    slip: 'sign',
    credit: 1500,
    fromRulingId: ruling.id,
    createdBy: by,
  });

  const intake = await buildIntake(problemSet, ta, { state: 'committing', committedAt: new Date(), rowsTotal: 1 });
  await buildIntakeRow(intake, {
    state: 'accepted',
    userId: student.id,
    itemId: item.id,
    partKey: 'a',
    text: 'i hbar',
    answerId: answer.id,
  });

  const release = await buildRelease(problemSet, student, instructor.user);
  await buildDelivery(await buildScoreReport(problemSet, student));
  const appeal = await buildAppeal(answer, release);
  await buildQueueItem(answer, { kind: 'appeal', appealId: appeal.id, reasons: ['appeal'] });
  await AuditEvent.create({ actorKind: 'user', actorId: by, courseId: course.id, action: 'open-set' });
  return room;
}
