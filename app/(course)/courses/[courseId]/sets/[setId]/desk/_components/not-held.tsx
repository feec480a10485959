'use client';

import { type ReactNode } from 'react';
import { useActionForm } from '@/app/_components/use-action-form';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { type QueueItemState } from '@/lib/domain/queue-item-state';
import { takeNext, takeOne } from '../actions';

interface NotHeldProps {
  readonly ids: { courseId: string; problemSetId: string; queueItemId: string };
  readonly state: QueueItemState;
  readonly above: ReactNode;
  readonly below: ReactNode;
}

const words: Record<QueueItemState, string> = {
  waiting: 'Nobody holds this answer.',
  taken: 'Another grader holds this answer.',
  escalated: 'This answer was handed to the head TA.',
  ruled: 'This answer has been ruled on.',
  'to-settle': 'Two graders differ on this answer; it is to be settled.',
  settled: 'This answer is settled.',
  withdrawn: 'A new attempt took the place of this answer.',
};

/** The margin of an answer that this person does not hold: what it is waiting for, and the way on. */
export function NotHeld({ ids, state, above, below }: NotHeldProps) {
  const one = useActionForm(takeOne);
  const next = useActionForm(takeNext);
  const free = state === 'waiting' || state === 'escalated';
  return (
    <div className="grid gap-4">
      {above}
      <p className="text-small">{words[state]}</p>
      <form {...(free ? one.form : next.form)} className="grid gap-3">
        {Object.entries(ids).map(([name, value]) => (
          <input key={name} type="hidden" name={name} value={value} />
        ))}
        <FormErrorSummary errors={free ? one.faults : next.faults} />
        <div>
          <SubmitButton look={free ? 'primary' : 'quiet'} pendingWords="Taking">
            {free ? 'Take it' : 'Take the next'}
          </SubmitButton>
        </div>
      </form>
      {below}
    </div>
  );
}
