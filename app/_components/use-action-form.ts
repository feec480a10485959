'use client';

import { useActionState, useRef, type FormEvent } from 'react';
import { faultsOf, type ActionResult, type FieldFaults } from '@/app/_server/action-result';

type Action<Value> = (form: FormData) => Promise<ActionResult<Value>>;

/** What a form needs: `form` goes onto `<form {...form}>`, `faults` to its summary and fields. */
export type ActionForm<Value> = {
  form: { action: (form: FormData) => void; onReset: (event: FormEvent<HTMLFormElement>) => void };
  faults: FieldFaults;
  result: ActionResult<Value> | null;
};

/**
 * Ties a form to a server action. What was typed stays when the action refuses it (React would empty the form), and is
 * cleared when it succeeds; `onDone` is told the value then. A failure to reach the server is a refusal like any other.
 */
export function useActionForm<Value>(action: Action<Value>, onDone?: (value: Value) => void): ActionForm<Value> {
  const keep = useRef(false);
  const [result, send] = useActionState(async (_before: ActionResult<Value> | null, form: FormData) => {
    const answer = await reach(action, form);
    keep.current = !answer.ok;
    if (answer.ok) onDone?.(answer.value);
    return answer;
  }, null);
  const onReset = (event: FormEvent<HTMLFormElement>) => {
    if (keep.current) event.preventDefault();
  };
  return { form: { action: send, onReset }, faults: faultsOf(result), result };
}

async function reach<Value>(action: Action<Value>, form: FormData): Promise<ActionResult<Value>> {
  try {
    return await action(form);
  } catch (error) {
    // Next steers by throwing (a redirect after success); only a lost connection is ours to tell.
    if (!(error instanceof TypeError)) throw error;
    const message = 'Halfmark could not be reached. What you typed is still here; please try again.';
    return { ok: false, code: 'unavailable', message, fields: { '': message } };
  }
}
