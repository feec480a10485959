import { randomUUID } from 'node:crypto';
import { QueryTypes } from 'sequelize';
import { beforeAll, describe, expect, it } from 'vitest';
import { database } from '@/lib/db/connection';
import { MOST_HAND_INS } from '@/lib/domain/attempts';
import { handInAnswers, type HandInInput, type HandInResult } from '@/lib/services/hand-in-answers';
import { saveAnswer } from '@/lib/services/save-answer';
import { Answer } from '@/models/answer';
import { AuditEvent } from '@/models/audit-event';
import { type Draw } from '@/models/draw';
import { Extension } from '@/models/extension';
import { QueueItem } from '@/models/queue-item';
import { Submission } from '@/models/submission';
import { type User } from '@/models/user';
import { buildAnswer, buildAnswerCheck } from '@/tests/factories/answers';
import { buildClassroom, type Classroom } from '@/tests/factories/classroom';
import { actingAs } from '@/tests/factories/context';
import { buildQueueItem } from '@/tests/factories/marking';

const day = 86_400_000;
let room: Classroom;
let student: User;
let draw: Draw;

beforeAll(async () => {
  room = await buildClassroom({ students: 2 });
});

/** A class of its own for a test that changes the set or uses up attempts. */
async function freshRoom(problemSet: NonNullable<Parameters<typeof buildClassroom>[0]>['problemSet'] = {}) {
  const made = await buildClassroom({ students: 2, problemSet });
  student = made.students[0]!.user;
  draw = made.draws[0]!;
  return made;
}

function handIn(
  texts: Record<string, string>,
  change: Partial<HandInInput> = {},
  now: Date = new Date(),
): Promise<HandInResult> {
  const answers = Object.entries(texts).map(([partKey, text]) => ({ partKey, text }));
  const input = { drawId: draw.id, answers, clientKey: randomUUID(), confirmUnreadable: false, ...change };
  return actingAs(student, (context) => handInAnswers(context, input), now);
}

function jobsFor(answerId: string) {
  return database().query<{ priority: number }>(
    `select j.priority from graphile_worker._private_jobs j join graphile_worker._private_tasks t on t.id = j.task_id
      where t.identifier = 'check-answers' and j.payload::text like :like`,
    { type: QueryTypes.SELECT, replacements: { like: `%${answerId}%` } },
  );
}

