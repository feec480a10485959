import type { ReactNode } from 'react';

/** What is wrong with a form, by the name of the field; '' is the form as a whole. The shape of `HalfmarkError.fields`. */
export type FieldErrors = Readonly<Record<string, string>>;

export interface FieldFrameProps {
  readonly name: string;
  readonly label: ReactNode;
  /** What to type, below the label; never in a placeholder, which vanishes. */
  readonly hint?: ReactNode;
  /** What is wrong and what to do about it. */
  readonly error?: string;
  /** Says "optional" behind the label; every other field is required. */
  readonly optional?: boolean;
  /** When two fields of one page bear the same name. */
  readonly id?: string;
}

/** The id under which an error summary finds the field of that name. */
export function fieldId(name: string): string {
  return `field-${name}`;
}

/** The attributes that tie a control to its hint and its error. */
export function controlAttributes({ name, hint, error, optional, id = fieldId(name) }: FieldFrameProps) {
  const describedBy = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ');
  return {
    id,
    name,
    required: !optional,
    'aria-invalid': error ? (true as const) : undefined,
    'aria-describedby': describedBy || undefined,
  };
}

/** Label, hint and error around a control; the controls below use it. */
export function FieldFrame({
  name,
  label,
  hint,
  error,
  optional,
  id = fieldId(name),
  children,
}: FieldFrameProps & { children: ReactNode }) {
  return (
    <div className="max-w-form">
      <label htmlFor={id} className="mb-1 block text-small font-semibold">
        {label}
        {optional ? <span className="font-normal text-grey"> (optional)</span> : null}
      </label>
      {hint ? (
        <p id={`${id}-hint`} className="mb-1.5 text-small text-grey">
          {hint}
        </p>
      ) : null}
      {children}
      <FieldErrorLine id={id} error={error} />
    </div>
  );
}

/** The line below a control that says what is wrong. */
export function FieldErrorLine({ id, error }: { id: string; error?: string }) {
  return error ? (
    <p id={`${id}-error`} className="mt-1.5 text-small text-madder">
      <span className="font-semibold">Please mend: </span>
      {error}
    </p>
  ) : null;
}
