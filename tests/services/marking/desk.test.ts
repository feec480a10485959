import { describe, expect, it } from 'vitest';
import { loadActor } from '@/lib/auth/load-actor';
import type { PersonActor } from '@/lib/domain/actor';
import { isHalfmarkError } from '@/lib/errors';
import { queueOfSet } from '@/lib/queries/queue-of-set';
import { openDesk } from '@/lib/services/open-desk';
import { openSecondMarking, openSettling } from '@/lib/services/open-second-marking';
import { takeQueueItem } from '@/lib/services/take-queue-item';
import { Answer } from '@/models/answer';
import { ConflictOfInterest } from '@/models/conflict-of-interest';
import type { User } from '@/models/user';
import { buildAnswer, buildAnswerCheck, buildCreditEntry } from '../../factories/answers';
import { buildClassroom, type Classroom } from '../../factories/classroom';
import { actingAs } from '../../factories/context';
import { buildQueueItem, buildRuling, buildSecondMarking } from '../../factories/marking';

async function actor(user: User): Promise<PersonActor> {
  const loaded = await loadActor(user.id);
  if (loaded?.kind !== 'user') throw new Error('This person has an account.');
  return loaded;
}

function one<Thing>(things: readonly Thing[], index: number): Thing {
  const thing = things[index];
  if (thing === undefined) throw new RangeError(`There is no number ${index}.`);
  return thing;
}

/** Two answers that wait, the first with a slip that has credit. */
async function withQueue() {
  const classroom = await buildClassroom({ students: 2, tas: 2, sections: 2 });
  const items = [];
  for (const draw of classroom.draws) {
    const answer = await buildAnswer(draw, { partKey: 'a', text: '-i hbar S_z' });
    await buildAnswerCheck(answer, {
      verdict: 'differs',
      slip: 'sign',
      slips: ['sign'],
      message: 'The answer differs from the reference: the overall sign is wrong.',
      evidence: { test: 'witness' },
    });
    items.push(await buildQueueItem(answer, { suggestedCredit: 1000, suggestedRule: 'sign' }));
  }
  return { ...classroom, items };
}

const ids = ({ course, problemSet }: Classroom) => ({ courseId: course.id, problemSetId: problemSet.id });

async function codeOf(work: Promise<unknown>): Promise<unknown> {
  return work.then(
    () => 'not refused',
    (error: unknown) => (isHalfmarkError(error) ? error.code : error),
  );
}

describe('opening a desk', () => {
  it('takes nothing, and shows a hold only to who holds', async () => {
    const classroom = await withQueue();
    const [item, ta, other] = [one(classroom.items, 0), one(classroom.tas, 0), one(classroom.tas, 1)];
    const open = async (user: User) => openDesk(await actor(user), { ...ids(classroom), queueItemId: item.id });
    expect((await open(ta.user)).heldUntil).toBeNull();
    await actingAs(ta.user, (context) => takeQueueItem(context, { queueItemId: item.id }));
    const mine = await open(ta.user);
    expect(mine.heldUntil).toBeInstanceOf(Date);
    expect(mine.suggested).toBe(1000);
    const theirs = await open(other.user);
    expect([theirs.heldUntil, theirs.item.state]).toEqual([null, 'taken']);
  });

  it('names no student before release but to the instructor', async () => {
    const classroom = await withQueue();
    const item = one(classroom.items, 0);
    const { name } = one(classroom.students, 0).user;
    const opened = async (user: User) =>
      JSON.stringify(await openDesk(await actor(user), { ...ids(classroom), queueItemId: item.id }));
    for (const user of [one(classroom.tas, 0).user, classroom.headTa.user]) {
      expect(await opened(user)).not.toContain(name);
    }
    expect(await opened(classroom.instructor.user)).toContain(name);
  });

  it('does not exist at another set or course', async () => {
    const classroom = await withQueue();
    const elsewhere = await buildClassroom({ students: 1 });
    const ta = await actor(one(classroom.tas, 0).user);
    const queueItemId = one(classroom.items, 0).id;
    const wrong = { ...ids(classroom), problemSetId: elsewhere.problemSet.id, queueItemId };
    expect(await codeOf(openDesk(ta, wrong))).toBe('not-found');
  });
});

describe('the queue of a set', () => {
  it('leaves out whom a grader may not mark, and counts kin', async () => {
    const classroom = await withQueue();
    const [ta, student] = [one(classroom.tas, 0), one(classroom.students, 0)];
    for (const item of classroom.items) await item.update({ kinKey: 'slip:sign' });
    const rows = (sections: string[] | null) =>
      queueOfSet({ ...ids(classroom), graderId: ta.user.id, sections, now: new Date() });
    expect((await rows(null)).map(({ kin }) => kin)).toEqual([2, 2]);
    expect(await rows([])).toEqual([]);
    await ConflictOfInterest.create({
      courseId: classroom.course.id,
      graderId: ta.user.id,
      studentId: student.user.id,
      declaredBy: classroom.headTa.user.id,
    });
    expect((await rows(null)).map(({ studentId }) => studentId)).toEqual([one(classroom.students, 1).user.id]);
  });
});

describe('a second marking', () => {
  async function ruled() {
    const classroom = await withQueue();
    const [first, second] = [one(classroom.tas, 0), one(classroom.tas, 1)];
    const item = one(classroom.items, 0);
    const ruling = await buildRuling(item, first.user, {
      credit: 1234,
      outOf: 3000,
      comment: 'A remark of the first.',
    });
    const answer = await Answer.findByPk(item.answerId, { rejectOnEmpty: true });
    await buildCreditEntry(answer, { credit: 1234, outOf: 3000, reason: 'A remark of the first.' });
    const marking = await buildSecondMarking(ruling, second.user);
    return { ...classroom, first, second, marking };
  }

  it('holds nothing of the first mark, its marker, a suggestion or a history', async () => {
    const scene = await ruled();
    const opened = await openSecondMarking(await actor(scene.second.user), {
      ...ids(scene),
      secondMarkingId: scene.marking.id,
    });
    const sent = JSON.stringify(opened);
    for (const secret of [
      '1234',
      '1.234',
      'A remark of the first.',
      scene.first.user.name,
      scene.first.user.id,
      'suggest',
    ]) {
      expect(sent).not.toContain(secret);
    }
    expect(opened.answer.text).toBe('-i hbar S_z');
  });

  it('does not exist for anybody else, nor for settling before it is done', async () => {
    const scene = await ruled();
    const at = { ...ids(scene), secondMarkingId: scene.marking.id };
    expect(await codeOf(openSecondMarking(await actor(scene.first.user), at))).toBe('not-found');
    expect(await codeOf(openSettling(await actor(scene.headTa.user), at))).toBe('not-found');
  });

  it('is shown to who settles with both marks and their reasons', async () => {
    const scene = await ruled();
    await scene.marking.update({ state: 'to-settle', credit: 3000, comment: 'All right to me.', markedAt: new Date() });
    const at = { ...ids(scene), secondMarkingId: scene.marking.id };
    const { marks } = await openSettling(await actor(scene.headTa.user), at);
    expect(marks).toEqual([
      { order: 'First', by: scene.first.user.name, credit: 1234, comment: 'A remark of the first.' },
      { order: 'Second', by: scene.second.user.name, credit: 3000, comment: 'All right to me.' },
    ]);
    expect(await codeOf(openSettling(await actor(scene.first.user), at))).toBe('forbidden');
  });
});
