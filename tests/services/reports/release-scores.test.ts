import { describe, expect, it } from 'vitest';
import { Delivery } from '@/models/delivery';
import { Extension } from '@/models/extension';
import { ScoreReport } from '@/models/score-report';
import { SetRelease } from '@/models/set-release';
import { type User } from '@/models/user';
import { changesSince, type ScoreReportContent } from '@/lib/presenters/score-report';
import { releaseState } from '@/lib/queries/release-state';
import { recordCheck } from '@/lib/services/record-check';
import { releaseScores, type ReleaseResult } from '@/lib/services/release-scores';
import { ruleOnAnswer } from '@/lib/services/rule-on-answer';
import { takeQueueItem } from '@/lib/services/take-queue-item';
import { buildAnswer, buildAnswerCheck, buildCreditEntry } from '../../factories/answers';
import { actingAs, actingAsSystem } from '../../factories/context';
import { buildMarkedSet, studentAt, type MarkedSet } from '../../factories/marked-set';
import { buildQueueItem, buildRuling } from '../../factories/marking';
import { buildMember } from '../../factories/people';
import { refusalOf } from '../../factories/refusal';

const now = new Date('2026-12-01T10:00:00Z');
const day = 86_400_000;

function release(
  marked: MarkedSet,
  input: { userIds?: string[]; reportWaitingParts?: boolean } = {},
  { by = marked.headTa.user, at = now }: { by?: User; at?: Date } = {},
): Promise<ReleaseResult> {
  return actingAs(
    by,
    (context) => releaseScores(context, { problemSetId: marked.problemSet.id, reportWaitingParts: false, ...input }),
    at,
  );
}

const reportsOf = (marked: MarkedSet, user: User) =>
  ScoreReport.findAll({
    where: { problemSetId: marked.problemSet.id, userId: user.id },
    order: [['revision', 'ASC']],
  });

async function lastContent(marked: MarkedSet, user: User): Promise<ScoreReportContent> {
  const report = (await reportsOf(marked, user)).at(-1);
  if (!report) throw new Error('There is no report.');
  return report.content as ScoreReportContent;
}

/** Puts the part b of a student's draw before a person. */
async function waitingPart(marked: MarkedSet, index = 0) {
  const draw = marked.draws[index];
  if (!draw) throw new RangeError('There is no such draw.');
  const answer = await buildAnswer(draw, { partKey: 'b', text: '{omega}' });
  await buildAnswerCheck(answer, { verdict: 'differs', slip: 'one-eigenvalue', readingPlain: '{omega}' });
  return { answer, item: await buildQueueItem(answer) };
}

