'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { Field, Select, type SelectOption } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { useToast } from '@/components/ui/toast';
import { addQuestion } from '../actions';

interface AddQuestionFormProps {
  readonly ids: { courseId: string; problemSetId: string; revision: string };
  readonly choices: readonly SelectOption[];
}

/** Chooses a question and its points. */
export function AddQuestionForm({ ids, choices }: AddQuestionFormProps) {
  const toast = useToast();
  const { form, faults } = useActionForm(addQuestion, () => toast('The question is in the set.'));
  return (
    <form {...form} className="grid gap-4">
      <FormErrorSummary errors={faults} />
      {Object.entries(ids).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <Select
        name="templateVersionId"
        label="Question"
        options={choices}
        empty="Choose from the shelf"
        error={faults.templateVersionId}
      />
      <Field
        name="points"
        label="Points"
        hint="Divided over its parts by their weights."
        defaultValue="10"
        inputMode="decimal"
        error={faults.points}
      />
      <div>
        <SubmitButton look="quiet" pendingWords="Adding">
          Add the question
        </SubmitButton>
      </div>
    </form>
  );
}
