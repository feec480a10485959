'use client';

import { useEffect, useRef } from 'react';
import { fieldId, type FieldErrors } from './field-frame';

export interface FormErrorSummaryProps {
  /** By the name of the field; the first key is listed first. */
  readonly errors: FieldErrors | undefined;
  readonly title?: string;
}

/** What a form could not accept, above its fields, each line leading to its field. It takes the focus when it appears. */
export function FormErrorSummary({ errors, title = 'Nothing was saved yet' }: FormErrorSummaryProps) {
  const box = useRef<HTMLDivElement>(null);
  const lines = Object.entries(errors ?? {});
  useEffect(() => {
    if (errors && Object.keys(errors).length > 0) box.current?.focus();
  }, [errors]);
  if (lines.length === 0) return null;
  return (
    <div
      ref={box}
      role="alert"
      tabIndex={-1}
      className="max-w-form border-l-4 border-madder bg-wash px-4 py-3 text-small"
    >
      <p className="font-semibold">{title}</p>
      <ul className="mt-1 grid gap-1">
        {lines.map(([field, message]) => (
          <li key={field}>{field ? <a href={`#${fieldId(field)}`}>{message}</a> : message}</li>
        ))}
      </ul>
    </div>
  );
}
