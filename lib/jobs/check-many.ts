import { type CheckError, type CheckOutcome, type CheckRequest, type CheckResponse } from '@/lib/checker/contract';
import { checkRequestSchema } from '@/lib/http-api/check-schemas';
import { checkInThread, type ThreadFailure } from './checker-pool';
import { type ThreadResult } from './checker-worker';

/** Checks handed to a thread at once: a thread that must be ended takes few others with it. */
const CHUNK = 50;

/** What became of one check, with both sides typeset; the two texts are empty where there is nothing to show. */
export type CheckedPair = { outcome: CheckOutcome; readingPlain: string; referenceLatex: string };

/**
 * Makes checks in worker threads, so that the event loop stays free and a check that hangs is ended. Takes anything: what
 * is no check of the contract is an error in its place, as `line` counted from 1. Results are in order.
 */
export async function checkMany(checks: readonly unknown[]): Promise<CheckedPair[]> {
  const judged = checks.map((check, index) => judge(check, index + 1));
  const good = judged.filter((one) => 'request' in one).map(({ request }) => request);
  const decided = (await inLanes(good)).values();
  return judged.map((one, index) => {
    if ('error' in one) return bare(one.error);
    const result = decided.next().value;
    if (result === undefined) throw new Error('A thread answers every check.');
    return present(result, one.request, index + 1);
  });
}

/** Two chunks at a time, one a thread, so that callers take turns instead of queueing behind a long call. */
async function inLanes(requests: readonly CheckRequest[]): Promise<(ThreadResult | ThreadFailure)[]> {
  const results: (ThreadResult | ThreadFailure)[] = [];
  for (let start = 0; start < requests.length; start += 2 * CHUNK) {
    const lanes = [start, start + CHUNK].map((from) => requests.slice(from, from + CHUNK));
    results.push(...(await Promise.all(lanes.filter((lane) => lane.length > 0).map(checkInThread))).flat());
  }
  return results;
}

type Judged = { request: CheckRequest } | { error: CheckError };

function judge(check: unknown, line: number): Judged {
  const parsed = checkRequestSchema.safeParse(check);
  if (parsed.success) return { request: parsed.data };
  const id =
    typeof check === 'object' && check !== null && 'id' in check && typeof check.id === 'string' ? check.id : null;
  const [issue] = parsed.error.issues;
  const where = issue && issue.path.length > 0 ? `“${issue.path.join('.')}”: ` : '';
  return { error: { id: id?.slice(0, 200) ?? null, line, error: `${where}${issue?.message ?? 'This is no check.'}` } };
}

function present(result: ThreadResult | ThreadFailure, request: CheckRequest, line: number): CheckedPair {
  if ('failed' in result) return bare(givenUp(request));
  const { outcome, readingPlain, referenceLatex } = result;
  return { outcome: 'error' in outcome ? { ...outcome, line } : outcome, readingPlain, referenceLatex };
}

const bare = (outcome: CheckOutcome): CheckedPair => ({ outcome, readingPlain: '', referenceLatex: '' });

function givenUp({ id }: CheckRequest): CheckResponse {
  return {
    id,
    verdict: 'undecided',
    slip: null,
    slips: [],
    kinKey: null,
    reading: '',
    message: 'Halfmark could not decide this; a person must.',
    evidence: { test: 'none', reason: 'the check was given up before it ended' },
    ms: 0,
  };
}
