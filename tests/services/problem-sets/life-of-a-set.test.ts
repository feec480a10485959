import { beforeAll, describe, expect, it } from 'vitest';
import { closeDueSets } from '@/lib/jobs/close-due-sets';
import { closeProblemSet } from '@/lib/services/close-problem-set';
import { createProblemSet } from '@/lib/services/create-problem-set';
import { editProblemSet } from '@/lib/services/edit-problem-set';
import { addItem, orderItems, removeItem, setItemPoints } from '@/lib/services/edit-set-items';
import { openProblemSet } from '@/lib/services/open-problem-set';
import { reopenProblemSet } from '@/lib/services/reopen-problem-set';
import { defaultSetPolicy } from '@/lib/domain/set-policy';
import { isHalfmarkError, type ErrorCode } from '@/lib/errors';
import { setForStaff } from '@/lib/queries/set-for-staff';
import { setsOfCourse } from '@/lib/queries/sets-of-course';
import { AuditEvent } from '@/models/audit-event';
import { ProblemSet } from '@/models/problem-set';
import { actingAs } from '../../factories/context';
import { buildCourseWithPeople, type CourseWithPeople } from '../../factories/people';
import { buildProblemSet } from '../../factories/problem-sets';
import { buildTemplateVersion } from '../../factories/templates';

const now = new Date('2026-12-01T10:00:00Z');
const hours = (count: number) => new Date(now.getTime() + count * 3_600_000);

let people: CourseWithPeople;
let versionIds: string[];

beforeAll(async () => {
  people = await buildCourseWithPeople();
  const departmentId = people.course.departmentId;
  versionIds = [];
  for (let made = 0; made < 3; made += 1) versionIds.push((await buildTemplateVersion({ departmentId })).id);
});

const asInstructor = <Result>(work: Parameters<typeof actingAs<Result>>[1], at = now) =>
  actingAs(people.instructor.user, work, at);

async function refusalOf(work: Promise<unknown>): Promise<{ code: ErrorCode; fields: string[] } | null> {
  try {
    await work;
    return null;
  } catch (error) {
    if (!isHalfmarkError(error)) throw error;
    return { code: error.code, fields: Object.keys(error.fields) };
  }
}

const plan = {
  title: 'Spin in a field',
  opensAt: null,
  closesAt: hours(48),
  appealsUntil: hours(96),
  attemptsAllowed: 3,
  policy: defaultSetPolicy,
};

/** A draft with one item and a closing time. */
async function buildDraft(): Promise<{ problemSetId: string; revision: number }> {
  const { problemSetId } = await asInstructor((context) =>
    createProblemSet(context, { courseId: people.course.id, title: 'Spin in a field' }),
  );
  const item = { problemSetId, revision: 1, templateVersionId: versionIds[0]!, points: 10_000 };
  const added = await asInstructor((context) => addItem(context, item));
  return asInstructor(async (context) => ({
    problemSetId,
    ...(await editProblemSet(context, { ...plan, problemSetId, revision: added.revision })),
  }));
}

