import { afterAll, describe, expect, it } from 'vitest';
import { checkAnswers } from '@/lib/jobs/check-answers';
import { checkInThread, closeCheckerPool } from '@/lib/jobs/checker-pool';
import { type JobRun } from '@/lib/jobs/job-handler';
import { type CheckRequest } from '@/lib/checker/contract';
import { CHECKER_VERSION } from '@/lib/checker/index';
import { Answer } from '@/models/answer';
import { AnswerCheck } from '@/models/answer-check';
import { CreditEntry } from '@/models/credit-entry';
import { QueueItem } from '@/models/queue-item';
import { buildAnswer, buildDraw } from '@/tests/factories/answers';
import { buildClassroom } from '@/tests/factories/classroom';
import { buildItem } from '@/tests/factories/problem-sets';
import { templateContent } from '@/tests/factories/template-content';
import { buildTemplateVersion } from '@/tests/factories/templates';

const run: JobRun = { jobId: '1', attempt: 1, isLastAttempt: false, signal: new AbortController().signal };

afterAll(closeCheckerPool);

async function checksOf(answerIds: readonly string[]) {
  const answers = await Answer.findAll({ where: { id: [...answerIds] } });
  const checks = await AnswerCheck.findAll({ where: { answerId: [...answerIds] } });
  const credits = await CreditEntry.findAll({ where: { answerId: [...answerIds] } });
  const items = await QueueItem.findAll({ where: { answerId: [...answerIds] } });
  return { answers, checks, credits, items };
}

