'use client';

import type { ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { Field, TextArea, type FieldProps, type TextAreaProps } from '@/components/ui/fields';
import { useProblem } from './problem-context';

interface DraftFieldProps {
  /** The place of the field in the draft, such as `parts.0.reference`. */
  readonly path: string;
  readonly value: string;
  readonly onText: (text: string) => void;
}

/** One line of the draft, with what is wrong at its place. */
export function DraftField({
  path,
  value,
  onText,
  ...field
}: DraftFieldProps & Omit<FieldProps, 'name' | 'error' | 'onChange' | 'value'>) {
  const error = useProblem(path, value);
  return (
    <Field
      {...field}
      name={path}
      value={value}
      error={error}
      onChange={(event) => onText(event.target.value)}
      autoComplete="off"
      spellCheck={field.mono ? false : undefined}
    />
  );
}

/** Several lines of the draft, with what is wrong at their place. */
export function DraftArea({
  path,
  value,
  onText,
  ...area
}: DraftFieldProps & Omit<TextAreaProps, 'name' | 'error' | 'onChange' | 'value'>) {
  const error = useProblem(path, value);
  return (
    <TextArea
      {...area}
      name={path}
      value={value}
      error={error}
      onChange={(event) => onText(event.target.value)}
      spellCheck={area.mono ? false : undefined}
    />
  );
}

/** A headed group of the source. */
export function SourceGroup({ title, hint, children }: { title: string; hint?: ReactNode; children: ReactNode }) {
  return (
    <section aria-label={title} className="grid gap-4">
      <div>
        <h2>{title}</h2>
        {hint ? <p className="mt-1 max-w-form text-small text-grey">{hint}</p> : null}
      </div>
      {children}
    </section>
  );
}

/** One entry of a list in the source, with its own way out. */
export function Entry({
  label,
  onRemove,
  removeWords,
  children,
}: {
  label: string;
  onRemove: () => void;
  removeWords: string;
  children: ReactNode;
}) {
  return (
    <div
      role="group"
      aria-label={label}
      className="grid grid-cols-[minmax(0,1fr)_auto] items-start gap-x-4 border-l border-hairline pl-4"
    >
      <div className="grid min-w-0 gap-3">{children}</div>
      <Button look="plain" onClick={onRemove} aria-label={removeWords} className="text-small">
        Remove
      </Button>
    </div>
  );
}

/** The list with one entry changed. */
export function replaced<Item>(list: readonly Item[], index: number, next: Partial<Item>): Item[] {
  return list.map((item, at) => (at === index ? { ...item, ...next } : item));
}

/** The list without one entry. */
export function without<Item>(list: readonly Item[], index: number): Item[] {
  return list.filter((_item, at) => at !== index);
}
