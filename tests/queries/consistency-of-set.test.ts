import { beforeAll, describe, expect, it } from 'vitest';
import { RulingReversal } from '@/models/ruling-reversal';
import { loadActor } from '@/lib/auth/load-actor';
import { type PersonActor } from '@/lib/domain/actor';
import { isHalfmarkError } from '@/lib/errors';
import { presentConsistency } from '@/lib/presenters/consistency';
import { consistencyOfSet } from '@/lib/queries/consistency-of-set';
import { type User } from '@/models/user';
import { buildRuling, buildSecondMarking, buildQueueItem } from '../factories/marking';
import { answerAt, buildMarkedSet, studentAt, type MarkedSet } from '../factories/marked-set';

const now = new Date('2026-11-20T10:00:00Z');
const done = { markedAt: now, comment: '' };

let marked: MarkedSet;

function ta(index: number): User {
  const member = marked.tas[index];
  if (member === undefined) throw new RangeError('There is no such TA.');
  return member.user;
}

async function actor(user: User): Promise<PersonActor> {
  const found = await loadActor(user.id);
  if (found === null) throw new Error('Has an account.');
  return found;
}

const view = async (user: User) =>
  consistencyOfSet(await actor(user), { courseId: marked.course.id, setId: marked.problemSet.id });

async function markedTwice(index: number, [first, second]: [User, User], credits: [number, number], state = 'marked') {
  const ruling = await buildRuling(await buildQueueItem(answerAt(marked, index)), first, { credit: credits[0] });
  await buildSecondMarking(ruling, second, { ...done, credit: credits[1], state: state as 'marked' });
  return ruling;
}

beforeAll(async () => {
  marked = await buildMarkedSet({ students: 6, tas: 3 });
  await markedTwice(0, [ta(0), ta(1)], [3000, 3000]);
  await markedTwice(1, [ta(1), ta(0)], [0, 1500], 'to-settle');
  await markedTwice(2, [ta(1), ta(2)], [1500, 1500]);
  const takenBack = await markedTwice(3, [ta(0), ta(1)], [0, 3000]);
  await RulingReversal.create({ rulingId: takenBack.id, reversedBy: ta(0).id, reason: '' });
  const waiting = await buildRuling(await buildQueueItem(answerAt(marked, 4)), ta(0));
  await buildSecondMarking(waiting, ta(2));
});

describe('the consistency of a set', () => {
  it('shows the head TA every pair but those taken back, and how many are to be done', async () => {
    const found = await view(marked.headTa.user);
    expect(found.pairs.map(({ firstCredit, secondCredit }) => [firstCredit, secondCredit]).sort()).toEqual([
      [0, 1500],
      [1500, 1500],
      [3000, 3000],
    ]);
    expect(found).toMatchObject({ outstanding: 1, ownOnly: null, maySettle: true });
    const shown = presentConsistency(found.pairs, { ownOnly: null, tolerance: 0 });
    expect(shown.rows.map(({ agreement }) => agreement.pairs)).toEqual([2, 1]);
    expect(shown.overall).toMatchObject({ apart: 1, agreement: { pairs: 3, same: 2 } });
    expect(shown.toSettle).toHaveLength(1);
  });

  it('shows a TA their own pairs only, and names nobody', async () => {
    const found = await view(ta(0));
    expect(found).toMatchObject({ outstanding: 0, ownOnly: ta(0).id, maySettle: false });
    expect(found.pairs).toHaveLength(2);
    const shown = presentConsistency(found.pairs, { ownOnly: ta(0).id, tolerance: 0 });
    expect(shown.rows.map(({ name }) => name)).toEqual(['You and co-marker 1']);
    // 3000 and 1500 given, against 3000 and 0: a quarter of the full credit more.
    expect(shown.overall.agreement.meanDifference).toBeCloseTo(0.25, 12);
    expect(JSON.stringify(shown)).not.toContain(ta(1).name);
    expect(JSON.stringify(shown)).not.toContain(ta(1).id);
    expect(shown.toSettle).toEqual([]);
  });

  it('refuses a student', async () => {
    const refusal = await view(studentAt(marked)).catch((error: unknown) => error);
    expect(isHalfmarkError(refusal, 'forbidden')).toBe(true);
  });
});