describe('releasing scores', () => {
  it('releases every student once, with one report and one delivery each, and then the set', async () => {
    const marked = await buildMarkedSet({ students: 3 });
    expect(await release(marked)).toEqual({ released: 3, heldBack: 0, setReleased: true });
    expect((await marked.problemSet.reload()).state).toBe('released');
    expect(await release(marked)).toEqual({ released: 0, heldBack: 0, setReleased: true });
    const reports = await ScoreReport.findAll({ where: { problemSetId: marked.problemSet.id } });
    expect(reports.map(({ revision }) => revision)).toEqual([1, 1, 1]);
    expect(await Delivery.count({ where: { scoreReportId: reports.map(({ id }) => id) } })).toBe(3);
  });

  it('sends nothing twice when two release at the same instant', async () => {
    const marked = await buildMarkedSet({ students: 3 });
    const both = await Promise.all([release(marked), release(marked, {}, { by: marked.instructor.user })]);
    expect(both.map(({ released }) => released).sort()).toEqual([0, 3]);
    expect(await ScoreReport.count({ where: { problemSetId: marked.problemSet.id } })).toBe(3);
  });

  it('is refused while a part waits, naming how many, and changes nothing', async () => {
    const marked = await buildMarkedSet();
    await waitingPart(marked);
    const refused = await refusalOf(release(marked), 'wrong-state');
    expect(refused.message).toContain('1 part waits');
    expect(await SetRelease.count({ where: { problemSetId: marked.problemSet.id } })).toBe(0);
    expect((await marked.problemSet.reload()).state).toBe('closed');
  });

  it('is refused while the checker has not looked at an answer', async () => {
    const marked = await buildMarkedSet();
    const [draw] = marked.draws;
    if (draw) await buildAnswer(draw, { partKey: 'c', text: '0' });
    await refusalOf(release(marked), 'wrong-state');
  });

  it('releases with waiting parts when each is reported as still being marked, and corrects the report later', async () => {
    const marked = await buildMarkedSet();
    const student = studentAt(marked);
    const { item } = await waitingPart(marked);
    expect((await release(marked, { reportWaitingParts: true })).released).toBe(2);
    const before = await lastContent(marked, student);
    expect(before.items[0]?.parts.map(({ state, credit }) => [state, credit])).toEqual([
      ['marked', 3000],
      ['waiting', 0],
      ['no-answer', 0],
    ]);
    expect(before.items[0]?.parts[1]).toMatchObject({ verdict: null, slip: null, comment: '' });
    expect(before.total).toEqual({ credit: 3000, outOf: 9000, partsWaiting: 1 });

    await actingAs(marked.headTa.user, (context) => takeQueueItem(context, { queueItemId: item.id }), now);
    await actingAs(
      marked.headTa.user,
      (context) =>
        ruleOnAnswer(context, {
          queueItemId: item.id,
          credit: 1500,
          comment: 'One of **two** energies.',
          millisecondsSpent: null,
        }),
      now,
    );
    const reports = await reportsOf(marked, student);
    expect(reports.map(({ revision }) => revision)).toEqual([1, 2]);
    const after = await lastContent(marked, student);
    expect(after.changes).toEqual([{ position: 1, key: 'b', before: null, after: 1500 }]);
    expect(after.items[0]?.parts[1]).toMatchObject({
      state: 'marked',
      verdict: 'differs',
      credit: 1500,
      outOf: 3000,
      comment: 'One of **two** energies.',
      markedBy: 'person',
    });
    expect(await reportsOf(marked, studentAt(marked, 1))).toHaveLength(1);
  });

  it('corrects the report when the checker, not a person, decides a part that was still being marked', async () => {
    const marked = await buildMarkedSet();
    const student = studentAt(marked);
    const [draw] = marked.draws;
    if (!draw) throw new RangeError('There is a draw.');
    const answer = await buildAnswer(draw, { partKey: 'c', text: '0' });
    await release(marked, { reportWaitingParts: true });
    await actingAsSystem((context) =>
      recordCheck(context, {
        answerId: answer.id,
        checkerVersion: 'test-2',
        readingPlain: '0',
        referenceLatex: '0',
        response: {
          id: answer.id,
          verdict: 'agrees',
          slip: null,
          slips: [],
          kinKey: null,
          reading: '0',
          message: 'Equal.',
          evidence: { test: 'normal form', form: 'evaluated' },
          ms: 1,
        },
      }),
    );
    expect((await lastContent(marked, student)).changes).toEqual([
      { position: 1, key: 'c', before: null, after: 3000 },
    ]);
  });

  it('holds back who has a running extension, by student or by section, and releases them when it has ended', async () => {
    const marked = await buildMarkedSet({ students: 4, sections: 2 });
    const until = new Date(now.getTime() + day);
    const given = { problemSetId: marked.problemSet.id, closesAt: until, grantedBy: marked.instructor.user.id };
    await Extension.create({ ...given, userId: studentAt(marked, 0).id, sectionId: null });
    await Extension.create({ ...given, userId: null, sectionId: marked.sections[1]?.id ?? null });
    expect(await release(marked)).toEqual({ released: 1, heldBack: 3, setReleased: false });
    expect((await marked.problemSet.reload()).state).toBe('closed');
    const state = await releaseState(marked.problemSet.id, now);
    expect(state.filter(({ releasedAt }) => releasedAt !== null).map(({ userId }) => userId)).toEqual([
      studentAt(marked, 2).id,
    ]);
    expect(await release(marked, {}, { at: new Date(until.getTime() + 1) })).toEqual({
      released: 3,
      heldBack: 0,
      setReleased: true,
    });
  });

  it('does not let a part of somebody held back stop the others', async () => {
    const marked = await buildMarkedSet();
    await waitingPart(marked, 0);
    await Extension.create({
      problemSetId: marked.problemSet.id,
      userId: studentAt(marked, 0).id,
      sectionId: null,
      closesAt: new Date(now.getTime() + day),
      grantedBy: marked.instructor.user.id,
    });
    expect(await release(marked)).toEqual({ released: 1, heldBack: 1, setReleased: false });
  });

  it('releases only those that are named', async () => {
    const marked = await buildMarkedSet({ students: 3 });
    expect(await release(marked, { userIds: [studentAt(marked, 1).id] })).toEqual({
      released: 1,
      heldBack: 0,
      setReleased: false,
    });
    expect(await reportsOf(marked, studentAt(marked, 0))).toHaveLength(0);
  });

  it('is for the head TA and the instructor, of a set that is closed', async () => {
    const marked = await buildMarkedSet();
    const ta = marked.tas[0]?.user ?? studentAt(marked);
    await refusalOf(release(marked, {}, { by: ta }), 'forbidden');
    await refusalOf(release(marked, {}, { by: studentAt(marked) }), 'forbidden');
    const elsewhere = await buildMember((await buildMarkedSet()).course, 'instructor');
    await refusalOf(release(marked, {}, { by: elsewhere.user }), 'not-found');
    const open = await buildMarkedSet({ problemSet: { state: 'open' } });
    await refusalOf(release(open), 'wrong-state');
  });
});

