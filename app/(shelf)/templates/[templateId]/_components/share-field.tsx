'use client';

import { useState } from 'react';
import { Field } from '@/components/ui/fields';

export type Share = number | 'person';

interface ShareFieldProps {
  readonly name: string;
  /** Thousandths of the part's credit, or that a person decides. */
  readonly share: Share;
  readonly onShare: (share: Share) => void;
}

/** How much of the part's credit, in per cent; left empty, a person decides. */
export function ShareField({ name, share, onShare }: ShareFieldProps) {
  const [typed, setTyped] = useState(share === 'person' ? '' : String(share / 10));
  const read = readShare(typed);
  return (
    <Field
      name={name}
      label="Credit, %"
      hint="Empty: a person"
      optional
      inputMode="decimal"
      value={typed}
      error={read === null ? 'Write 0 to 100, or nothing.' : undefined}
      onChange={(event) => {
        setTyped(event.target.value);
        const next = readShare(event.target.value);
        if (next !== null) onShare(next);
      }}
      autoComplete="off"
    />
  );
}

function readShare(typed: string): Share | null {
  if (typed.trim() === '') return 'person';
  if (!/^\s*\d{1,3}(\.\d)?\s*$/.test(typed)) return null;
  const thousandths = Math.round(Number(typed) * 10);
  return thousandths <= 1000 ? thousandths : null;
}
