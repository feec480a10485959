'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { takeNext } from '../../desk/actions';

/** Takes the next answer of the set and goes to its desk. */
export function TakeNext({ ids, disabled }: { ids: { courseId: string; problemSetId: string }; disabled: boolean }) {
  const { form, faults } = useActionForm(takeNext);
  return (
    <form {...form} className="grid gap-2">
      {Object.entries(ids).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <FormErrorSummary errors={faults} />
      <div>
        <SubmitButton disabled={disabled} pendingWords="Taking" autoFocus>
          Take the next
        </SubmitButton>
      </div>
    </form>
  );
}
