import { describe, expect, it } from 'vitest';
import { type Answer } from '@/models/answer';
import { CreditEntry } from '@/models/credit-entry';
import type { QueueItem } from '@/models/queue-item';
import { SecondMarking } from '@/models/second-marking';
import { defaultSetPolicy, type SetPolicy } from '@/lib/domain/set-policy';
import { LEASE_MINUTES } from '@/lib/domain/queue-item-state';
import { isHalfmarkError, type ErrorCode } from '@/lib/errors';
import { markSecond } from '@/lib/services/mark-second';
import { ruleOnAnswer } from '@/lib/services/rule-on-answer';
import { settleDisagreement } from '@/lib/services/settle-disagreement';
import { takeQueueItem } from '@/lib/services/take-queue-item';
import { buildAnswer, buildCreditEntry } from '../../factories/answers';
import { buildClassroom, type Classroom } from '../../factories/classroom';
import { actingAs } from '../../factories/context';
import { buildQueueItem } from '../../factories/marking';

const now = new Date('2026-11-20T10:00:00Z');

type Desk = Classroom & { queueItem: QueueItem; answer: Answer };

async function deskWith(policy: Partial<SetPolicy>): Promise<Desk> {
  const classroom = await buildClassroom({
    students: 1,
    tas: 2,
    problemSet: { policy: { ...defaultSetPolicy, ...policy } },
  });
  const [draw] = classroom.draws;
  if (!draw) throw new RangeError('The classroom has a draw.');
  const answer = await buildAnswer(draw, { text: '-i hbar S_z' });
  const queueItem = await buildQueueItem(answer);
  return { ...classroom, queueItem, answer };
}

function ta(desk: Desk, index: number) {
  const member = desk.tas[index];
  if (!member) throw new RangeError('There is no such TA.');
  return member.user;
}

async function refusal(work: Promise<unknown>, code: ErrorCode): Promise<void> {
  await expect(
    work.then(
      () => 'not refused',
      (error: unknown) => (isHalfmarkError(error) ? error.code : error),
    ),
  ).resolves.toBe(code);
}

async function rule(desk: Desk, credit: number, index = 0, at = now) {
  await actingAs(ta(desk, index), (context) => takeQueueItem(context, { queueItemId: desk.queueItem.id }), at);
  return actingAs(
    ta(desk, index),
    (context) =>
      ruleOnAnswer(context, { queueItemId: desk.queueItem.id, credit, comment: 'The sign.', millisecondsSpent: 9000 }),
    at,
  );
}