describe('a draft', () => {
  it('gets the next number of its course, also when two are made at once', async () => {
    const { course, instructor } = await buildCourseWithPeople();
    const make = () =>
      actingAs(instructor.user, (context) => createProblemSet(context, { courseId: course.id, title: 'At once' }));
    const made = await Promise.all([make(), make(), make()]);
    expect(made.map((set) => set.number).sort()).toEqual([1, 2, 3]);
  });

  it('is made by instructors only, and hidden from who is not in the course', async () => {
    const input = { courseId: people.course.id, title: 'Not theirs' };
    for (const member of [people.headTa, people.tas[0]!, people.students[0]!]) {
      const attempt = actingAs(member.user, (context) => createProblemSet(context, input));
      expect(await refusalOf(attempt)).toMatchObject({ code: 'forbidden' });
    }
    const stranger = (await buildCourseWithPeople()).instructor;
    const attempt = actingAs(stranger.user, (context) => createProblemSet(context, input));
    expect(await refusalOf(attempt)).toMatchObject({ code: 'not-found' });
  });

  it('takes items, keeps their order gapless, and changes their points', async () => {
    const { problemSetId, revision } = await buildDraft();
    const add = (templateVersionId: string, at: number) =>
      asInstructor((context) => addItem(context, { problemSetId, revision: at, templateVersionId, points: 4_500 }));
    const second = await add(versionIds[1]!, revision);
    const third = await add(versionIds[2]!, second.revision);
    const before = await setForStaff(people.course.id, problemSetId);
    expect(before.items.map((item) => item.position)).toEqual([1, 2, 3]);
    expect(before.points).toBe(19_000);
    expect(before.items[1]!.parts.map((part) => part.outOf)).toEqual([1500, 1500, 1500]);

    const ids = before.items.map((item) => item.id);
    const turned = await asInstructor((context) =>
      orderItems(context, { problemSetId, revision: third.revision, itemIds: [ids[2]!, ids[0]!, ids[1]!] }),
    );
    const removed = await asInstructor((context) =>
      removeItem(context, { problemSetId, revision: turned.revision, itemId: ids[0]! }),
    );
    await asInstructor((context) =>
      setItemPoints(context, { problemSetId, revision: removed.revision, itemId: ids[1]!, points: 7_000 }),
    );
    const after = await setForStaff(people.course.id, problemSetId);
    expect(after.items.map((item) => [item.id, item.position, item.points])).toEqual([
      [ids[2], 1, 4_500],
      [ids[1], 2, 7_000],
    ]);
  });

  it('refuses an order that does not name every item once', async () => {
    const { problemSetId, revision } = await buildDraft();
    const [item] = (await setForStaff(people.course.id, problemSetId)).items;
    for (const itemIds of [[item!.id, item!.id], [problemSetId]]) {
      const attempt = asInstructor((context) => orderItems(context, { problemSetId, revision, itemIds }));
      expect(await refusalOf(attempt)).toMatchObject({ code: 'conflict' });
    }
  });

  it('refuses a change made from an older revision', async () => {
    const { problemSetId, revision } = await buildDraft();
    const edit = (title: string) =>
      asInstructor((context) => editProblemSet(context, { ...plan, title, problemSetId, revision }));
    await edit('First');
    expect(await refusalOf(edit('Second'))).toMatchObject({ code: 'conflict' });
    expect((await setForStaff(people.course.id, problemSetId)).title).toBe('First');
  });

  it('refuses times out of order, at their fields', async () => {
    const { problemSetId, revision } = await buildDraft();
    const wrong = { ...plan, opensAt: hours(50), appealsUntil: hours(20) };
    const attempt = asInstructor((context) => editProblemSet(context, { ...wrong, problemSetId, revision }));
    expect(await refusalOf(attempt)).toEqual({ code: 'invalid', fields: ['closesAt', 'appealsUntil'] });
  });
});

