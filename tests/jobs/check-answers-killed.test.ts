import { afterEach, describe, expect, it } from 'vitest';
import { inTransaction } from '@/lib/db/transaction';
import { enqueue } from '@/lib/queue/enqueue';
import { Answer } from '@/models/answer';
import { AnswerCheck } from '@/models/answer-check';
import { CreditEntry } from '@/models/credit-entry';
import { buildAnswer } from '@/tests/factories/answers';
import { buildClassroom } from '@/tests/factories/classroom';
import { until } from '../queue/worker-process';
import { kill, killAll, startRealWorker } from './real-worker';

afterEach(killAll);

describe('a worker killed in the midst of checking', () => {
  it('leaves every answer with exactly one verdict once another worker has taken over', async () => {
    const { draws } = await buildClassroom({ students: 100 });
    const answerIds: string[] = [];
    for (const draw of draws) {
      for (const [partKey, text] of [
        ['a', 'i hbar (S_y - S_x)'],
        ['b', '±3ħω/2'],
        ['c', '3 hbar omega/2'],
      ] as const) {
        answerIds.push((await buildAnswer(draw, { partKey, text })).id);
      }
    }
    await inTransaction((transaction) => enqueue('check-answers', { answerIds }, { transaction }));
    const checked = () => AnswerCheck.count();

    const doomed = await startRealWorker();
    await until(async () => (await checked()) > 0, 'the first verdicts are stored', 30_000);
    await kill(doomed);
    const whenKilled = await checked();
    expect(whenKilled).toBeGreaterThan(0);
    expect(whenKilled).toBeLessThan(answerIds.length);

    await startRealWorker();
    await until(async () => (await checked()) === answerIds.length, 'every answer has its verdict', 40_000);
    expect(await AnswerCheck.count({ distinct: true, col: 'answerId' })).toBe(answerIds.length);
    expect(await Answer.count({ where: { checkState: 'checked' } })).toBe(answerIds.length);
    expect(await AnswerCheck.count({ where: { verdict: 'agrees' } })).toBe(answerIds.length);
    expect(await CreditEntry.count({ distinct: true, col: 'answerId' })).toBe(answerIds.length);
    expect(await CreditEntry.count()).toBe(answerIds.length);
  }, 120_000);
});
