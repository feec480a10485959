'use client';

import { type ReactNode, useState } from 'react';
import { useActionForm } from '@/app/_components/use-action-form';
import { type ActionResult } from '@/app/_server/action-result';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { Keys } from '@/components/ui/keys';
import { SubmitButton } from '@/components/ui/submit-button';
import { giveSecondMark, settle } from '../actions';
import { CreditFields } from './credit-fields';
import { type QuickCredit } from './quick-credits';
import { useKeptText, useMarkingKeys, useTimeSpent } from './use-marking';

interface SecondDeskProps {
  readonly ids: { courseId: string; problemSetId: string; secondMarkingId: string };
  /** `mark`: the blind second mark; `settle`: the decision where two marks differ. */
  readonly what: 'mark' | 'settle';
  readonly quick: readonly QuickCredit[];
  readonly outOf: string;
  readonly sheet: ReactNode;
  readonly above: ReactNode;
}

const words = {
  mark: {
    region: 'Second marking',
    send: 'Mark and go on',
    pending: 'Marking',
    comment: 'Why this credit (for settling)',
  },
  settle: { region: 'Settling', send: 'Settle', pending: 'Settling', comment: 'Reasons, also shown to the student' },
} as const;

/** The desk of a second marking or of settling one: the same sheet and keys, without a suggestion. */
export function SecondDesk({ ids, what, quick, outOf, sheet, above }: SecondDeskProps) {
  const [credit, setCredit] = useState('');
  const [comment, setComment] = useKeptText(`${what} ${ids.secondMarkingId}`, '');
  const timeSpent = useTimeSpent();
  const { form, faults } = useActionForm(async (sent: FormData): Promise<ActionResult<null>> => {
    sent.set('millisecondsSpent', String(timeSpent()));
    return what === 'mark' ? giveSecondMark(sent) : settle(sent);
  });
  const { region: place, form: formPlace, onKeyDown } = useMarkingKeys({ quick, onCredit: setCredit });
  const { region, send, pending, comment: label } = words[what];
  return (
    <div ref={place} tabIndex={-1} role="group" aria-label={region} onKeyDown={onKeyDown} className="script-row">
      <div className="script-body">{sheet}</div>
      <div className="script-margin">
        <div className="grid gap-4">
          {above}
          <form ref={formPlace} {...form} className="grid gap-4">
            {Object.entries(ids).map(([name, value]) => (
              <input key={name} type="hidden" name={name} value={value} />
            ))}
            <FormErrorSummary errors={faults} />
            <CreditFields
              quick={quick}
              outOf={outOf}
              credit={credit}
              onCredit={setCredit}
              comment={comment}
              onComment={setComment}
              commentRequired={what === 'settle'}
              commentLabel={label}
              faults={faults}
            />
            <div>
              <SubmitButton pendingWords={pending}>
                {send}
                <Keys of="↵" />
              </SubmitButton>
            </div>
          </form>
        </div>
      </div>
    </div>
  );
}
