'use client';

import { Checkbox, FieldGroup, Select } from '@/components/ui/fields';
import { optionsOfKind } from '@/lib/templates/blank-draft';
import { type DraftPart } from '@/lib/templates/draft';
import { DraftArea, DraftField } from './draft-fields';

type Options = DraftPart['options'];

interface OptionFieldsProps {
  readonly part: DraftPart;
  readonly path: string;
  readonly set: (options: Partial<Options>) => void;
}

const ticks = {
  upToPhase: 'up to a phase factor',
  upToScale: 'up to any factor',
  requireNormalised: 'the norm must be 1',
} as const;

const tolerances: { value: Options['toleranceKind']; label: string }[] = [
  { value: 'none', label: 'exactly' },
  { value: 'significantFigures', label: 'to significant figures' },
  { value: 'relative', label: 'within a relative error' },
  { value: 'absolute', label: 'within an absolute error' },
];

/** What counts as agreeing, as far as the kind of answer leaves a choice. */
export function OptionFields({ part, path, set }: OptionFieldsProps) {
  const { options, kind } = part;
  const offered = optionsOfKind[kind];
  const boxes = (Object.keys(ticks) as (keyof typeof ticks)[]).filter((option) => offered.includes(option));
  return (
    <>
      {boxes.length > 0 || offered.includes('answerForm') ? (
        <FieldGroup legend="It agrees">
          {boxes.map((option) => (
            <Checkbox
              key={option}
              name={`${path}.options.${option}`}
              label={ticks[option]}
              checked={options[option]}
              onChange={(event) => set({ [option]: event.target.checked })}
            />
          ))}
          {offered.includes('answerForm') ? (
            <Checkbox
              name={`${path}.options.answerForm`}
              label="also with a commutator, bracket or exponential left standing"
              checked={options.answerForm === 'any'}
              onChange={(event) => set({ answerForm: event.target.checked ? 'any' : 'evaluated' })}
            />
          ) : null}
        </FieldGroup>
      ) : null}
      {offered.includes('toleranceKind') ? (
        <div className="grid max-w-form grid-cols-[1fr_9rem] gap-3">
          <Select
            name={`${path}.options.toleranceKind`}
            label="It agrees"
            options={tolerances}
            value={options.toleranceKind}
            onChange={(event) => {
              const chosen = tolerances.find(({ value }) => value === event.target.value);
              if (chosen) set({ toleranceKind: chosen.value });
            }}
          />
          {options.toleranceKind === 'none' ? null : (
            <DraftField
              path={`${path}.options.tolerance`}
              label={options.toleranceKind === 'significantFigures' ? 'Figures' : 'Error'}
              mono
              inputMode="decimal"
              value={options.tolerance}
              onText={(tolerance) => set({ tolerance })}
            />
          )}
        </div>
      ) : null}
      {offered.includes('choices') ? (
        <DraftArea
          path={`${path}.options.choices`}
          label="Labels to choose from"
          hint="One a line."
          rows={3}
          value={options.choices}
          onText={(choices) => set({ choices })}
        />
      ) : null}
    </>
  );
}