describe('checking answers', () => {
  it('stores a verdict, and lets it take effect: full credit, or a person with the reason', async () => {
    const { draws } = await buildClassroom({ students: 3 });
    const right = await buildAnswer(draws[0]!, { partKey: 'b', text: '±3ħω/2' });
    const wrong = await buildAnswer(draws[1]!, { partKey: 'b', text: '±3ħω' });
    const garbled = await buildAnswer(draws[2]!, { partKey: 'b', text: '±3ħω/' });
    const ids = [right.id, wrong.id, garbled.id];
    await checkAnswers({ answerIds: ids }, run);
    const { answers, checks, credits, items } = await checksOf(ids);
    const verdictOf = (id: string) => checks.find(({ answerId }) => answerId === id)?.verdict;
    expect(ids.map(verdictOf)).toEqual(['agrees', 'differs', 'unreadable']);
    expect(answers.every(({ checkState, currentCheckId }) => checkState === 'checked' && currentCheckId)).toBe(true);
    expect(credits.map(({ answerId, credit, outOf }) => [answerId, credit, outOf])).toEqual([[right.id, 3000, 3000]]);
    expect(items.map(({ answerId }) => answerId).sort()).toEqual([wrong.id, garbled.id].sort());
    const check = checks.find(({ answerId }) => answerId === right.id);
    expect(check?.checkerVersion).toBe(CHECKER_VERSION);
    expect(check?.readingLatex).toContain('\\frac');
    expect(check?.readingPlain).not.toBe('');
    expect(check?.referenceLatex).not.toBe('');
    expect(check?.milliseconds).toBeGreaterThanOrEqual(0);
  });

  it('gives a slip the credit its author gave', async () => {
    const { draws } = await buildClassroom({ students: 1 });
    // [S_z, S_x + S_y] = iħ(S_y − S_x); the author gives half for a sign.
    const slipped = await buildAnswer(draws[0]!, { partKey: 'a', text: 'i hbar (S_x - S_y)' });
    await checkAnswers({ answerIds: [slipped.id] }, run);
    const { checks, credits, items } = await checksOf([slipped.id]);
    expect(checks[0]).toMatchObject({ verdict: 'differs', slip: 'sign' });
    expect(credits.map(({ credit, outOf, source, reason }) => [credit, outOf, source, reason])).toEqual([
      [1500, 3000, 'rule', 'sign'],
    ]);
    expect(items).toHaveLength(0);
  });

  it('gives one verdict and one effect however often it runs, also twice at the same time', async () => {
    const { draws } = await buildClassroom({ students: 2 });
    const right = await buildAnswer(draws[0]!, { partKey: 'b', text: '±3ħω/2' });
    const wrong = await buildAnswer(draws[1]!, { partKey: 'b', text: '±ω' });
    const answerIds = [right.id, wrong.id];
    await Promise.all([checkAnswers({ answerIds }, run), checkAnswers({ answerIds }, run)]);
    await checkAnswers({ answerIds }, run);
    const { checks, credits, items } = await checksOf(answerIds);
    expect(checks).toHaveLength(2);
    expect(credits).toHaveLength(1);
    expect(items).toHaveLength(1);
  });

  it('goes on where it was cut short, without a second verdict', async () => {
    const { draws } = await buildClassroom({ students: 40 });
    const answerIds: string[] = [];
    for (const draw of draws) answerIds.push((await buildAnswer(draw, { partKey: 'b', text: '±3ħω/2' })).id);
    const afterFirstChunk = { throwIfAborted: abortAtCall(2) } as unknown as AbortSignal;
    await expect(checkAnswers({ answerIds }, { ...run, signal: afterFirstChunk })).rejects.toThrow('asked to end');
    const before = await checksOf(answerIds);
    expect(before.checks.length).toBeGreaterThan(0);
    expect(before.checks.length).toBeLessThan(40);
    await checkAnswers({ answerIds }, run);
    const after = await checksOf(answerIds);
    expect(after.checks).toHaveLength(40);
    expect(new Set(after.checks.map(({ answerId }) => answerId)).size).toBe(40);
    expect(after.credits).toHaveLength(40);
  });

  it('keeps the verdict of an attempt that no longer stands for the record only', async () => {
    const { draws } = await buildClassroom({ students: 1 });
    const first = await buildAnswer(draws[0]!, { partKey: 'b', text: '±ω' });
    const second = await buildAnswer(draws[0]!, { partKey: 'b', text: '±3ħω/2' });
    await checkAnswers({ answerIds: [first.id, second.id] }, run);
    const { checks, credits, items } = await checksOf([first.id, second.id]);
    expect(checks).toHaveLength(2);
    expect(credits.map(({ answerId }) => answerId)).toEqual([second.id]);
    expect(items).toHaveLength(0);
  });

  it('leaves an answer to a person where the reference cannot be used', async () => {
    const content = templateContent();
    const broken = { ...content, parts: content.parts.map((part) => ({ ...part, reference: 'commutator(A' })) };
    const { problemSet, students } = await buildClassroom({ students: 1 });
    const item = await buildItem(problemSet, { templateVersion: await buildTemplateVersion({ content: broken }) });
    const answer = await buildAnswer(await buildDraw(item, students[0]!.user), { partKey: 'a', text: 'S_z' });
    await checkAnswers({ answerIds: [answer.id] }, run);
    const { checks, credits, items } = await checksOf([answer.id]);
    expect(checks.map(({ verdict }) => verdict)).toEqual(['undecided']);
    expect(credits).toHaveLength(0);
    expect(items.map(({ reasons }) => reasons)).toEqual([['undecided']]);
  });

  it('passes over answers that are gone', async () => {
    await checkAnswers({ answerIds: ['00000000-0000-4000-8000-000000000000'] }, run);
  });
});

describe('the checker threads', () => {
  const request = (id: string): CheckRequest => ({ id, kind: 'scalar', reference: '1', answer: '1' });

  it('answer in order', async () => {
    const results = await checkInThread(['a', 'b', 'c'].map(request));
    expect(results.map(({ requestId }) => requestId)).toEqual(['a', 'b', 'c']);
  });

  it('give up only the request at fault', async () => {
    // A function cannot be sent to a thread, so this request fails however it is tried.
    const impossible = { ...request('b'), options: { choices: [() => 'x'] } } as unknown as CheckRequest;
    const results = await checkInThread([request('a'), impossible, request('c')]);
    expect(results.map((result) => ('failed' in result ? `failed ${result.requestId}` : result.requestId))).toEqual([
      'a',
      'failed b',
      'c',
    ]);
  });
});

/** Stands for a worker that is asked to end: throws at the n-th look. */
function abortAtCall(n: number): () => void {
  let calls = 0;
  return () => {
    calls += 1;
    if (calls >= n) throw new Error('asked to end');
  };
}
