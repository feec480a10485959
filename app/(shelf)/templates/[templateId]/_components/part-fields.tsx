'use client';

import { Button } from '@/components/ui/button';
import { Checkbox, Select } from '@/components/ui/fields';
import { answerKindNames } from '@/lib/presenters/kind-name';
import { emptyPart } from '@/lib/templates/blank-draft';
import { type DraftPart } from '@/lib/templates/draft';
import { CreditFields } from './credit-fields';
import { DraftArea, DraftField, replaced, SourceGroup, without } from './draft-fields';
import { OptionFields } from './option-fields';

interface PartFieldsProps {
  readonly parts: readonly DraftPart[];
  readonly change: (parts: DraftPart[]) => void;
}

const letters = 'abcdefghijkl';
const kinds = answerKindNames.map(({ kind, name }) => ({ value: kind, label: name }));

/** The asked-for answers, each with its reference, options and credit. */
export function PartFields({ parts, change }: PartFieldsProps) {
  const free = [...letters].find((letter) => parts.every((part) => part.key !== letter));
  return (
    <SourceGroup
      title="Parts"
      hint="References are computations in the answer language; commutator, eigenvalues, expectation and their like are known there."
    >
      {parts.map((part, index) => (
        <PartEntry
          key={part.key}
          part={part}
          index={index}
          set={(next) => change(replaced(parts, index, next))}
          remove={parts.length > 1 ? () => change(without(parts, index)) : null}
        />
      ))}
      {free === undefined ? null : (
        <div>
          <Button look="plain" onClick={() => change([...parts, emptyPart(free)])}>
            Add part {free}
          </Button>
        </div>
      )}
    </SourceGroup>
  );
}

interface PartEntryProps {
  readonly part: DraftPart;
  readonly index: number;
  readonly set: (next: Partial<DraftPart>) => void;
  readonly remove: (() => void) | null;
}

function PartEntry({ part, index, set, remove }: PartEntryProps) {
  const path = `parts.${index}`;
  return (
    <div role="group" aria-label={`Part ${part.key}`} className="grid gap-4 border-t border-hairline pt-4">
      <div className="flex items-baseline justify-between gap-4">
        <p className="text-lead font-semibold">{part.key}.</p>
        {remove ? (
          <Button look="plain" onClick={remove} className="text-small" aria-label={`Remove part ${part.key}`}>
            Remove
          </Button>
        ) : null}
      </div>
      <DraftArea
        path={`${path}.prompt`}
        label="What is asked"
        mono
        rows={2}
        value={part.prompt}
        onText={(prompt) => set({ prompt })}
      />
      <div className="grid max-w-form grid-cols-[1fr_6rem] gap-3">
        <Select
          name={`${path}.kind`}
          label="Kind of answer"
          options={kinds}
          value={part.kind}
          onChange={(event) => {
            const chosen = answerKindNames.find(({ kind }) => kind === event.target.value);
            if (chosen) set({ kind: chosen.kind });
          }}
        />
        <DraftField
          path={`${path}.weight`}
          label="Weight"
          inputMode="numeric"
          value={part.weight}
          onText={(weight) => set({ weight })}
        />
      </div>
      <DraftArea
        path={`${path}.reference`}
        label={part.kind === 'choice' ? 'The right label' : 'Reference'}
        mono
        rows={1}
        value={part.reference}
        onText={(reference) => set({ reference })}
      />
      <OptionFields part={part} path={path} set={(options) => set({ options: { ...part.options, ...options } })} />
      {part.kind === 'choice' ? null : <CreditFields part={part} path={path} set={set} />}
      <Checkbox
        name={`${path}.alwaysPerson`}
        label="Every answer of this part goes to a person"
        checked={part.alwaysPerson}
        onChange={(event) => set({ alwaysPerson: event.target.checked })}
      />
    </div>
  );
}
