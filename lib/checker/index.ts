/**
 * The checker's whole door: for server, worker and staff pages. Students' pages import `reader` alone.
 */
import { type CheckRequest, type Computed, type ComputeError, type CheckOutcome } from './contract';
import { decide } from './kinds/check';
import { type EarlierAnswer, followThrough, type FollowThrough } from './kinds/follow-through';
import { computeReference, type ComputeRequest } from './kinds/compute';
import { isRecord, validateRequest } from './kinds/request';

export type * from './contract';
export type { ComputeRequest } from './kinds/compute';
export type { EarlierAnswer, FollowThrough } from './kinds/follow-through';
export { read, type Reading } from './reader';
export { sentenceOf, slipIds } from './slips/sentences';

/** Changes whenever a verdict, a slip or a reading may change; stored with every verdict. */
export const CHECKER_VERSION = '1.0.0';

/** What the caller lends to a check: a clock in milliseconds, so that the time taken can be told. */
export interface CheckSetting {
  readonly now?: () => number;
}

/**
 * Decides one check: a response, or an error where the request itself is bad. Takes any value and never throws; keeps
 * nothing from one check to the next. Work is bounded by a count of steps, so the verdict never depends on load.
 */
export function check(request: unknown, setting: CheckSetting = {}): CheckOutcome {
  const started = setting.now?.() ?? 0;
  const valid = validateRequest(request);
  if ('error' in valid) {
    const id = isRecord(request) && typeof request['id'] === 'string' ? request['id'] : null;
    return { id, error: valid.error };
  }
  const outcome = decide(valid.request);
  if ('error' in outcome) return outcome;
  const ms = Math.round(((setting.now?.() ?? 0) - started) * 1000) / 1000;
  return { ...outcome, ms };
}

/** Works out a reference and prints it, as LaTeX and in the answer language. Never throws. */
export function compute(request: ComputeRequest): Computed | ComputeError {
  return computeReference(request);
}

/**
 * Checks a later part against its reference recomputed from the student's own earlier answers, which stand in it under
 * names. A pure function of the request and the answers; never throws.
 */
export function checkFollowThrough(request: CheckRequest, earlier: readonly EarlierAnswer[]): FollowThrough {
  const valid = validateRequest(request);
  if ('error' in valid) return { outcome: { id: request.id, error: valid.error }, reference: '', degenerate: false };
  return followThrough(valid.request, earlier);
}
