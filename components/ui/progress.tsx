import { useId } from 'react';

export interface ProgressProps {
  readonly label: string;
  /** Done so far; left out while it is not known. */
  readonly value?: number;
  readonly max?: number;
  /** What is going on: "1,204 of 2,000 rows checked". */
  readonly detail?: string;
}

/** How far a piece of background work has come. */
export function Progress({ label, value, max = 1, detail }: ProgressProps) {
  const id = useId();
  return (
    <div>
      <p id={id} className="mb-1 flex flex-wrap justify-between gap-x-4 text-small">
        <span className="font-semibold">{label}</span>
        {detail ? <span className="text-grey">{detail}</span> : null}
      </p>
      <progress aria-labelledby={id} className="progress" value={value} max={max} />
    </div>
  );
}
