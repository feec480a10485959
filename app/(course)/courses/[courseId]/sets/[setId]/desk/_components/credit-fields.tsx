'use client';

import { Field, TextArea } from '@/components/ui/fields';
import { type FieldFaults } from '@/app/_server/action-result';
import { formatCredit } from '@/lib/domain/credit';
import { type QuickCredit } from './quick-credits';

/** The comment box, to which a key leads. */
export const commentBoxId = 'desk-comment';

interface CreditFieldsProps {
  readonly quick: readonly QuickCredit[];
  readonly outOf: string;
  readonly credit: string;
  readonly onCredit: (credit: string) => void;
  readonly comment: string;
  readonly onComment: (comment: string) => void;
  readonly commentLabel: string;
  readonly commentRequired: boolean;
  readonly faults: FieldFaults;
  /** A word behind "of 4": "suggested". */
  readonly state?: string;
}

/** Credit by one press or one key, or typed; and the comment to the student. */
export function CreditFields(props: CreditFieldsProps) {
  const { quick, outOf, credit, onCredit, comment, onComment, commentLabel, commentRequired, faults, state } = props;
  return (
    <div className="grid gap-4">
      <div>
        <p className="flex flex-wrap items-baseline gap-x-2">
          <span className="text-mark font-semibold">{credit === '' ? '–' : credit}</span>
          <span className="text-small text-grey">
            of {outOf}
            {state ? `, ${state}` : null}
          </span>
        </p>
        <div role="group" aria-label="Credit" className="mt-2 flex flex-wrap gap-2">
          {quick.map((each) => {
            const chosen = formatCredit(each.credit) === credit;
            return (
              <button
                key={each.key}
                type="button"
                aria-pressed={chosen}
                aria-keyshortcuts={each.key}
                onClick={() => onCredit(each.words)}
                className={`min-h-12 min-w-11 rounded-leaf border bg-field px-2 py-1 text-center ${
                  chosen ? 'border-2 border-blue font-semibold' : 'border-edge'
                }`}
              >
                <span className="block text-base leading-tight">{each.words}</span>
                <kbd aria-hidden="true" className="block text-note text-grey">
                  {each.key}
                </kbd>
              </button>
            );
          })}
        </div>
      </div>
      <Field
        name="credit"
        label="Credit in marks"
        value={credit}
        onChange={(event) => onCredit(event.target.value)}
        error={faults.credit}
        inputMode="decimal"
        autoComplete="off"
      />
      <TextArea
        id={commentBoxId}
        name="comment"
        label={commentLabel}
        optional={!commentRequired}
        value={comment}
        onChange={(event) => onComment(event.target.value)}
        error={faults.comment}
        rows={3}
        maxLength={8000}
      />
    </div>
  );
}
