import { describe, expect, it } from 'vitest';
import { Appeal } from '@/models/appeal';
import { QueueItem } from '@/models/queue-item';
import { ScoreReport } from '@/models/score-report';
import { type User } from '@/models/user';
import { type ScoreReportContent } from '@/lib/presenters/score-report';
import { answerAppeal } from '@/lib/services/answer-appeal';
import { openAppeal } from '@/lib/services/open-appeal';
import { releaseScores } from '@/lib/services/release-scores';
import { takeQueueItem } from '@/lib/services/take-queue-item';
import { buildAnswer, buildAnswerCheck, buildCreditEntry } from '../../factories/answers';
import { actingAs } from '../../factories/context';
import { answerAt, buildMarkedSet, studentAt, type MarkedSet } from '../../factories/marked-set';
import { buildQueueItem, buildRuling } from '../../factories/marking';
import { buildCourse, buildMember } from '../../factories/people';
import { refusalOf } from '../../factories/refusal';

const now = new Date();
const day = 86_400_000;

const appeal = (by: User, answerId: string, at = now) =>
  actingAs(by, (context) => openAppeal(context, { answerId, reason: 'It is the same operator.' }), at);

async function released(options: Parameters<typeof buildMarkedSet>[0] = {}): Promise<MarkedSet> {
  const marked = await buildMarkedSet({ students: 2, ...options });
  await release(marked);
  return marked;
}

function release(marked: MarkedSet) {
  return actingAs(
    marked.instructor.user,
    (context) => releaseScores(context, { problemSetId: marked.problemSet.id, reportWaitingParts: true }),
    now,
  );
}

/** An appeal of part a, which a TA has marked with 1.5 of 3 marks. */
async function appealed(options: Parameters<typeof buildMarkedSet>[0] = {}) {
  const marked = await buildMarkedSet({ students: 1, ...options });
  const first = marked.tas[0]?.user ?? marked.instructor.user;
  const answer = answerAt(marked);
  const ruling = await buildRuling(await buildQueueItem(answer), first);
  await buildCreditEntry(answer, { credit: 1500, source: 'ruling', rulingId: ruling.id });
  await release(marked);
  await appeal(studentAt(marked), answer.id);
  const queued = await QueueItem.findOne({ where: { answerId: answer.id, kind: 'appeal' }, rejectOnEmpty: true });
  return { ...marked, first, answer, queued };
}

const take = (by: User, item: QueueItem) =>
  actingAs(by, (context) => takeQueueItem(context, { queueItemId: item.id }), now);

const reply = (by: User, item: QueueItem, credit: number) =>
  actingAs(
    by,
    (context) =>
      answerAppeal(context, {
        queueItemId: item.id,
        credit,
        reply: 'You are right about the sign.',
        millisecondsSpent: null,
      }),
    now,
  );

async function lastReport(marked: MarkedSet) {
  const report = await ScoreReport.findOne({
    where: { problemSetId: marked.problemSet.id, userId: studentAt(marked).id },
    order: [['revision', 'DESC']],
    rejectOnEmpty: true,
  });
  return { revision: report.revision, reason: report.reason, content: report.content as ScoreReportContent };
}