describe('handing in', () => {
  it('stores each part as an attempt with one receipt, asks for the check ahead of bulk work, and writes the log', async () => {
    await freshRoom();
    const result = await handIn({ a: '3 i hbar^2', b: '±3ħω/2' });
    expect(result.kind).toBe('handed-in');
    if (result.kind !== 'handed-in') return;
    expect(result.parts.map(({ partKey, attempt, attemptsLeft }) => [partKey, attempt, attemptsLeft])).toEqual([
      ['a', 1, 2],
      ['b', 1, 2],
    ]);
    expect(new Set(result.parts.map(({ receipt }) => receipt)).size).toBe(1);
    const stored = await Answer.findAll({ where: { drawId: draw.id }, order: [['partKey', 'asc']] });
    expect(stored.map(({ text, checkState }) => [text, checkState])).toEqual([
      ['3 i hbar^2', 'waiting'],
      ['±3ħω/2', 'waiting'],
    ]);
    expect((await jobsFor(stored[0]!.id)).map(({ priority }) => priority)).toEqual([-10]);
    const event = await AuditEvent.findOne({ where: { action: 'hand-in-answers', actorId: student.id } });
    expect(event?.details).toMatchObject({ parts: ['a', 'b'] });
    expect(JSON.stringify(event?.details)).not.toContain('hbar');
  });

  it('stores the same hand-in once, however many requests bring it at the same time', async () => {
    await freshRoom();
    const clientKey = randomUUID();
    const results = await Promise.all(Array.from({ length: 6 }, () => handIn({ a: 'i hbar S_z' }, { clientKey })));
    const receipts = results.map((result) => (result.kind === 'handed-in' ? result.parts[0]?.receipt : null));
    expect(new Set(receipts).size).toBe(1);
    expect(receipts[0]).toMatch(/^[2-9A-Z-]{14}$/);
    expect(await Submission.count({ where: { drawId: draw.id } })).toBe(1);
    const answers = await Answer.findAll({ where: { drawId: draw.id } });
    expect(answers).toHaveLength(1);
    expect(await jobsFor(answers[0]!.id)).toHaveLength(1);
  });

  it('stores the same text from two tabs once, and takes no attempt for it', async () => {
    await freshRoom();
    const results = await Promise.all([handIn({ a: 'i hbar S_z' }), handIn({ a: 'i hbar S_z' })]);
    expect(await Answer.count({ where: { drawId: draw.id } })).toBe(1);
    expect(results.map((result) => (result.kind === 'handed-in' ? result.parts[0]?.attemptsLeft : null))).toEqual([
      2, 2,
    ]);
  });

  it('gives two different texts at once two attempts, of which one stands', async () => {
    await freshRoom();
    await Promise.all([handIn({ a: 'S_x' }), handIn({ a: 'S_y' })]);
    const answers = await Answer.findAll({ where: { drawId: draw.id }, order: [['attempt', 'asc']] });
    expect(answers.map(({ attempt, supersededAt }) => [attempt, supersededAt === null])).toEqual([
      [1, false],
      [2, true],
    ]);
  });

  it('answers a repeated hand-in also after the set has closed', async () => {
    const { problemSet } = await freshRoom();
    const clientKey = randomUUID();
    const first = await handIn({ a: 'S_x' }, { clientKey });
    await problemSet.update({ state: 'closed', closesAt: new Date(Date.now() - 1000) });
    expect(await handIn({ a: 'S_x' }, { clientKey })).toEqual(first);
  });

  it('refuses a key that belongs to another draw', async () => {
    const clientKey = randomUUID();
    await freshRoom();
    await handIn({ a: 'S_x' }, { clientKey });
    await freshRoom();
    await expect(handIn({ a: 'S_x' }, { clientKey })).rejects.toMatchObject({ code: 'conflict' });
  });

  it('takes nothing when a part is unknown or nothing was typed, and leaves the empty parts of a question out', async () => {
    await freshRoom();
    await expect(handIn({ a: 'S_x', q: '1' })).rejects.toMatchObject({ code: 'invalid' });
    await expect(handIn({ a: '  ', b: '' })).rejects.toMatchObject({ code: 'invalid' });
    expect(await Answer.count({ where: { drawId: draw.id } })).toBe(0);
    await handIn({ a: 'S_x', b: ' ' });
    expect(await Answer.count({ where: { drawId: draw.id } })).toBe(1);
  });
});

describe('an answer that cannot be read', () => {
  it('is refused with its message, and nothing of the hand-in is stored', async () => {
    await freshRoom();
    const result = await handIn({ a: 'i hbar S_z', b: '[1, 2' });
    expect(result.kind).toBe('ask');
    if (result.kind !== 'ask') return;
    expect(result.unreadable.map(({ partKey }) => partKey)).toEqual(['b']);
    expect(result.unreadable[0]?.message).toMatch(/\w+.*\./);
    expect(await Submission.count({ where: { drawId: draw.id } })).toBe(0);
  });

  it('is taken when the student confirms, and costs no attempt, before and after its verdict', async () => {
    await freshRoom({ attemptsAllowed: 1 });
    const result = await handIn({ b: '{1, 2' }, { confirmUnreadable: true });
    expect(result).toMatchObject({ kind: 'handed-in', parts: [{ partKey: 'b', attempt: 1, attemptsLeft: 1 }] });
    const answer = await Answer.findOne({ where: { drawId: draw.id }, rejectOnEmpty: true });
    await buildAnswerCheck(answer, { verdict: 'unreadable' });
    expect(await handIn({ b: '±ω' })).toMatchObject({ kind: 'handed-in', parts: [{ attempt: 2, attemptsLeft: 0 }] });
  });

  it('may not be handed in without end', async () => {
    const { draws } = await freshRoom();
    draw = draws[0]!;
    for (let count = 0; count < MOST_HAND_INS; count += 1) {
      await buildAnswerCheck(await buildAnswer(draw, { partKey: 'b', text: '((' }), { verdict: 'unreadable' });
    }
    await expect(handIn({ b: '(((' }, { confirmUnreadable: true })).rejects.toMatchObject({ code: 'wrong-state' });
  });
});

