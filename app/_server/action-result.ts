import { type ErrorCode } from '@/lib/errors';

/** What is wrong with a form, by the name of the field; '' is the form as a whole. */
export type FieldFaults = Readonly<Record<string, string>>;

/**
 * What a server action answers: the value, or a refusal with its code, the sentence for the person, and the faults by
 * field, which are never empty and can be handed to a form's error summary as they are.
 */
export type ActionResult<Value> =
  { ok: true; value: Value } | { ok: false; code: ErrorCode; message: string; fields: FieldFaults };

/** The faults of a result for a form to show; none before it was sent, or when it went well. */
export function faultsOf(result: ActionResult<unknown> | null): FieldFaults {
  return result === null || result.ok ? {} : result.fields;
}
