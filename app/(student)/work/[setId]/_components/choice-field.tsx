import { type ReactNode } from 'react';

interface ChoiceFieldProps {
  readonly id: string;
  readonly name: string;
  readonly form: string;
  readonly label: string;
  readonly choices: readonly string[];
  /** The choices as they are shown, in the same order. */
  readonly shown: readonly ReactNode[];
  readonly defaultValue: string;
  readonly onTyped: (text: string) => void;
}

/** The answer field of a part that asks for one of several choices. */
export function ChoiceField({ id, name, form, label, choices, shown, defaultValue, onTyped }: ChoiceFieldProps) {
  return (
    <fieldset className="grid gap-2">
      <legend className="sr-only">{label}</legend>
      {choices.map((choice, index) => (
        <label key={choice} htmlFor={`${id}-${index}`} className="grid grid-cols-[auto_1fr] items-baseline gap-x-2.5">
          <input
            id={`${id}-${index}`}
            type="radio"
            name={name}
            form={form}
            value={choice}
            defaultChecked={choice === defaultValue}
            onChange={() => onTyped(choice)}
            className="h-[1.125rem] w-[1.125rem] translate-y-0.5 accent-blue"
          />
          <span>{shown[index] ?? choice}</span>
        </label>
      ))}
    </fieldset>
  );
}