describe('making an appeal', () => {
  it('is refused before release', async () => {
    const marked = await buildMarkedSet();
    const refused = await refusalOf(appeal(studentAt(marked), answerAt(marked).id), 'wrong-state');
    expect(refused.message).toContain('not out yet');
  });

  it('makes an item of the queue, once per part', async () => {
    const marked = await released();
    const answer = answerAt(marked);
    await appeal(studentAt(marked), answer.id);
    const items = await QueueItem.findAll({ where: { answerId: answer.id } });
    expect(items.map(({ kind, state, reasons }) => [kind, state, reasons])).toEqual([
      ['appeal', 'waiting', ['appeal']],
    ]);
    await refusalOf(appeal(studentAt(marked), answer.id), 'conflict');
    expect(await Appeal.count({ where: { answerId: answer.id } })).toBe(1);
  });

  it('is one of two when two are sent at the same instant', async () => {
    const marked = await released();
    const answer = answerAt(marked);
    const sent = await Promise.allSettled([appeal(studentAt(marked), answer.id), appeal(studentAt(marked), answer.id)]);
    expect(sent.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
  });

  it('is taken until the appeal date, not after', async () => {
    const appealsUntil = new Date(now.getTime() + 10 * day);
    const marked = await released({ problemSet: { appealsUntil } });
    await refusalOf(appeal(studentAt(marked), answerAt(marked).id, appealsUntil), 'wrong-state');
    await appeal(studentAt(marked), answerAt(marked).id, new Date(appealsUntil.getTime() - 1));
  });

  it('is of one’s own answer only', async () => {
    const marked = await released();
    await refusalOf(appeal(studentAt(marked, 1), answerAt(marked, 0).id), 'not-found');
    await refusalOf(appeal(marked.instructor.user, answerAt(marked, 0).id), 'not-found');
    const stranger = await buildMember(await buildCourse(), 'student');
    await refusalOf(appeal(stranger.user, answerAt(marked, 0).id), 'not-found');
  });

  it('is refused in words for a part that is still being marked, by the checker or by a person', async () => {
    const marked = await buildMarkedSet({ students: 1 });
    const [draw] = marked.draws;
    if (!draw) throw new RangeError('There is a draw.');
    const unchecked = await buildAnswer(draw, { partKey: 'b', text: '{omega}' });
    const again = await buildAnswer(draw, { partKey: 'c', text: '0' });
    await buildAnswerCheck(again);
    await buildCreditEntry(again);
    // It has a credit, and waits again: a ruling on it was taken back.
    await buildQueueItem(again);
    await release(marked);
    for (const { id } of [unchecked, again]) {
      const refused = await refusalOf(appeal(studentAt(marked), id), 'wrong-state');
      expect(refused.message).toContain('still being marked');
    }
  });
});

describe('answering an appeal', () => {
  it('is for another than the first marker, and sends the report again with what changed', async () => {
    const marked = await appealed();
    const refused = await refusalOf(take(marked.first, marked.queued), 'forbidden');
    expect(refused.message).toContain('You marked this part first');
    const other = marked.tas[1]?.user ?? marked.headTa.user;
    await take(other, marked.queued);
    expect(await reply(other, marked.queued, 3000)).toEqual({ outcome: 'upheld' });
    const { revision, reason, content } = await lastReport(marked);
    expect([revision, reason]).toEqual([2, 'Your appeal has been answered.']);
    expect(content.changes).toEqual([{ position: 1, key: 'a', before: 1500, after: 3000 }]);
    expect(content.items[0]?.parts[0]).toMatchObject({
      credit: 3000,
      comment: 'You are right about the sign.',
      markedBy: 'person',
      appeal: { outcome: 'upheld', sameGrader: false },
    });
    expect(await Appeal.findOne({ where: { answerId: marked.answer.id } })).toMatchObject({
      state: 'answered',
      outcome: 'upheld',
      answeredBy: other.id,
      sameGraderNoted: false,
    });
    await refusalOf(appeal(studentAt(marked), marked.answer.id), 'conflict');
  });

  it('sends the report also when the credit is kept, which it says', async () => {
    const marked = await appealed();
    await take(marked.headTa.user, marked.queued);
    expect(await reply(marked.headTa.user, marked.queued, 1500)).toEqual({ outcome: 'kept' });
    const { revision, content } = await lastReport(marked);
    expect(revision).toBe(2);
    expect(content.changes).toEqual([]);
    expect(content.items[0]?.parts[0]?.appeal).toEqual({ outcome: 'kept', sameGrader: false });
  });

  it('lowers a credit only where the set’s policy says so', async () => {
    const kind = await appealed();
    await take(kind.headTa.user, kind.queued);
    const refused = await refusalOf(reply(kind.headTa.user, kind.queued, 1000), 'invalid');
    expect(Object.keys(refused.fields)).toEqual(['credit']);
    const strict = await appealed({ problemSet: { policy: { appealMayLower: true } } });
    await take(strict.headTa.user, strict.queued);
    expect(await reply(strict.headTa.user, strict.queued, 1000)).toEqual({ outcome: 'lowered' });
  });

  it('is the first marker’s where the course has no other grader, and the report says so', async () => {
    const marked = await appealed({ tas: 0 });
    await marked.headTa.membership.update({ leftAt: now });
    await take(marked.instructor.user, marked.queued);
    await reply(marked.instructor.user, marked.queued, 3000);
    const { content } = await lastReport(marked);
    expect(content.items[0]?.parts[0]?.appeal).toEqual({ outcome: 'upheld', sameGrader: true });
    expect((await Appeal.findOne({ where: { answerId: marked.answer.id } }))?.sameGraderNoted).toBe(true);
  });

  it('needs a hold of the item', async () => {
    const marked = await appealed();
    await refusalOf(reply(marked.headTa.user, marked.queued, 3000), 'lease-lost');
  });
});
