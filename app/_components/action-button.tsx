'use client';

import { useState } from 'react';
import { type ActionResult } from '@/app/_server/action-result';
import { Button, type ButtonLook } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { SubmitButton } from '@/components/ui/submit-button';
import { useToast } from '@/components/ui/toast';
import { useActionForm } from './use-action-form';

type Props = {
  action: (form: FormData) => Promise<ActionResult<unknown>>;
  /** What the action is told, as hidden fields. */
  fields: Readonly<Record<string, string>>;
  label: string;
  look?: ButtonLook;
  /** Said in a toast when it is done. */
  done: string;
  /** Asks before doing it: what will happen, in a sentence. */
  confirm?: { title: string; words: string };
};

/** A button that does one thing on the server, after a question where the thing is hard to take back. */
export function ActionButton({ action, fields, label, look = 'quiet', done, confirm }: Props) {
  const [asking, ask] = useState(false);
  const toast = useToast();
  const { form } = useActionForm(async (data) => {
    const result = await action(data);
    ask(false);
    toast(result.ok ? done : result.message, result.ok ? 'info' : 'error');
    return result;
  });
  const hidden = Object.entries(fields).map(([name, value]) => (
    <input key={name} type="hidden" name={name} value={value} />
  ));
  if (!confirm) {
    return (
      <form {...form} className="inline">
        {hidden}
        <SubmitButton look={look}>{label}</SubmitButton>
      </form>
    );
  }
  return (
    <>
      <Button look={look} onClick={() => ask(true)}>
        {label}
      </Button>
      <Dialog open={asking} onClose={() => ask(false)} title={confirm.title}>
        <p>{confirm.words}</p>
        <form {...form} className="mt-2 flex flex-wrap gap-3">
          {hidden}
          <Button look="quiet" onClick={() => ask(false)}>
            Leave it as it is
          </Button>
          <SubmitButton look="danger">{label}</SubmitButton>
        </form>
      </Dialog>
    </>
  );
}
