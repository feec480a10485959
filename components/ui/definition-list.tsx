import type { ReactNode } from 'react';

export interface Definition {
  readonly term: string;
  readonly value: ReactNode;
}

/** Terms and what they are: term at the left, value at the right, in a body or a margin. */
export function DefinitionList({ items }: { items: readonly Definition[] }) {
  return (
    <dl className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 gap-y-1 text-small">
      {items.map((item) => (
        <div key={item.term} className="col-span-2 grid grid-cols-subgrid">
          <dt className="text-grey">{item.term}</dt>
          <dd>{item.value}</dd>
        </div>
      ))}
    </dl>
  );
}
