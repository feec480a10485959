import { describe, expect, it } from 'vitest';
import { ConflictOfInterest } from '@/models/conflict-of-interest';
import { type QueueItem } from '@/models/queue-item';
import { isHalfmarkError, type ErrorCode } from '@/lib/errors';
import { LEASE_MINUTES } from '@/lib/domain/queue-item-state';
import { expireLeases } from '@/lib/services/expire-leases';
import { escalateQueueItem, releaseQueueItem, renewHold } from '@/lib/services/release-queue-item';
import { takeNextItem } from '@/lib/services/take-next-item';
import { takeQueueItem } from '@/lib/services/take-queue-item';
import { buildAnswer } from '../../factories/answers';
import { buildClassroom, type Classroom } from '../../factories/classroom';
import { actingAs, actingAsSystem } from '../../factories/context';
import { buildQueueItem, buildRuling } from '../../factories/marking';
import { buildCourse, buildMember } from '../../factories/people';

const now = new Date('2026-11-20T10:00:00Z');
const minutes = (count: number) => new Date(now.getTime() + count * 60_000);

async function classroomWithQueue(students = 3): Promise<Classroom & { items: QueueItem[] }> {
  const classroom = await buildClassroom({ students, tas: 2, sections: 2 });
  const items: QueueItem[] = [];
  for (const [index, draw] of classroom.draws.entries()) {
    items.push(
      await buildQueueItem(await buildAnswer(draw, { text: '-i hbar S_z' }), {
        createdAt: new Date(now.getTime() - 60_000 * (100 - index)),
      }),
    );
  }
  return { ...classroom, items };
}

function grader(classroom: Classroom, index: number) {
  const ta = classroom.tas[index];
  if (!ta) throw new RangeError('There is no such TA.');
  return ta.user;
}

async function refusal(work: Promise<unknown>, code: ErrorCode): Promise<void> {
  await expect(
    work.then(
      () => 'not refused',
      (error: unknown) => (isHalfmarkError(error) ? error.code : error),
    ),
  ).resolves.toBe(code);
}

describe('handing out', () => {
  it('gives the longest waiting first, keeps what one holds, and never the same to two', async () => {
    const classroom = await classroomWithQueue();
    const { problemSet, items } = classroom;
    const next = (index: number) =>
      actingAs(grader(classroom, index), (context) => takeNextItem(context, { problemSetId: problemSet.id }), now);
    const first = await next(0);
    expect(first?.queueItemId).toBe(items[0]?.id);
    expect(first?.heldUntil).toEqual(minutes(LEASE_MINUTES));
    expect((await next(0))?.queueItemId).toBe(items[0]?.id);
    expect((await next(1))?.queueItemId).toBe(items[1]?.id);
  });

  it('gives twenty graders at the same instant twenty different answers', async () => {
    const classroom = await classroomWithQueue(20);
    const more = await Promise.all(Array.from({ length: 18 }, () => buildMember(classroom.course, 'ta')));
    const graders = [...classroom.tas, ...more].map(({ user }) => user);
    const taken = await Promise.all(
      graders.map((user) =>
        actingAs(user, (context) => takeNextItem(context, { problemSetId: classroom.problemSet.id }), now),
      ),
    );
    const ids = taken.map((item) => item?.queueItemId);
    expect(ids.every((id) => id !== undefined)).toBe(true);
    expect(new Set(ids).size).toBe(20);
  });

  it('passes over students with whom a conflict of interest is declared, and says nothing waits when nothing does', async () => {
    const classroom = await classroomWithQueue(1);
    const [student] = classroom.students;
    await ConflictOfInterest.create({
      courseId: classroom.course.id,
      graderId: grader(classroom, 0).id,
      studentId: student?.user.id ?? '',
      declaredBy: classroom.headTa.user.id,
    });
    const next = actingAs(
      grader(classroom, 0),
      (context) => takeNextItem(context, { problemSetId: classroom.problemSet.id }),
      now,
    );
    expect(await next).toBeNull();
    await refusal(
      actingAs(
        grader(classroom, 0),
        (context) => takeQueueItem(context, { queueItemId: classroom.items[0]?.id ?? '' }),
        now,
      ),
      'forbidden',
    );
  });

  it('keeps a TA to own sections where the course says so', async () => {
    const classroom = await classroomWithQueue(2);
    await classroom.course.update({ tasSeeOwnSectionsOnly: true });
    const ofSecondSection = classroom.students.findIndex(
      ({ membership }) => membership.sectionId === classroom.sections[1]?.id,
    );
    const graderOfSecondSection = classroom.tas.findIndex((_ta, index) => index % 2 === 1);
    const next = await actingAs(
      grader(classroom, graderOfSecondSection),
      (context) => takeNextItem(context, { problemSetId: classroom.problemSet.id }),
      now,
    );
    expect(ofSecondSection).toBeGreaterThan(0);
    expect(next?.queueItemId).toBe(classroom.items[ofSecondSection]?.id);
  });

  it('refuses students, and is not there for other courses', async () => {
    const classroom = await classroomWithQueue(1);
    const elsewhere = await buildMember(await buildCourse(), 'instructor');
    const next = (user: Parameters<typeof actingAs>[0]) =>
      actingAs(user, (context) => takeNextItem(context, { problemSetId: classroom.problemSet.id }), now);
    await refusal(next(classroom.students[0]?.user ?? elsewhere.user), 'forbidden');
    await refusal(next(elsewhere.user), 'not-found');
  });
});

