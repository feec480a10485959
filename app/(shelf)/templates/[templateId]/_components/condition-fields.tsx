'use client';

import { Button } from '@/components/ui/button';
import { DraftField, Entry, SourceGroup, without } from './draft-fields';

interface ConditionFieldsProps {
  readonly constraints: readonly string[];
  readonly change: (constraints: string[]) => void;
}

/** Conditions that every draw satisfies. */
export function ConditionFields({ constraints, change }: ConditionFieldsProps) {
  return (
    <SourceGroup
      title="Conditions"
      hint={
        <>
          Between drawn values, with <code>= != &lt; &lt;= &gt; &gt;= and or not</code>. A draw that breaks one is drawn
          again.
        </>
      }
    >
      {constraints.map((constraint, index) => (
        <Entry
          key={index}
          label={`Condition ${index + 1}`}
          removeWords={`Remove condition ${index + 1}`}
          onRemove={() => change(without(constraints, index))}
        >
          <DraftField
            path={`constraints.${index}`}
            label={`Condition ${index + 1}`}
            mono
            value={constraint}
            onText={(text) => change(constraints.map((other, at) => (at === index ? text : other)))}
          />
        </Entry>
      ))}
      <div>
        <Button look="plain" onClick={() => change([...constraints, ''])}>
          Add a condition
        </Button>
      </div>
    </SourceGroup>
  );
}
