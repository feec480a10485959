'use client';

import { Button } from '@/components/ui/button';
import { Select } from '@/components/ui/fields';
import { type TemplateDraft } from '@/lib/templates/draft';
import { DraftField, Entry, replaced, SourceGroup, without } from './draft-fields';

type DraftSymbol = TemplateDraft['symbols'][number];

interface SymbolFieldsProps {
  readonly symbols: readonly DraftSymbol[];
  readonly change: (symbols: DraftSymbol[]) => void;
}

const domains: { value: DraftSymbol['domain']; label: string }[] = [
  { value: 'real', label: 'real' },
  { value: 'positive', label: 'positive' },
  { value: 'nonnegative', label: 'not negative' },
  { value: 'nonzero', label: 'not zero' },
  { value: 'integer', label: 'a whole number' },
  { value: 'complex', label: 'complex' },
  { value: 'between', label: 'between two values' },
];

/** Symbols that stay symbols, each with its domain. */
export function SymbolFields({ symbols, change }: SymbolFieldsProps) {
  return (
    <SourceGroup title="Symbols" hint="What stays a letter in question and answer. ħ, π and i are known.">
      {symbols.map((symbol, index) => {
        const set = (next: Partial<DraftSymbol>) => change(replaced(symbols, index, next));
        const path = `symbols.${index}`;
        const called = symbol.name || `symbol ${index + 1}`;
        return (
          <Entry
            key={index}
            label={`Symbol ${called}`}
            removeWords={`Remove ${called}`}
            onRemove={() => change(without(symbols, index))}
          >
            <div className="grid grid-cols-2 items-end gap-3">
              <DraftField
                path={`${path}.name`}
                label="Name"
                mono
                value={symbol.name}
                onText={(name) => set({ name })}
              />
              <Select
                name={`${path}.domain`}
                label="Is"
                options={domains}
                value={symbol.domain}
                onChange={(event) => {
                  const domain = domains.find(({ value }) => value === event.target.value)?.value;
                  if (domain) set({ domain });
                }}
              />
              {symbol.domain === 'between' ? (
                <>
                  <DraftField
                    path={`${path}.from`}
                    label="From"
                    mono
                    value={symbol.from}
                    onText={(from) => set({ from })}
                  />
                  <DraftField path={`${path}.to`} label="To" mono value={symbol.to} onText={(to) => set({ to })} />
                </>
              ) : null}
            </div>
          </Entry>
        );
      })}
      <div>
        <Button look="plain" onClick={() => change([...symbols, { name: '', domain: 'real', from: '', to: '' }])}>
          Add a symbol
        </Button>
      </div>
    </SourceGroup>
  );
}
