'use client';

import { Button } from '@/components/ui/button';
import { Select } from '@/components/ui/fields';
import { type DraftPart } from '@/lib/templates/draft';
import { DraftArea, DraftField, Entry, replaced, without } from './draft-fields';
import { ShareField } from './share-field';
import { useSlips } from './slip-words';

interface CreditFieldsProps {
  readonly part: DraftPart;
  readonly path: string;
  readonly set: (next: Partial<DraftPart>) => void;
}

/** Part credit: for slips of the catalogue, and for wrong answers that the author expects. */
export function CreditFields({ part, path, set }: CreditFieldsProps) {
  const slips = useSlips();
  const free = slips.filter(({ id }) => part.slips.every((given) => given.slip !== id));
  const first = free[0];
  return (
    <details open={part.slips.length + part.expected.length > 0}>
      <summary className="text-small font-semibold">
        Part credit
        <span className="font-normal text-grey"> · {summaryOf(part)}</span>
      </summary>
      <div className="mt-3 grid gap-4">
        {part.slips.map((given, index) => (
          <Entry
            key={given.slip}
            label={`Slip ${given.slip}`}
            removeWords={`Give ${given.slip} no credit`}
            onRemove={() => set({ slips: without(part.slips, index) })}
          >
            <div className="grid items-end gap-3 sm:grid-cols-[1fr_11rem]">
              <Select
                name={`${path}.slips.${index}.slip`}
                label="Slip"
                hint={slips.find(({ id }) => id === given.slip)?.sentence}
                options={slips
                  .filter(({ id }) => id === given.slip || free.some((other) => other.id === id))
                  .map(({ id }) => ({ value: id, label: id }))}
                value={given.slip}
                onChange={(event) => set({ slips: replaced(part.slips, index, { slip: event.target.value }) })}
              />
              <ShareField
                name={`${path}.slips.${index}.share`}
                share={given.share}
                onShare={(share) => set({ slips: replaced(part.slips, index, { share }) })}
              />
            </div>
          </Entry>
        ))}
        {part.expected.map((wrong, index) => (
          <Entry
            key={index}
            label={`Expected wrong answer ${wrong.id || index + 1}`}
            removeWords={`Remove the expected answer ${wrong.id || index + 1}`}
            onRemove={() => set({ expected: without(part.expected, index) })}
          >
            <div className="grid items-end gap-3 sm:grid-cols-[1fr_11rem]">
              <DraftField
                path={`${path}.expected.${index}.id`}
                label="Expected wrong answer"
                hint="A short name, such as forgot-factor"
                mono
                value={wrong.id}
                onText={(id) => set({ expected: replaced(part.expected, index, { id }) })}
              />
              <ShareField
                name={`${path}.expected.${index}.share`}
                share={wrong.share}
                onShare={(share) => set({ expected: replaced(part.expected, index, { share }) })}
              />
            </div>
            <DraftArea
              path={`${path}.expected.${index}.expression`}
              label="As an expression"
              mono
              rows={1}
              value={wrong.expression}
              onText={(expression) => set({ expected: replaced(part.expected, index, { expression }) })}
            />
            <DraftField
              path={`${path}.expected.${index}.sentence`}
              label="What the student is told"
              optional
              value={wrong.sentence}
              onText={(sentence) => set({ expected: replaced(part.expected, index, { sentence }) })}
            />
          </Entry>
        ))}
        <div className="flex flex-wrap gap-x-5 gap-y-1 text-small">
          {first ? (
            <Button look="plain" onClick={() => set({ slips: [...part.slips, { slip: first.id, share: 500 }] })}>
              Credit a slip
            </Button>
          ) : null}
          <Button
            look="plain"
            onClick={() =>
              set({ expected: [...part.expected, { id: '', expression: '', share: 'person', sentence: '' }] })
            }
          >
            Expect a wrong answer
          </Button>
        </div>
      </div>
    </details>
  );
}

function summaryOf(part: DraftPart): string {
  const counts = [
    part.slips.length > 0 && `${part.slips.length} ${part.slips.length === 1 ? 'slip' : 'slips'}`,
    part.expected.length > 0 && `${part.expected.length} expected ${part.expected.length === 1 ? 'answer' : 'answers'}`,
  ].filter((words) => words !== false);
  return counts.length === 0 ? 'all or nothing' : counts.join(', ');
}
