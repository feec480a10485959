'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { Field } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { useToast } from '@/components/ui/toast';
import { savePassword } from '../actions';

/** Changes one's own password. */
export function PasswordForm({ email }: { email: string }) {
  const toast = useToast();
  const { form, faults } = useActionForm(savePassword, ({ endedSessions }) =>
    toast(
      endedSessions === 0
        ? 'Your password is changed.'
        : `Your password is changed, and ${endedSessions === 1 ? 'one other browser was' : `${endedSessions} other browsers were`} signed out.`,
    ),
  );
  return (
    <form {...form} className="grid gap-4">
      <FormErrorSummary errors={faults} title="The password was not changed" />
      <input type="hidden" name="username" autoComplete="username" value={email} readOnly />
      <Field
        name="currentPassword"
        label="Present password"
        type="password"
        autoComplete="current-password"
        error={faults['currentPassword']}
        maxLength={1000}
      />
      <Field
        name="newPassword"
        label="New password"
        type="password"
        autoComplete="new-password"
        hint="At least 12 characters; a few unrelated words do well."
        error={faults['newPassword']}
        maxLength={200}
      />
      <div>
        <SubmitButton look="quiet">Change the password</SubmitButton>
      </div>
    </form>
  );
}
