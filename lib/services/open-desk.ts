import { Appeal } from '@/models/appeal';
import type { PersonActor } from '@/lib/domain/actor';
import { inTransaction } from '@/lib/db/transaction';
import type { Thousandths } from '@/lib/domain/credit';
import type { FlagReason } from '@/lib/domain/flag-reasons';
import { hasExpired, type QueueItemState } from '@/lib/domain/queue-item-state';
import { setPolicySchema } from '@/lib/domain/set-policy';
import { HalfmarkError } from '@/lib/errors';
import { canSeeStudentIdentities } from '@/lib/policies/can-see-student-identities';
import { decide, sectionBound } from '@/lib/policies/decide';
import {
  answerForMarking,
  creditHistory,
  earlierAttempts,
  siblingParts,
  type CreditStep,
  type SiblingPart,
} from '@/lib/queries/answer-for-marking';
import { queueOfSet } from '@/lib/queries/queue-of-set';
import { presentMarkedAnswer, type MarkedAnswer } from '@/lib/presenters/marked-answer';
import { loadItemForGrading } from './load-item-for-grading';

/** What the desk of one queue item shows. */
export type OpenedDesk = {
  set: { id: string; number: number; title: string };
  item: {
    id: string;
    kind: 'review' | 'appeal';
    state: QueueItemState;
    reasons: FlagReason[];
    question: string | null;
  };
  answer: MarkedAnswer;
  appealReason: string | null;
  suggested: Thousandths | null;
  /** Until when the person who asks holds it; null where they do not. */
  heldUntil: Date | null;
  mayEscalate: boolean;
  history: CreditStep[];
  otherParts: SiblingPart[];
  earlierAttempts: Awaited<ReturnType<typeof earlierAttempts>>;
  /** Answers of the set that wait and that this person may mark. */
  waiting: number;
};

/**
 * Opens the desk of a queue item for a grader who may mark it, without taking it: an address alone changes nothing. The
 * history of credit is shown to who holds or may settle only after a mark was given, since it is empty before.
 */
export async function openDesk(
  actor: PersonActor,
  ids: { courseId: string; problemSetId: string; queueItemId: string },
): Promise<OpenedDesk> {
  const now = new Date();
  const { item, set, course, draw } = await inTransaction((transaction) =>
    loadItemForGrading({ actor, transaction, now }, ids.queueItemId),
  );
  if (set.id !== ids.problemSetId || course.id !== ids.courseId) throw new HalfmarkError('not-found');
  const policy = setPolicySchema.parse(set.policy);
  const named = canSeeStudentIdentities(actor, course, {
    released: set.state === 'released',
    headTaSeesIdentities: policy.headTaSeesIdentities,
  }).allowed;
  const sections = sectionBound(actor, course, decide(actor, 'work-queue', course));
  const row = await answerForMarking(item.answerId);
  const [history, otherParts, attempts, queue, appeal] = await Promise.all([
    creditHistory(item.answerId),
    siblingParts(draw.id, row.partKey),
    earlierAttempts(draw.id, row.partKey, row.attempt),
    queueOfSet({ problemSetId: set.id, courseId: course.id, graderId: actor.userId, sections, now }),
    item.appealId === null ? null : Appeal.findByPk(item.appealId),
  ]);
  const expired = item.state === 'taken' && (item.heldUntil === null || hasExpired(item.heldUntil, now));
  const mine = item.state === 'taken' && item.heldBy === actor.userId && !expired;
  return {
    set: { id: set.id, number: set.number, title: set.title },
    item: {
      id: item.id,
      kind: item.kind,
      state: expired ? 'waiting' : item.state,
      reasons: item.reasons,
      question: item.question,
    },
    answer: presentMarkedAnswer(row, { named }),
    appealReason: appeal?.reason ?? null,
    suggested: item.suggestedCredit,
    heldUntil: mine ? item.heldUntil : null,
    mayEscalate: item.kind === 'review' && !decide(actor, 'settle-disagreements', course).allowed,
    history,
    otherParts,
    earlierAttempts: attempts,
    waiting: queue.filter(({ state }) => state === 'waiting').length,
  };
}