describe('holding', () => {
  it('ends with the lease: another grader may take it, and the first is told', async () => {
    const classroom = await classroomWithQueue(1);
    const queueItemId = classroom.items[0]?.id ?? '';
    await actingAs(grader(classroom, 0), (context) => takeQueueItem(context, { queueItemId }), now);
    await refusal(
      actingAs(grader(classroom, 1), (context) => takeQueueItem(context, { queueItemId }), minutes(LEASE_MINUTES - 1)),
      'conflict',
    );
    await actingAs(grader(classroom, 1), (context) => takeQueueItem(context, { queueItemId }), minutes(LEASE_MINUTES));
    await refusal(
      actingAs(grader(classroom, 0), (context) => renewHold(context, { queueItemId }), minutes(LEASE_MINUTES + 1)),
      'lease-lost',
    );
  });

  it('lasts as long as there are signs of life', async () => {
    const classroom = await classroomWithQueue(1);
    const queueItemId = classroom.items[0]?.id ?? '';
    await actingAs(grader(classroom, 0), (context) => takeQueueItem(context, { queueItemId }), now);
    const renewed = await actingAs(
      grader(classroom, 0),
      (context) => renewHold(context, { queueItemId }),
      minutes(LEASE_MINUTES - 1),
    );
    expect(renewed.heldUntil).toEqual(minutes(2 * LEASE_MINUTES - 1));
  });

  it('is put back by the grader, and by the clock', async () => {
    const classroom = await classroomWithQueue(2);
    const [first, second] = classroom.items;
    for (const item of [first, second]) {
      await actingAs(grader(classroom, 0), (context) => takeQueueItem(context, { queueItemId: item?.id ?? '' }), now);
    }
    await actingAs(grader(classroom, 0), (context) => releaseQueueItem(context, { queueItemId: first?.id ?? '' }), now);
    expect((await first?.reload())?.state).toBe('waiting');
    await actingAsSystem(expireLeases, minutes(LEASE_MINUTES - 1));
    expect((await second?.reload())?.state).toBe('taken');
    expect(await actingAsSystem(expireLeases, minutes(LEASE_MINUTES))).toBeGreaterThan(0);
    expect((await second?.reload())?.state).toBe('waiting');
  });

  it('is handed to the head TA with a question, whom a TA then leaves it to', async () => {
    const classroom = await classroomWithQueue(1);
    const [item] = classroom.items;
    const queueItemId = item?.id ?? '';
    await actingAs(grader(classroom, 0), (context) => takeQueueItem(context, { queueItemId }), now);
    await actingAs(
      grader(classroom, 0),
      (context) => escalateQueueItem(context, { queueItemId, question: 'Is this the Heisenberg picture?' }),
      now,
    );
    expect((await item?.reload())?.state).toBe('escalated');
    await refusal(
      actingAs(grader(classroom, 1), (context) => takeQueueItem(context, { queueItemId }), now),
      'forbidden',
    );
    await actingAs(classroom.headTa.user, (context) => takeQueueItem(context, { queueItemId }), now);
    await actingAs(classroom.headTa.user, (context) => releaseQueueItem(context, { queueItemId }), now);
    expect((await item?.reload())?.state).toBe('escalated');
  });

  it('is refused for what needs nobody any more', async () => {
    const classroom = await classroomWithQueue(1);
    const [item] = classroom.items;
    if (!item) throw new RangeError('The queue has an item.');
    await buildRuling(item, grader(classroom, 1));
    await refusal(
      actingAs(grader(classroom, 0), (context) => takeQueueItem(context, { queueItemId: item.id }), now),
      'wrong-state',
    );
  });
});
