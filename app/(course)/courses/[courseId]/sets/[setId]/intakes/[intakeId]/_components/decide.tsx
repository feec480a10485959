'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { giveUp, takeIn } from '../../../intake/actions';

interface DecideProps {
  readonly ids: { courseId: string; problemSetId: string; intakeId: string };
  readonly accepted: number;
  readonly refused: number;
}

/** Whether a previewed upload is taken in; with refused rows, only the good ones are. */
export function Decide({ ids, accepted, refused }: DecideProps) {
  const commit = useActionForm(takeIn);
  const cancel = useActionForm(giveUp);
  const rows = accepted === 1 ? '1 row' : `${accepted} rows`;
  return (
    <div className="grid gap-3">
      <FormErrorSummary errors={commit.faults} />
      <FormErrorSummary errors={cancel.faults} />
      {accepted > 0 ? (
        <form {...commit.form}>
          <Ids ids={ids} />
          <SubmitButton pendingWords="Taking in">
            {refused > 0 ? `Take in the ${rows} that are good` : `Take in ${rows}`}
          </SubmitButton>
        </form>
      ) : (
        <p className="text-small">No row can be taken in. Mend the sheet and upload it again.</p>
      )}
      <form {...cancel.form}>
        <Ids ids={ids} />
        <SubmitButton look="plain" pendingWords="Giving up">
          Give this upload up
        </SubmitButton>
      </form>
    </div>
  );
}

function Ids({ ids }: { ids: DecideProps['ids'] }) {
  return Object.entries(ids).map(([name, value]) => <input key={name} type="hidden" name={name} value={value} />);
}