describe('the content of a report', () => {
  it('tells part by part what was asked with the draw, written, read, found and credited', async () => {
    const marked = await buildMarkedSet();
    const [draw] = marked.draws;
    if (!draw) throw new RangeError('There is a draw.');
    const answer = await buildAnswer(draw, { partKey: 'b', text: '{omega}' });
    await buildAnswerCheck(answer, { verdict: 'differs', slip: 'one-eigenvalue', readingLatex: '\\omega' });
    const ruling = await buildRuling(await buildQueueItem(answer), marked.headTa.user, { comment: 'And the other?' });
    await buildCreditEntry(answer, { credit: 1500, source: 'ruling', rulingId: ruling.id });
    await release(marked);
    const content = await lastContent(marked, studentAt(marked));
    expect(content).toMatchObject({
      course: { code: marked.course.code, timeZone: 'Europe/London' },
      set: { number: marked.problemSet.number, title: marked.problemSet.title },
      student: studentAt(marked).name,
      total: { credit: 4500, outOf: 9000, partsWaiting: 0 },
      appeals: { until: marked.problemSet.appealsUntil?.toISOString(), mayLower: false },
      changes: [],
    });
    const [item] = content.items;
    expect(item?.prompt).toContain('n = $3$');
    expect(
      item?.parts.map(({ key, state, verdict, credit, markedBy }) => [key, state, verdict, credit, markedBy]),
    ).toEqual([
      ['a', 'marked', 'agrees', 3000, 'checker'],
      ['b', 'marked', 'differs', 1500, 'person'],
      ['c', 'no-answer', null, 0, null],
    ]);
    expect(item?.parts[0]).toMatchObject({ answer: 'i hbar S_z', readingLatex: '\\mathrm{i}\\hbar S_z', slip: null });
    expect(item?.parts[1]?.slip).toBe('only one of the two values is given');
    expect(item?.parts[1]?.comment).toBe('And the other?');
  });

  it('shows no total where the set’s policy says so', async () => {
    const marked = await buildMarkedSet({ problemSet: { policy: { reportShowsTotal: false } } });
    await release(marked);
    expect((await lastContent(marked, studentAt(marked))).total).toBeNull();
  });

  it('says of a question that was never opened what it was worth, and nothing of its draw', async () => {
    const marked = await buildMarkedSet({ students: 1 });
    const late = await buildMember(marked.course, 'student');
    await release(marked);
    const [item] = (await lastContent(marked, late.user)).items;
    expect(item).toMatchObject({ prompt: '', credit: 0, outOf: 9000 });
    expect(item?.parts.every(({ state }) => state === 'no-answer')).toBe(true);
  });

  it('finds changes by part, also of a part that was not in the report before', () => {
    const part = (key: string, credit: number, state: 'marked' | 'waiting' = 'marked') => ({
      key,
      prompt: '',
      state,
      answer: 'x',
      readingLatex: '',
      readingPlain: '',
      verdict: null,
      slip: null,
      credit,
      outOf: 3000,
      comment: '',
      markedBy: null,
      followThrough: false,
      appeal: null,
      answerId: null,
    });
    const item = (parts: ReturnType<typeof part>[]) => [
      { position: 1, title: '', prompt: 'x', credit: 0, outOf: 0, parts },
    ];
    expect(
      changesSince(
        item([part('a', 1000), part('b', 0, 'waiting')]),
        item([part('a', 1000), part('b', 0), part('c', 1)]),
      ),
    ).toEqual([
      { position: 1, key: 'b', before: null, after: 0 },
      { position: 1, key: 'c', before: null, after: 1 },
    ]);
  });
});
