import type { InputHTMLAttributes, ReactNode, SelectHTMLAttributes, TextareaHTMLAttributes } from 'react';
import { controlAttributes, FieldErrorLine, FieldFrame, fieldId, type FieldFrameProps } from './field-frame';

type Own = keyof FieldFrameProps | 'required' | 'className';

export interface FieldProps extends FieldFrameProps, Omit<InputHTMLAttributes<HTMLInputElement>, Own> {
  /** Sets what is typed in the mono face. */
  readonly mono?: boolean;
}

/** A one-line input with its label, hint and error. */
export function Field({ name, label, hint, error, optional, id, mono, type = 'text', ...input }: FieldProps) {
  const frame = { name, label, hint, error, optional, id };
  return (
    <FieldFrame {...frame}>
      <input
        {...input}
        {...controlAttributes(frame)}
        type={type}
        className={mono ? 'control font-mono text-small' : 'control'}
      />
    </FieldFrame>
  );
}

export interface TextAreaProps extends FieldFrameProps, Omit<TextareaHTMLAttributes<HTMLTextAreaElement>, Own> {
  readonly mono?: boolean;
}

/** A text of several lines; it grows with what is typed. */
export function TextArea({ name, label, hint, error, optional, id, mono, rows = 3, ...area }: TextAreaProps) {
  const frame = { name, label, hint, error, optional, id };
  return (
    <FieldFrame {...frame}>
      <textarea
        {...area}
        {...controlAttributes(frame)}
        rows={rows}
        className={mono ? 'control font-mono text-small' : 'control'}
      />
    </FieldFrame>
  );
}

export interface SelectOption {
  readonly value: string;
  readonly label: string;
}

export interface SelectProps extends FieldFrameProps, Omit<SelectHTMLAttributes<HTMLSelectElement>, Own> {
  readonly options: readonly SelectOption[];
  /** The words of an empty first choice; without it the first option is chosen. */
  readonly empty?: string;
}

/** One choice of several, the browser's own control. */
export function Select({ name, label, hint, error, optional, id, options, empty, ...select }: SelectProps) {
  const frame = { name, label, hint, error, optional, id };
  return (
    <FieldFrame {...frame}>
      <select {...select} {...controlAttributes(frame)} className="control">
        {empty === undefined ? null : <option value="">{empty}</option>}
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </FieldFrame>
  );
}

export interface CheckboxProps extends Omit<InputHTMLAttributes<HTMLInputElement>, 'type' | 'className' | 'name'> {
  readonly name: string;
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  readonly error?: string;
  /** `radio` for one of several with the same name; give each its own id then. */
  readonly type?: 'checkbox' | 'radio';
}

/** A box to tick, or a radio button, with its words at the right. */
export function Checkbox({ name, label, hint, error, id = fieldId(name), type = 'checkbox', ...input }: CheckboxProps) {
  const attributes = controlAttributes({ name, label, hint, error, optional: true, id });
  return (
    <div className="max-w-form">
      <div className="grid grid-cols-[auto_1fr] items-baseline gap-x-2.5">
        <input
          {...attributes}
          required={false}
          {...input}
          type={type}
          className="h-[1.125rem] w-[1.125rem] translate-y-0.5 accent-blue"
        />
        <label htmlFor={id}>{label}</label>
        {hint ? (
          <p id={`${id}-hint`} className="col-start-2 text-small text-grey">
            {hint}
          </p>
        ) : null}
      </div>
      <FieldErrorLine id={id} error={error} />
    </div>
  );
}

/** A group of fields under one question, e.g. radio buttons. */
export function FieldGroup({ legend, hint, children }: { legend: ReactNode; hint?: ReactNode; children: ReactNode }) {
  return (
    <fieldset className="max-w-form">
      <legend className="mb-1 text-small font-semibold">{legend}</legend>
      {hint ? <p className="mb-1.5 text-small text-grey">{hint}</p> : null}
      <div className="grid gap-2">{children}</div>
    </fieldset>
  );
}