describe('a ruling', () => {
  it('gives credit that follows what was there before, and says who gave it and why', async () => {
    const desk = await deskWith({ secondMarkingRate: 0 });
    const before = await buildCreditEntry(desk.answer, { credit: 0, source: 'automatic' });
    const { rulingId, secondMarking } = await rule(desk, 500);
    expect(secondMarking).toBe(false);
    const answer = await desk.answer.reload();
    const entry = await CreditEntry.findByPk(answer.currentCreditEntryId ?? '', { rejectOnEmpty: true });
    expect(entry).toMatchObject({
      credit: 500,
      source: 'ruling',
      rulingId,
      actorId: ta(desk, 0).id,
      reason: 'The sign.',
      previousEntryId: before.id,
    });
    expect((await desk.queueItem.reload()).state).toBe('ruled');
  });

  it('is refused without a hold, after the lease, above full credit, and a second time', async () => {
    const desk = await deskWith({ secondMarkingRate: 0 });
    const input = { queueItemId: desk.queueItem.id, credit: 500, comment: '', millisecondsSpent: null };
    await refusal(
      actingAs(ta(desk, 0), (context) => ruleOnAnswer(context, input), now),
      'lease-lost',
    );
    await actingAs(ta(desk, 0), (context) => takeQueueItem(context, { queueItemId: desk.queueItem.id }), now);
    const late = new Date(now.getTime() + LEASE_MINUTES * 60_000);
    await refusal(
      actingAs(ta(desk, 0), (context) => ruleOnAnswer(context, input), late),
      'lease-lost',
    );
    await refusal(
      actingAs(ta(desk, 1), (context) => ruleOnAnswer(context, input), now),
      'lease-lost',
    );
    await refusal(
      actingAs(ta(desk, 0), (context) => ruleOnAnswer(context, { ...input, credit: 1_000_000 }), now),
      'invalid',
    );
    await actingAs(ta(desk, 0), (context) => ruleOnAnswer(context, input), now);
    await refusal(
      actingAs(ta(desk, 0), (context) => ruleOnAnswer(context, input), now),
      'lease-lost',
    );
  });

  it('happens once when two arrive at the same instant', async () => {
    const desk = await deskWith({ secondMarkingRate: 0 });
    await actingAs(ta(desk, 0), (context) => takeQueueItem(context, { queueItemId: desk.queueItem.id }), now);
    const results = await Promise.allSettled(
      [100, 200].map((credit) =>
        actingAs(
          ta(desk, 0),
          (context) =>
            ruleOnAnswer(context, { queueItemId: desk.queueItem.id, credit, comment: '', millisecondsSpent: null }),
          now,
        ),
      ),
    );
    expect(results.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
    expect(await CreditEntry.count({ where: { answerId: desk.answer.id } })).toBe(1);
  });
});

describe('second marking', () => {
  it('goes to another grader than the first, and changes nothing where both agree', async () => {
    const desk = await deskWith({ secondMarkingRate: 1000 });
    const { secondMarking } = await rule(desk, 500);
    expect(secondMarking).toBe(true);
    const marking = await SecondMarking.findOne({ where: { answerId: desk.answer.id }, rejectOnEmpty: true });
    expect(marking.graderId).not.toBe(ta(desk, 0).id);
    const second = [...desk.tas, desk.headTa].find(({ user }) => user.id === marking.graderId);
    if (!second) throw new RangeError('The second grader is of this course.');
    await refusal(
      actingAs(
        ta(desk, 0),
        (context) =>
          markSecond(context, { secondMarkingId: marking.id, credit: 1, comment: '', millisecondsSpent: null }),
        now,
      ),
      'not-found',
    );
    await actingAs(
      second.user,
      (context) =>
        markSecond(context, { secondMarkingId: marking.id, credit: 500, comment: '', millisecondsSpent: null }),
      now,
    );
    expect((await marking.reload()).state).toBe('marked');
    expect((await desk.queueItem.reload()).state).toBe('ruled');
    expect(await CreditEntry.count({ where: { answerId: desk.answer.id } })).toBe(1);
  });

  it('waits to be settled where the two differ, and the settled credit stands', async () => {
    const desk = await deskWith({ secondMarkingRate: 1000, settleTolerance: 0 });
    await rule(desk, 500);
    const marking = await SecondMarking.findOne({ where: { answerId: desk.answer.id }, rejectOnEmpty: true });
    const second = [...desk.tas, desk.headTa].find(({ user }) => user.id === marking.graderId);
    if (!second) throw new RangeError('The second grader is of this course.');
    await actingAs(
      second.user,
      (context) =>
        markSecond(context, { secondMarkingId: marking.id, credit: 0, comment: 'No.', millisecondsSpent: 1 }),
      now,
    );
    expect((await marking.reload()).state).toBe('to-settle');
    expect((await desk.queueItem.reload()).state).toBe('to-settle');
    const settle = { secondMarkingId: marking.id, credit: 250, comment: 'Half of it.' };
    await refusal(
      actingAs(ta(desk, 0), (context) => settleDisagreement(context, settle), now),
      'forbidden',
    );
    await actingAs(desk.headTa.user, (context) => settleDisagreement(context, settle), now);
    expect(await marking.reload()).toMatchObject({ state: 'settled', settledCredit: 250 });
    expect((await desk.queueItem.reload()).state).toBe('settled');
    const answer = await desk.answer.reload();
    const entry = await CreditEntry.findByPk(answer.currentCreditEntryId ?? '', { rejectOnEmpty: true });
    expect(entry).toMatchObject({ credit: 250, source: 'settlement' });
    await refusal(
      actingAs(desk.headTa.user, (context) => settleDisagreement(context, settle), now),
      'wrong-state',
    );
  });
});
