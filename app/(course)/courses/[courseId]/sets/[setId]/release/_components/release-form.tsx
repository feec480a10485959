'use client';

import { useState } from 'react';
import { useActionForm } from '@/app/_components/use-action-form';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Checkbox } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { useToast } from '@/components/ui/toast';
import { releaseNow } from '../actions';

interface ReleaseFormProps {
  readonly courseId: string;
  readonly problemSetId: string;
  /** Students whose scores can go out now. */
  readonly ready: number;
  readonly heldBack: number;
  /** Parts of those students that wait. */
  readonly waiting: number;
}

/** Releases the scores, after saying once more what that does and what cannot be taken back. */
export function ReleaseForm({ courseId, problemSetId, ready, heldBack, waiting }: ReleaseFormProps) {
  const [asking, ask] = useState(false);
  const toast = useToast();
  const { form, faults } = useActionForm(releaseNow, ({ released }) => {
    ask(false);
    toast(`Released. ${count(released, 'report is', 'reports are')} on the way.`);
  });
  const students = count(ready, 'student', 'students');
  return (
    <div>
      <Button look="primary" onClick={() => ask(true)}>
        Release the scores…
      </Button>
      <Dialog open={asking} onClose={() => ask(false)} title={`Release the scores of ${students}?`}>
        <form {...form} className="grid gap-3">
          <FormErrorSummary errors={faults} title="Nothing was released" />
          <input type="hidden" name="courseId" value={courseId} />
          <input type="hidden" name="problemSetId" value={problemSetId} />
          <p>
            {ready === 1 ? 'One student gets' : `${students} get`} a score report by e-mail, and may appeal from then
            on. It cannot be taken back; what is corrected later is sent as a corrected report.
          </p>
          {heldBack === 0 ? null : (
            <p>
              {count(heldBack, 'student with a running extension is', 'students with a running extension are')} held
              back. Reports reveal answers: one who still works may be shown them by another.
            </p>
          )}
          {waiting === 0 ? null : (
            <Checkbox
              name="reportWaitingParts"
              value="yes"
              label={
                waiting === 1
                  ? 'Report the part that waits as still being marked'
                  : `Report the ${waiting} parts that wait as still being marked`
              }
              hint="They count in no total yet. Each student gets a corrected report when they are marked."
            />
          )}
          <div className="mt-2 flex flex-wrap gap-3">
            <Button look="quiet" onClick={() => ask(false)}>
              Not yet
            </Button>
            <SubmitButton look="danger">Release now</SubmitButton>
          </div>
        </form>
      </Dialog>
    </div>
  );
}

function count(number: number, one: string, many: string): string {
  return `${number} ${number === 1 ? one : many}`;
}
