import { isHalfmarkError, type ErrorCode, type HalfmarkError } from '@/lib/errors';

/** The refusal that some work ends in; fails where it succeeds, or ends in anything else than this code. */
export async function refusalOf(work: Promise<unknown>, code: ErrorCode): Promise<HalfmarkError> {
  const outcome = await work.then(
    () => 'not refused',
    (error: unknown) => error,
  );
  if (isHalfmarkError(outcome, code)) return outcome;
  throw outcome instanceof Error ? outcome : new Error(`Expected ${code}, got: ${String(outcome)}`);
}
