'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { Field, Select, type SelectOption } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { makeTemplate } from '../actions';

/** Title and department of a new question. */
export function NewTemplateForm({ departments }: { departments: readonly SelectOption[] }) {
  const { form, faults } = useActionForm(makeTemplate);
  return (
    <form {...form} className="grid gap-5">
      <FormErrorSummary errors={faults} />
      <Field
        name="name"
        label="Title"
        hint="As students will read it, such as “A tilted magnet”. It can be changed later."
        error={faults.name}
        maxLength={200}
        autoComplete="off"
        autoFocus
      />
      {departments.length === 1 ? (
        <input type="hidden" name="departmentId" value={departments[0]?.value} />
      ) : (
        <Select name="departmentId" label="Department" options={departments} error={faults.departmentId} />
      )}
      <div>
        <SubmitButton pendingWords="Putting it on the shelf">Begin writing</SubmitButton>
      </div>
    </form>
  );
}
