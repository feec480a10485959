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
    <SourceGroup title="Drawn values" hint="Each student gets their own, and keeps them.">
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
              <div className="grid max-w-form grid-cols-3 gap-3">
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
                <div className="col-span-3">
                  <DraftField
                    path={`${path}.except`}
                    label="Except"
                    optional
                    mono
                    hint="Whole numbers left out, between commas."
                    value={parameter.except}
                    onText={(except) => set({ except })}
                  />
                </div>
              </div>
            ) : (
              <div className="grid max-w-form gap-3">
                <DraftField
                  path={`${path}.name`}
                  label="Name"
                  mono
                  value={parameter.name}
                  onText={(name) => set({ name })}
                />
                <DraftArea
                  path={`${path}.values`}
                  label="One of"
                  hint="One value a line, in the answer language: numbers, operators or states."
                  mono
                  rows={3}
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