describe('attempts', () => {
  it('end where the set says so', async () => {
    await freshRoom({ attemptsAllowed: 2 });
    await handIn({ a: 'S_x' });
    await handIn({ a: 'S_y' });
    await expect(handIn({ a: 'S_z' })).rejects.toMatchObject({ code: 'wrong-state', message: /part a/ });
    const standing = await Answer.findAll({ where: { drawId: draw.id, supersededAt: null } });
    expect(standing.map(({ text }) => text)).toEqual(['S_y']);
  });

  it('are used up once by requests that come together', async () => {
    await freshRoom({ attemptsAllowed: 1 });
    const results = await Promise.allSettled([handIn({ a: 'S_x' }), handIn({ a: 'S_y' }), handIn({ a: 'S_z' })]);
    expect(results.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected', 'rejected']);
    expect(await Answer.count({ where: { drawId: draw.id } })).toBe(1);
  });

  it('supersede the earlier one and withdraw what waits because of it', async () => {
    const { item, problemSet } = await freshRoom();
    await handIn({ a: 'S_x' });
    const first = await Answer.findOne({ where: { drawId: draw.id }, rejectOnEmpty: true });
    const waiting = await buildQueueItem(first);
    expect(waiting.itemId).toBe(item.id);
    expect(waiting.problemSetId).toBe(problemSet.id);
    await handIn({ a: 'S_y' });
    expect((await QueueItem.findByPk(waiting.id))?.state).toBe('withdrawn');
    await first.reload();
    expect(first.supersededAt).not.toBeNull();
    expect(first.text).toBe('S_x');
  });
});

describe('who and when', () => {
  it('is the student whose draw it is, and nobody learns of another’s', async () => {
    const { students, tas, instructor } = await freshRoom();
    for (const other of [students[1]!.user, tas[0]!.user, instructor.user]) {
      student = other;
      await expect(handIn({ a: 'S_x' })).rejects.toMatchObject({ code: 'not-found' });
    }
    await expect(
      actingAs(other(), (context) =>
        handInAnswers(context, {
          drawId: randomUUID(),
          answers: [{ partKey: 'a', text: 'S_x' }],
          clientKey: randomUUID(),
          confirmUnreadable: false,
        }),
      ),
    ).rejects.toMatchObject({ code: 'not-found' });
  });

  it('is no longer someone who has left the course', async () => {
    const { students } = await freshRoom();
    await students[0]!.membership.update({ leftAt: new Date() });
    await expect(handIn({ a: 'S_x' })).rejects.toMatchObject({ code: 'forbidden' });
  });

  it('ends with the closing time, to the moment, and begins with the opening time', async () => {
    const closesAt = new Date(Date.now() + day);
    const { problemSet } = await freshRoom({ closesAt });
    await expect(handIn({ a: 'S_x' }, {}, closesAt)).rejects.toMatchObject({ code: 'wrong-state' });
    await handIn({ a: 'S_x' }, {}, new Date(closesAt.getTime() - 1));
    await problemSet.update({ opensAt: new Date(Date.now() + day / 2) });
    await expect(handIn({ a: 'S_y' })).rejects.toMatchObject({ code: 'wrong-state' });
  });

  it('lasts longer by an extension, one’s own or one’s section’s, also when the set is closed', async () => {
    const { problemSet, sections, instructor, students, draws } = await freshRoom({
      state: 'closed',
      closesAt: new Date(Date.now() - day / 2),
    });
    await expect(handIn({ a: 'S_x' })).rejects.toMatchObject({ code: 'wrong-state' });
    const extension = {
      problemSetId: problemSet.id,
      closesAt: new Date(Date.now() + day),
      grantedBy: instructor.user.id,
    };
    await Extension.create({ ...extension, userId: student.id });
    await handIn({ a: 'S_x' });
    student = students[1]!.user;
    draw = draws[1]!;
    await expect(handIn({ a: 'S_x' })).rejects.toMatchObject({ code: 'wrong-state' });
    await Extension.create({ ...extension, sectionId: sections[0]!.id });
    await handIn({ a: 'S_x' });
    await problemSet.update({ state: 'released' });
    await expect(handIn({ a: 'S_y' })).rejects.toMatchObject({ code: 'wrong-state' });
  });
});

describe('drafts beside it', () => {
  it('become what was handed in, so that an older tab does not bring back an older text', async () => {
    await freshRoom();
    const save = (text: string, baseRevision: number) =>
      actingAs(student, (context) => saveAnswer(context, { drawId: draw.id, partKey: 'a', text, baseRevision }));
    await save('S_', 0);
    const result = await handIn({ a: 'S_x' });
    expect(result).toMatchObject({ parts: [{ partKey: 'a', revision: 2 }] });
    expect(await save('S_ older tab', 1)).toMatchObject({ kind: 'changed', text: 'S_x', revision: 2 });
    expect(await save('S_x + S_y', 2)).toMatchObject({ kind: 'saved', revision: 3 });
  });
});

function other(): User {
  return room.students[0]!.user;
}
