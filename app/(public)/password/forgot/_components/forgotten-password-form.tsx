'use client';

import Link from 'next/link';
import { useActionForm } from '@/app/_components/use-action-form';
import { Field } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { Notice } from '@/components/ui/notice';
import { SubmitButton } from '@/components/ui/submit-button';
import { paths } from '@/lib/paths';
import { askForNewPassword } from '../../../actions';

/** Asks for the address; what it says afterwards is the same whether there is an account or not. */
export function ForgottenPasswordForm() {
  const { form, faults, result } = useActionForm(askForNewPassword);
  if (result?.ok) {
    return (
      <Notice title="On its way">
        If there is an account with this address, a link to set a new password has been mailed to it. It works for two
        hours. <Link href={paths.signIn()}>Back to signing in</Link>
      </Notice>
    );
  }
  return (
    <form {...form} className="grid gap-4">
      <FormErrorSummary errors={faults} title="Nothing was sent" />
      <Field
        name="email"
        label="E-mail"
        type="email"
        autoComplete="username"
        hint="The address of your account; a link is mailed to it."
        error={faults['email']}
        maxLength={254}
      />
      <div className="flex flex-wrap items-center gap-x-6 gap-y-3">
        <SubmitButton>Mail me a link</SubmitButton>
        <Link href={paths.signIn()} className="text-small">
          Back to signing in
        </Link>
      </div>
    </form>
  );
}
