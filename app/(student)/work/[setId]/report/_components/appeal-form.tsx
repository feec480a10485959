'use client';

import { useState } from 'react';
import { useActionForm } from '@/app/_components/use-action-form';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { TextArea } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { useToast } from '@/components/ui/toast';
import { appealPart } from '../actions';

interface AppealFormProps {
  readonly problemSetId: string;
  readonly answerId: string;
  /** "question 2, part b" */
  readonly place: string;
  /** Whether an appeal may lower the credit, in words. */
  readonly rule: string;
}

/** The way to an appeal of one part: says first what it can do to the credit, then asks for the reason. */
export function AppealForm({ problemSetId, answerId, place, rule }: AppealFormProps) {
  const [asking, ask] = useState(false);
  const toast = useToast();
  const { form, faults } = useActionForm(appealPart, () => {
    ask(false);
    toast('Your appeal is in. You get a corrected report when it is answered.');
  });
  return (
    <div className="mt-2 text-small">
      <Button look="plain" onClick={() => ask(true)} aria-label={`Appeal this part: ${place}`}>
        Appeal this part
      </Button>
      <Dialog open={asking} onClose={() => ask(false)} title={`Appeal ${place}`}>
        <form {...form} className="grid gap-3">
          <FormErrorSummary errors={faults} title="The appeal is not made" />
          <input type="hidden" name="problemSetId" value={problemSetId} />
          <input type="hidden" name="answerId" value={answerId} />
          <p>{rule} A part can be appealed once, so say all that you want to say.</p>
          <TextArea
            id={`reason-${answerId}`}
            name="reason"
            label="Why should it be marked otherwise?"
            hint="What you wrote and how it was read goes with it; you need not repeat it."
            error={faults['reason']}
            rows={5}
            maxLength={4000}
          />
          <div className="mt-2 flex flex-wrap gap-3">
            <Button look="quiet" onClick={() => ask(false)}>
              Not now
            </Button>
            <SubmitButton>Appeal this part</SubmitButton>
          </div>
        </form>
      </Dialog>
    </div>
  );
}
