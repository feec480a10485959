'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { Field } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { addSection } from '../actions';

/** Makes a section; stands in the margin under the list of them. */
export function SectionForm({ courseId }: { courseId: string }) {
  const { form, faults } = useActionForm(addSection);
  return (
    <form {...form} className="grid gap-3">
      <FormErrorSummary errors={faults} title="No section was made" />
      <input type="hidden" name="courseId" value={courseId} />
      <Field name="name" id="field-section-name" label="New section" error={faults['name']} maxLength={60} />
      <div>
        <SubmitButton look="quiet">Make it</SubmitButton>
      </div>
    </form>
  );
}
