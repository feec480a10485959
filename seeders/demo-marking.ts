import { Answer } from '@/models/answer';
import { AnswerCheck } from '@/models/answer-check';
import { Draw } from '@/models/draw';
import { ProblemSetItem } from '@/models/problem-set-item';
import { QueueItem } from '@/models/queue-item';
import { SecondMarking } from '@/models/second-marking';
import { Ruling } from '@/models/ruling';
import { TemplateVersion } from '@/models/template-version';
import type { User } from '@/models/user';
import { answerAppeal } from '@/lib/services/answer-appeal';
import { markSecond } from '@/lib/services/mark-second';
import { openAppeal } from '@/lib/services/open-appeal';
import { releaseScores } from '@/lib/services/release-scores';
import { ruleOnAnswer } from '@/lib/services/rule-on-answer';
import { settleDisagreement } from '@/lib/services/settle-disagreement';
import { takeNextItem } from '@/lib/services/take-next-item';
import { takeQueueItem } from '@/lib/services/take-queue-item';
import { pointsOfPart } from '@/lib/templates/points-of-part';
import type { SeededRandom } from '@/lib/templates/seeded-random';
import type { DemoPeople } from './demo-people';
import { as, type DemoSet } from './demo-work';

const MINUTE = 60_000;

const comments: Record<string, readonly string[]> = {
  agrees: ['Right; a little more working would help the reader.'],
  differs: [
    'The method is right, the last step is not. Try your result on one eigenstate.',
    'Check the commutation relation you used: $[S_x, S_y] = \\mathrm{i}\\hbar S_z$.',
    'The units do not fit: look again at the powers of $\\hbar$.',
    'This does not follow from the Hamiltonian you were given.',
  ],
  undecided: ['Read by hand.'],
  unreadable: [
    'I could read most of it: a bracket is missing at the end.',
    'This is not a finished expression. Please write the final result.',
  ],
};

/**
 * Works a share of a set's queue with the four TAs in turn, then its second markings; where `settle` is set the head TA
 * settles what differs.
 */
export async function markSet(
  people: DemoPeople,
  set: DemoSet,
  { random, share, settle, from }: { random: SeededRandom; share: number; settle: boolean; from: Date },
): Promise<void> {
  const waiting = await QueueItem.count({ where: { problemSetId: set.id, state: 'waiting' } });
  let clock = from.getTime();
  for (let done = 0; done < Math.floor(waiting * share); done += 1) {
    const grader = people.tas[done % people.tas.length];
    if (!grader) break;
    clock += MINUTE;
    const at = new Date(clock);
    const next = await as(grader, at, (context) => takeNextItem(context, { problemSetId: set.id }));
    if (next === null) break;
    const decision = await decideOnItem(people, grader, next.queueItemId, random);
    await as(grader, at, (context) =>
      ruleOnAnswer(context, {
        queueItemId: next.queueItemId,
        ...decision,
        millisecondsSpent: 8000 + random.below(60_000),
      }),
    );
  }
  await markSecondTime(people, set, { random, share, from: new Date(clock) });
  if (settle) await settleAll(people, set, new Date(clock + 60 * MINUTE));
}

/** What a TA gives: a quarter or half of the part where the machine sees nothing; the third TA is harder than the rest. */
async function decideOnItem(
  people: DemoPeople,
  grader: User,
  queueItemId: string,
  random: SeededRandom,
): Promise<{ credit: number; comment: string }> {
  const item = await QueueItem.findByPk(queueItemId, { rejectOnEmpty: true });
  return decideOn(people, grader, item.answerId, random);
}

async function decideOn(
  people: DemoPeople,
  grader: User,
  answerId: string,
  random: SeededRandom,
): Promise<{ credit: number; comment: string }> {
  const answer = await Answer.findByPk(answerId, { rejectOnEmpty: true });
  const draw = await Draw.findByPk(answer.drawId, { rejectOnEmpty: true });
  const version = await TemplateVersion.findByPk(draw.templateVersionId, { rejectOnEmpty: true });
  const item = await ProblemSetItem.findByPk(draw.itemId, { rejectOnEmpty: true });
  const check = await AnswerCheck.findByPk(answer.currentCheckId ?? '', { rejectOnEmpty: true });
  const outOf = pointsOfPart(version.content, item.points, answer.partKey);
  // Graders mostly see the same in the same answer: its text decides, and each grader strays a little.
  const merit = [...answer.text].reduce((sum, character) => sum + (character.codePointAt(0) ?? 0), 0) % 3;
  const severity = people.tas.indexOf(grader) === 2 ? 1 : 0;
  const stray = random.below(10) === 0 ? 1 : 0;
  const halves = Math.max(0, Math.min(2 * (outOf / 1000), merit + stray - severity));
  const said = comments[check.verdict] ?? [''];
  return { credit: Math.round(halves) * 500, comment: said[random.below(said.length)] ?? '' };
}

