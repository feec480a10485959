'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { Field } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { setPassword } from '../actions';

type Props = { purpose: 'invitation' | 'reset'; token: string; email: string };

/** A new password for the person a link was mailed to. The e-mail is there for password managers. */
export function SetPasswordForm({ purpose, token, email }: Props) {
  const { form, faults } = useActionForm(setPassword);
  return (
    <form {...form} className="grid gap-4">
      <FormErrorSummary errors={faults} title="The password was not set" />
      <input type="hidden" name="purpose" value={purpose} />
      <input type="hidden" name="token" value={token} />
      <Field name="email" label="E-mail" type="email" autoComplete="username" readOnly value={email} />
      <Field
        name="password"
        label="New password"
        type="password"
        autoComplete="new-password"
        hint="At least 12 characters; a few unrelated words do well."
        error={faults['password']}
        maxLength={200}
      />
      <div>
        <SubmitButton>Set the password</SubmitButton>
      </div>
    </form>
  );
}
