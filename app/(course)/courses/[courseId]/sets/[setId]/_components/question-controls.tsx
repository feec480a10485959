'use client';

import { ActionButton } from '@/app/_components/action-button';
import { useActionForm } from '@/app/_components/use-action-form';
import { Field } from '@/components/ui/fields';
import { SubmitButton } from '@/components/ui/submit-button';
import { useToast } from '@/components/ui/toast';
import { changePoints, orderQuestions, removeQuestion } from '../actions';

interface QuestionControlsProps {
  readonly ids: { courseId: string; problemSetId: string; revision: string; itemId: string };
  readonly points: string;
  readonly title: string;
  /** The questions' ids in their present order. */
  readonly order: readonly string[];
}

/** Points, place and removal of one question. */
export function QuestionControls({ ids, points, title, order }: QuestionControlsProps) {
  const toast = useToast();
  const { form, faults } = useActionForm(changePoints, () => toast('Points saved.'));
  const at = order.indexOf(ids.itemId);
  return (
    <details className="text-small">
      <summary className="text-blue">Change</summary>
      <div className="mt-3 grid gap-4">
        <form {...form} className="flex items-end gap-3">
          <Hidden fields={ids} />
          <Field
            key={points}
            id={`points-${ids.itemId}`}
            name="points"
            label="Points"
            defaultValue={points}
            inputMode="decimal"
            error={faults.points ?? faults['']}
          />
          <SubmitButton look="quiet">Save</SubmitButton>
        </form>
        <div className="flex flex-wrap gap-x-4 gap-y-1">
          {at > 0 ? <Move ids={ids} itemIds={swapped(order, at, at - 1)} label="Move up" /> : null}
          {at < order.length - 1 ? <Move ids={ids} itemIds={swapped(order, at, at + 1)} label="Move down" /> : null}
          <ActionButton
            action={removeQuestion}
            fields={ids}
            look="plain"
            label="Take out"
            done={`“${title}” is out of the set.`}
            confirm={{
              title: 'Take this question out?',
              words: `“${title}” leaves the set. It stays on the shelf, and no student has seen it here.`,
            }}
          />
        </div>
      </div>
    </details>
  );
}

function Move({ ids, itemIds, label }: { ids: QuestionControlsProps['ids']; itemIds: string; label: string }) {
  return (
    <ActionButton action={orderQuestions} fields={{ ...ids, itemIds }} look="plain" label={label} done="Order saved." />
  );
}

function swapped(order: readonly string[], from: number, to: number): string {
  const next = [...order];
  [next[from], next[to]] = [order[to]!, order[from]!];
  return next.join(' ');
}

function Hidden({ fields }: { fields: Readonly<Record<string, string>> }) {
  return Object.entries(fields).map(([name, value]) => <input key={name} type="hidden" name={name} value={value} />);
}
