'use client';

import { type ReactNode, useState } from 'react';
import { useActionForm } from '@/app/_components/use-action-form';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { TextArea } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { Keys } from '@/components/ui/keys';
import { Notice } from '@/components/ui/notice';
import { SubmitButton } from '@/components/ui/submit-button';
import { escalate, putBack, rule, takeOne } from '../actions';
import { CreditFields } from './credit-fields';
import { type QuickCredit } from './quick-credits';
import { useHold } from './use-hold';
import { useKeptText, useMarkingKeys, useTimeSpent } from './use-marking';

interface DeskProps {
  readonly ids: { courseId: string; problemSetId: string; queueItemId: string };
  readonly kind: 'review' | 'appeal';
  readonly quick: readonly QuickCredit[];
  readonly outOf: string;
  /** The credit that the author gave to the recognised slip, in marks; empty without one. */
  readonly suggested: string;
  /** Until when the person holds the answer, as an ISO text. */
  readonly heldUntil: string;
  /** The question that was handed to the head TA with it. */
  readonly mayEscalate: boolean;
  /** The sheet, and what stands in the margin above and below the marking. */
  readonly sheet: ReactNode;
  readonly above: ReactNode;
  readonly below: ReactNode;
}

/** The review desk: the sheet on the left, the marking in the margin, and the keys that work it. */
export function Desk(props: DeskProps) {
  const { ids, kind, quick, outOf, suggested, heldUntil, mayEscalate, sheet, above, below } = props;
  const [credit, setCredit] = useState(suggested);
  const [comment, setComment] = useKeptText(`desk ${ids.queueItemId}`, '');
  const [asking, setAsking] = useState(false);
  const timeSpent = useTimeSpent();
  const hold = useHold(ids.queueItemId, heldUntil);
  const ruling = useActionForm(async (form) => {
    form.set('millisecondsSpent', String(timeSpent()));
    return rule(form);
  });
  const back = useActionForm(putBack);
  const letters = { e: () => setAsking(mayEscalate), p: () => document.getElementById(putBackId)?.click() };
  const { region: place, form: formPlace, onKeyDown } = useMarkingKeys({ quick, onCredit: setCredit, letters });

  return (
    <div ref={place} tabIndex={-1} role="group" aria-label="Review desk" onKeyDown={onKeyDown} className="script-row">
      <div className="script-body">{sheet}</div>
      <div className="script-margin">
        <div className="grid gap-4">
          {above}
          {hold.lost ? <Lost ids={ids} /> : null}
          <form ref={formPlace} {...ruling.form} className="grid gap-4">
            <Ids ids={ids} />
            <input type="hidden" name="kind" value={kind} />
            <FormErrorSummary errors={ruling.faults} />
            <CreditFields
              quick={quick}
              outOf={outOf}
              credit={credit}
              onCredit={setCredit}
              comment={comment}
              onComment={setComment}
              commentRequired={kind === 'appeal'}
              commentLabel={kind === 'appeal' ? 'Reply to the student' : 'Comment to the student'}
              faults={ruling.faults}
              state={suggested !== '' && credit === suggested ? 'suggested' : undefined}
            />
            {hold.lost ? null : (
              <div>
                <SubmitButton pendingWords="Ruling">
                  {kind === 'appeal' ? 'Answer and go on' : 'Rule and go on'}
                  <Keys of="↵" />
                </SubmitButton>
              </div>
            )}
          </form>
          <div className="flex flex-wrap gap-x-5 gap-y-2 text-small">
            <form {...back.form}>
              <Ids ids={ids} />
              <SubmitButton id={putBackId} look="plain" pendingWords="Putting back">
                Put back
              </SubmitButton>
              <Keys of="P" />
            </form>
            {mayEscalate ? (
              <span>
                <Button look="plain" onClick={() => setAsking(true)}>
                  Ask the head TA…
                </Button>
                <Keys of="E" />
              </span>
            ) : null}
            <span className="text-grey">
              comment
              <Keys of="C" />
            </span>
          </div>
          <FormErrorSummary errors={back.faults} />
          {below}
        </div>
      </div>
      <Ask ids={ids} open={asking} onClose={() => setAsking(false)} />
    </div>
  );
}

const putBackId = 'desk-put-back';

function Ids({ ids }: { ids: DeskProps['ids'] }) {
  return Object.entries(ids).map(([name, value]) => <input key={name} type="hidden" name={name} value={value} />);
}

function Lost({ ids }: { ids: DeskProps['ids'] }) {
  const again = useActionForm(takeOne);
  return (
    <Notice tone="caution" title="Your hold ran out">
      Another grader may take this answer. What you typed is kept here.
      <form {...again.form} className="mt-2">
        <Ids ids={ids} />
        <SubmitButton look="quiet" pendingWords="Taking">
          Take it again
        </SubmitButton>
      </form>
      <FormErrorSummary errors={again.faults} />
    </Notice>
  );
}

function Ask({ ids, open, onClose }: { ids: DeskProps['ids']; open: boolean; onClose: () => void }) {
  const { form, faults } = useActionForm(escalate);
  return (
    <Dialog open={open} onClose={onClose} title="Hand this answer to the head TA?">
      <form {...form} className="grid gap-4">
        <Ids ids={ids} />
        <FormErrorSummary errors={faults} />
        <TextArea name="question" label="Your question" error={faults.question} rows={3} maxLength={4000} autoFocus />
        <div className="flex flex-wrap gap-3">
          <Button look="quiet" onClick={onClose}>
            Keep it
          </Button>
          <SubmitButton pendingWords="Handing over">Hand it over</SubmitButton>
        </div>
      </form>
    </Dialog>
  );
}