async function markSecondTime(
  people: DemoPeople,
  set: DemoSet,
  { random, share, from }: { random: SeededRandom; share: number; from: Date },
): Promise<void> {
  const assigned = await SecondMarking.findAll({
    where: { problemSetId: set.id, state: 'assigned' },
    order: [
      ['createdAt', 'ASC'],
      ['id', 'ASC'],
    ],
  });
  for (const [index, marking] of assigned.slice(0, Math.floor(assigned.length * share)).entries()) {
    const grader = [...people.tas, people.headTa].find(({ id }) => id === marking.graderId);
    if (!grader) continue;
    const decision = await decideOn(people, grader, marking.answerId, random);
    await as(grader, new Date(from.getTime() + (index + 1) * MINUTE), (context) =>
      markSecond(context, { secondMarkingId: marking.id, ...decision, millisecondsSpent: 8000 + random.below(60_000) }),
    );
  }
}

async function settleAll(people: DemoPeople, set: DemoSet, at: Date): Promise<void> {
  for (const marking of await SecondMarking.findAll({ where: { problemSetId: set.id, state: 'to-settle' } })) {
    const first = await Ruling.findByPk(marking.rulingId, { rejectOnEmpty: true });
    const credit = Math.max(first.credit, marking.credit ?? 0);
    await as(people.headTa, at, (context) =>
      settleDisagreement(context, {
        secondMarkingId: marking.id,
        credit,
        comment: 'Looked at again together with the second marking.',
      }),
    );
  }
}

/** Releases a set as its head TA does; the reports are mailed by the worker. */
export async function releaseSet(people: DemoPeople, set: DemoSet, at: Date): Promise<void> {
  await as(people.headTa, at, (context) => releaseScores(context, { problemSetId: set.id, reportWaitingParts: true }));
}

/** Two students appeal a part of a released set: the first appeal is answered, the second waits. */
export async function appealSome(people: DemoPeople, set: DemoSet, at: Date): Promise<void> {
  const ruled = await Ruling.findAll({
    include: [{ model: QueueItem, as: 'queueItem', where: { problemSetId: set.id, kind: 'review' }, required: true }],
    order: [
      ['createdAt', 'ASC'],
      ['id', 'ASC'],
    ],
    limit: 20,
  });
  const seen = new Set<string>();
  for (const { answerId, graderId, outOf } of ruled) {
    const answer = await Answer.findByPk(answerId, { rejectOnEmpty: true });
    const draw = await Draw.findByPk(answer.drawId, { rejectOnEmpty: true });
    const student = people.students.find(({ id }) => id === draw.userId);
    if (!student || seen.has(student.id)) continue;
    seen.add(student.id);
    await as(student, at, (context) =>
      openAppeal(context, { answerId, reason: 'I believe the method deserves more: only the last line is wrong.' }),
    );
    if (seen.size === 2) return;
    await answerFirst(people, answerId, graderId, outOf, new Date(at.getTime() + 60 * MINUTE));
  }
}

async function answerFirst(
  people: DemoPeople,
  answerId: string,
  firstGraderId: string,
  outOf: number,
  at: Date,
): Promise<void> {
  const item = await QueueItem.findOne({ where: { answerId, kind: 'appeal' }, rejectOnEmpty: true });
  const markers = await Ruling.findAll({ where: { answerId }, attributes: ['graderId'] });
  const other = people.tas.find(({ id }) => id !== firstGraderId && !markers.some((ruling) => ruling.graderId === id));
  if (!other) throw new Error('The demo has another grader for an appeal.');
  await as(other, at, (context) => takeQueueItem(context, { queueItemId: item.id }));
  await as(other, at, (context) =>
    answerAppeal(context, {
      queueItemId: item.id,
      credit: outOf,
      reply: 'You are right: the form is unusual, but it says the same. Full credit.',
      millisecondsSpent: 90_000,
    }),
  );
}
