'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { Field } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { useToast } from '@/components/ui/toast';
import { makeAccount } from '../actions';

/** Makes an account outside any course. */
export function AccountForm() {
  const toast = useToast();
  const { form, faults } = useActionForm(makeAccount, () => toast('An invitation is on its way.'));
  return (
    <form {...form} className="grid gap-4">
      <FormErrorSummary errors={faults} title="No account was made" />
      <Field name="email" label="E-mail" type="email" autoComplete="off" error={faults['email']} maxLength={254} />
      <Field name="name" label="Name" autoComplete="off" error={faults['name']} maxLength={200} />
      <div>
        <SubmitButton>Invite</SubmitButton>
      </div>
    </form>
  );
}
