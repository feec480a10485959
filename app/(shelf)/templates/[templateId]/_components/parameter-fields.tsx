'use client';

import { Button } from '@/components/ui/button';
import { emptyParameter } from '@/lib/templates/blank-draft';
import { type DraftParameter } from '@/lib/templates/draft';
import { DraftArea, DraftField, Entry, replaced, SourceGroup, without } from './draft-fields';

interface ParameterFieldsProps {
  readonly parameters: readonly DraftParameter[];
  readonly change: (parameters: DraftParameter[]) => void;
}

/** What is drawn for each student, and from where. */
export function ParameterFields({ parameters, change }: ParameterFieldsProps) {
  const add = (type: DraftParameter['type']) => change([...parameters, emptyParameter(type)]);
  return (
    <SourceGroup
      title="Drawn values"
      hint="Each student gets their own, and keeps them. A whole number is drawn from a range; a choice from values in the answer language: numbers, operators or states."
    >
      {parameters.map((parameter, index) => {
        const set = (next: Partial<DraftParameter>) => change(replaced(parameters, index, next));
        const path = `parameters.${index}`;
        const called = parameter.name || `value ${index + 1}`;
        return (
          <Entry
            key={index}
            label={`Drawn value ${called}`}
            removeWords={`Remove ${called}`}
            onRemove={() => change(without(parameters, index))}
          >
            {parameter.type === 'integer' ? (
              <div className="grid grid-cols-3 items-end gap-3 sm:grid-cols-[1.2fr_1fr_1fr_1.6fr]">
                <DraftField
                  path={`${path}.name`}
                  label="Name"
                  mono
                  value={parameter.name}
                  onText={(name) => set({ name })}
                />
                <DraftField
                  path={`${path}.from`}
                  label="From"
                  mono
                  inputMode="numeric"
                  value={parameter.from}
                  onText={(from) => set({ from })}
                />
                <DraftField
                  path={`${path}.to`}
                  label="To"
                  mono
                  inputMode="numeric"
                  value={parameter.to}
                  onText={(to) => set({ to })}
                />
                <div className="col-span-3 sm:col-span-1">
                  <DraftField
                    path={`${path}.except`}
                    label="Except"
                    mono
                    placeholder="none"
                    value={parameter.except}
                    onText={(except) => set({ except })}
                  />
                </div>
              </div>
            ) : (
              <div className="grid items-start gap-3 sm:grid-cols-[1.2fr_3.6fr]">
                <DraftField
                  path={`${path}.name`}
                  label="Name"
                  mono
                  value={parameter.name}
                  onText={(name) => set({ name })}
                />
                <DraftArea
                  path={`${path}.values`}
                  label="One of, a line each"
                  mono
                  rows={2}
                  value={parameter.values}
                  onText={(values) => set({ values })}
                />
              </div>
            )}
          </Entry>
        );
      })}
      <div className="flex flex-wrap gap-x-5 gap-y-1">
        <Button look="plain" onClick={() => add('integer')}>
          Add a whole number
        </Button>
        <Button look="plain" onClick={() => add('choice')}>
          Add a choice
        </Button>
      </div>
    </SourceGroup>
  );
}
