'use client';

import Link from 'next/link';
import { useActionState } from 'react';
import { type FieldErrors } from '@/components/ui/field-frame';
import { Field } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { paths } from '@/lib/paths';
import { signInAndWait, type SignInResult } from './sign-in';

const words: Record<Exclude<SignInResult, 'welcome'>, string> = {
  refused: 'This e-mail and password do not go together. Look at both and try again.',
  'too-many': 'There were too many failed tries. Wait a quarter of an hour, or set a new password by mail.',
  failed: 'Signing in did not work just now. Please try again.',
};

/** E-mail and password. A refusal keeps what was typed and never says which of the two was wrong. */
export function SignInForm({ next }: { next: string }) {
  const [result, send] = useActionState(async (_before: SignInResult | null, form: FormData): Promise<SignInResult> => {
    const result = await signInAndWait(text(form, 'email'), text(form, 'password'));
    // A whole navigation, so that nothing rendered for a signed-out visitor is shown again.
    if (result === 'welcome') window.location.assign(next);
    return result;
  }, null);
  const faults: FieldErrors = result === null || result === 'welcome' ? {} : { '': words[result] };
  return (
    <form action={send} onReset={(event) => event.preventDefault()} className="grid gap-4">
      <FormErrorSummary errors={faults} title="You are not signed in" />
      <Field name="email" label="E-mail" type="email" autoComplete="username" maxLength={254} />
      <Field name="password" label="Password" type="password" autoComplete="current-password" maxLength={1000} />
      <div className="flex flex-wrap items-center gap-x-6 gap-y-3">
        <SubmitButton pendingWords="Signing in">Sign in</SubmitButton>
        <Link href={paths.forgottenPassword()} className="text-small">
          Forgotten your password?
        </Link>
      </div>
    </form>
  );
}

function text(form: FormData, name: string): string {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
}
