'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { Field } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { makeSet } from '../actions';

/** The title of a new set. */
export function NewSetForm({ courseId }: { courseId: string }) {
  const { form, faults } = useActionForm(makeSet);
  return (
    <form {...form} className="grid gap-5">
      <FormErrorSummary errors={faults} />
      <input type="hidden" name="courseId" value={courseId} />
      <Field
        name="title"
        label="Title"
        hint="As students will read it, such as “Spin in a field”. The number comes by itself."
        error={faults.title}
        maxLength={200}
        autoComplete="off"
        autoFocus
      />
      <div>
        <SubmitButton pendingWords="Making the set">Make a draft</SubmitButton>
      </div>
    </form>
  );
}
