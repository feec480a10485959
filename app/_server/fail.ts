import 'server-only';
import { randomUUID } from 'node:crypto';
import { unstable_rethrow } from 'next/navigation';
import { z } from 'zod';
import { HalfmarkError, isHalfmarkError } from '@/lib/errors';
import { currentRequestId, log } from '@/lib/log';

/**
 * Any failure as one of ours. Next's own interrupts (redirect, not found) pass through; a schema's complaint becomes
 * `invalid` by field; anything unforeseen is logged with an id and becomes `unexpected`, which says only that id.
 */
export function asHalfmarkError(error: unknown): HalfmarkError {
  unstable_rethrow(error);
  if (isHalfmarkError(error)) {
    log.info({ code: error.code, reason: error.log }, 'refused');
    return error;
  }
  if (error instanceof z.ZodError) return invalidBy(error);
  const id = currentRequestId() ?? randomUUID();
  log.error({ err: error, failureId: id }, 'unexpected failure');
  return new HalfmarkError(
    'unexpected',
    `Something went wrong on our side. Nothing was lost; please try again. If it happens again, tell us this number: ${id}`,
    { cause: error },
  );
}

/** Words for a complaint for which a schema has none of its own: a field that is missing, or a choice that is none. */
export const plainWords: z.core.$ZodErrorMap = (issue) => {
  if (issue.input === undefined || issue.input === '') return 'Please fill this in.';
  return issue.code === 'invalid_value' ? 'Please choose one of the offered.' : undefined;
};

/** A schema's complaint as `invalid`, one message for each field, by its dotted name. */
export function invalidBy(error: z.ZodError): HalfmarkError {
  const fields: Record<string, string> = {};
  for (const issue of error.issues) fields[issue.path.join('.')] ??= issue.message;
  return new HalfmarkError('invalid', undefined, { fields });
}