describe('opening and closing', () => {
  it('opens at once, then keeps its questions and only becomes more generous', async () => {
    const { problemSetId, revision } = await buildDraft();
    const opened = await asInstructor((context) => openProblemSet(context, { problemSetId, revision }));
    expect(opened.opensAt).toEqual(now);
    const at = { problemSetId, revision: opened.revision };
    const add = asInstructor((context) =>
      addItem(context, { ...at, templateVersionId: versionIds[1]!, points: 1_000 }),
    );
    expect(await refusalOf(add)).toMatchObject({ code: 'wrong-state' });
    const edit = (changes: Partial<typeof plan>) =>
      asInstructor((context) => editProblemSet(context, { ...plan, opensAt: now, ...changes, ...at }));
    expect(await refusalOf(edit({ closesAt: hours(24) }))).toEqual({ code: 'invalid', fields: ['closesAt'] });
    expect(await refusalOf(edit({ closesAt: hours(72), attemptsAllowed: 5 }))).toBeNull();
  });

  it('opens by itself at a later time, until when everything can be changed but the last question', async () => {
    const { problemSetId, revision } = await buildDraft();
    const later = { ...plan, opensAt: hours(5), problemSetId };
    const planned = await asInstructor((context) => editProblemSet(context, { ...later, revision }));
    const opened = await asInstructor((context) => openProblemSet(context, { problemSetId, ...planned }));
    expect(opened.opensAt).toEqual(hours(5));
    const added = await asInstructor((context) =>
      addItem(context, {
        problemSetId,
        revision: opened.revision,
        templateVersionId: versionIds[1]!,
        points: 1_000,
      }),
    );
    const close = asInstructor((context) => closeProblemSet(context, { problemSetId, revision: added.revision }));
    expect(await refusalOf(close)).toMatchObject({ code: 'wrong-state' });
    const { items } = await setForStaff(people.course.id, problemSetId);
    const remove = (itemId: string, at: number) =>
      asInstructor((context) => removeItem(context, { problemSetId, revision: at, itemId }));
    const left = await remove(items[1]!.id, added.revision);
    expect(await refusalOf(remove(items[0]!.id, left.revision))).toMatchObject({ code: 'wrong-state' });
  });

  it('refuses to open without a question, without a closing time, and with one that has passed', async () => {
    const { problemSetId } = await asInstructor((context) =>
      createProblemSet(context, { courseId: people.course.id, title: 'Empty' }),
    );
    const open = (revision: number, at = now) =>
      asInstructor((context) => openProblemSet(context, { problemSetId, revision }), at);
    expect(await refusalOf(open(1))).toMatchObject({ code: 'wrong-state' });
    const item = { problemSetId, revision: 1, templateVersionId: versionIds[0]!, points: 1_000 };
    await asInstructor((context) => addItem(context, item));
    expect(await refusalOf(open(2))).toEqual({ code: 'invalid', fields: ['closesAt'] });
    await asInstructor((context) => editProblemSet(context, { ...plan, problemSetId, revision: 2 }));
    expect(await refusalOf(open(3, hours(49)))).toEqual({ code: 'invalid', fields: ['closesAt'] });
  });

  it('closes now, and opens again until later with appeals moved by as much', async () => {
    const { problemSetId, revision } = await buildDraft();
    const opened = await asInstructor((context) => openProblemSet(context, { problemSetId, revision }));
    const closed = await asInstructor(
      (context) => closeProblemSet(context, { problemSetId, revision: opened.revision }),
      hours(1),
    );
    expect(closed.closesAt).toEqual(hours(1));
    const reopen = (closesAt: Date) =>
      asInstructor(
        (context) => reopenProblemSet(context, { problemSetId, revision: closed.revision, closesAt }),
        hours(2),
      );
    expect(await refusalOf(reopen(hours(2)))).toEqual({ code: 'invalid', fields: ['closesAt'] });
    await reopen(hours(11));
    expect(await setForStaff(people.course.id, problemSetId)).toMatchObject({
      state: 'open',
      closesAt: hours(11),
      appealsUntil: hours(106),
    });
    const actions = await AuditEvent.findAll({ where: { subjectId: problemSetId }, order: [['id', 'asc']] });
    expect(actions.map((event) => event.action)).toEqual([
      'create-set',
      'add-item',
      'edit-set',
      'open-set',
      'close-set',
      'reopen-set',
    ]);
  });

  it('is closed by the clock when its time has passed, once, and not before', async () => {
    const past = { opensAt: new Date(Date.now() - 7_200_000), appealsUntil: null };
    const due = await buildProblemSet(people.course, { ...past, closesAt: new Date(Date.now() - 60_000) });
    const running = await buildProblemSet(people.course, { ...past, closesAt: new Date(Date.now() + 3_600_000) });
    const run = () =>
      closeDueSets({}, { jobId: '1', attempt: 1, isLastAttempt: true, signal: new AbortController().signal });
    await Promise.all([run(), run()]);
    const closed = await ProblemSet.findByPk(due.id);
    expect(closed).toMatchObject({ state: 'closed', closesAt: due.closesAt, revision: 2 });
    expect((await ProblemSet.findByPk(running.id))?.state).toBe('open');
    expect(await AuditEvent.count({ where: { subjectId: due.id, action: 'close-set' } })).toBe(1);
  });
});

describe('reading sets', () => {
  it('hides a set behind another course’s id', async () => {
    const { problemSetId } = await buildDraft();
    const other = await buildCourseWithPeople();
    expect(await refusalOf(setForStaff(other.course.id, problemSetId))).toMatchObject({ code: 'not-found' });
  });

  it('lists the sets of a course, the latest first', async () => {
    const { course } = await buildCourseWithPeople();
    await buildProblemSet(course, { number: 1 });
    await buildProblemSet(course, { number: 2 });
    expect((await setsOfCourse(course.id)).map((set) => [set.number, set.points, set.waiting])).toEqual([
      [2, 0, 0],
      [1, 0, 0],
    ]);
  });
});
