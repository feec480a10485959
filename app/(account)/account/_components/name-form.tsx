'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { Field } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { useToast } from '@/components/ui/toast';
import { saveName } from '../actions';

/** The name under which one is shown to others. */
export function NameForm({ name }: { name: string }) {
  const toast = useToast();
  const { form, faults } = useActionForm(saveName, () => toast('Your name is saved.'));
  return (
    <form {...form} className="grid gap-4">
      <FormErrorSummary errors={faults} />
      <Field
        key={name}
        name="name"
        label="Name"
        autoComplete="name"
        hint="As graders and instructors see it."
        defaultValue={name}
        error={faults['name']}
        maxLength={200}
      />
      <div>
        <SubmitButton look="quiet">Save the name</SubmitButton>
      </div>
    </form>
  );
}
