import type { CheckResponse } from '@/lib/checker/contract';
import { CHECKER_VERSION } from '@/lib/checker/index';
import { inTransaction } from '@/lib/db/transaction';
import { log } from '@/lib/log';
import { answersToCheck, type AnswerToCheck } from '@/lib/queries/answers-to-check';
import type { ServiceContext } from '@/lib/services/context';
import { countIntakeChecks } from '@/lib/services/count-intake-checks';
import { recordCheck, type CheckRecord } from '@/lib/services/record-check';
import { referenceOf, type ReferenceResult } from '@/lib/templates/reference-of';
import { checkInThread, type ThreadFailure } from './checker-pool';
import type { ThreadResult } from './checker-worker';
import type { JobHandler } from './job-handler';

/** Verdicts stored in one transaction: few enough that a killed worker repeats little, enough to be quick. */
const CHUNK = 25;

/**
 * Checks answers and stores one verdict for each. Answers that have a verdict already are passed over, so the job may
 * be run again after it was cut short anywhere.
 */
export const checkAnswers: JobHandler<'check-answers'> = async ({ answerIds }, run) => {
  const waiting = await answersToCheck(answerIds);
  for (let start = 0; start < waiting.length; start += CHUNK) {
    run.signal.throwIfAborted();
    await checkChunk(waiting.slice(start, start + CHUNK));
  }
};

type Prepared = { answer: AnswerToCheck; reference: ReferenceResult };

async function checkChunk(answers: readonly AnswerToCheck[]): Promise<void> {
  const prepared = answers.map((answer): Prepared => ({
    answer,
    reference: referenceOf(answer.content, answer.partKey, answer.values),
  }));
  const results = await checkInThread(
    prepared.flatMap(({ answer, reference }) =>
      reference.ok ? [{ id: answer.answerId, answer: answer.text, ...reference.check }] : [],
    ),
  );
  const byAnswer = new Map(results.map((result) => [result.requestId, result]));
  await inTransaction(async (transaction) => {
    const context: ServiceContext = { actor: { kind: 'system', name: 'check-answers' }, transaction, now: new Date() };
    for (const { answer, reference } of prepared) {
      await recordCheck(context, recordOf(answer, reference, byAnswer.get(answer.answerId)));
    }
    await countIntakeChecks(
      context,
      answers.map(({ answerId }) => answerId),
    );
  });
}

function recordOf(
  answer: AnswerToCheck,
  reference: ReferenceResult,
  result: ThreadResult | ThreadFailure | undefined,
): CheckRecord {
  const record = { answerId: answer.answerId, checkerVersion: CHECKER_VERSION };
  if (!reference.ok) return { ...record, ...withoutReference(answer, reference.error) };
  if (!result || 'failed' in result) {
    const response = undecided(answer, 'the check was given up before it ended');
    return { ...record, response, readingPlain: '', referenceLatex: '' };
  }
  const { outcome, readingPlain, referenceLatex } = result;
  if ('error' in outcome) return { ...record, ...withoutReference(answer, outcome.error) };
  return { ...record, response: outcome, readingPlain, referenceLatex };
}

/** A reference is proved when its template is published, so this is a defect of ours: a person marks the answer. */
function withoutReference(answer: AnswerToCheck, why: string): Omit<CheckRecord, 'answerId' | 'checkerVersion'> {
  log.error({ answerId: answer.answerId, part: answer.partKey, why }, 'a reference could not be used');
  return { response: undecided(answer, 'the reference could not be used'), readingPlain: '', referenceLatex: '' };
}

/** What is recorded where the checker gave no verdict: a person decides, with the reason before them. */
function undecided(answer: AnswerToCheck, reason: string): CheckResponse {
  return {
    id: answer.answerId,
    verdict: 'undecided',
    slip: null,
    slips: [],
    kinKey: null,
    reading: '',
    message: `The checker could not decide: ${reason}.`,
    evidence: { test: 'none', reason },
    ms: 0,
  };
}
