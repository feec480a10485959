'use client';

import { type ReactNode, useEffect, useRef, useState } from 'react';
import { fieldId } from '@/components/ui/field-frame';
import { read as readAnswer } from '@/lib/checker/reader';
import { ReadBack } from './read-back';
import { type ReadAnswer, type ReadingOf, type ReadingRequest, useReading } from './use-reading';

export interface AnswerFieldProps extends Omit<ReadingRequest, 'symbols'> {
  /** Declared symbols; none where left out. */
  readonly symbols?: ReadingRequest['symbols'];
  readonly name: string;
  /** When two fields of one page bear the same name. */
  readonly id?: string;
  /** The form it belongs to, where it does not stand inside it. */
  readonly form?: string;
  /** Names the field: "Answer to part a". It is read out; the prompt beside the letter is what is seen. */
  readonly label: string;
  /** Below the field, in words. It never gives the form of the answer away. */
  readonly hint?: ReactNode;
  readonly defaultValue?: string;
  readonly disabled?: boolean;
  /** Stands below an empty field; null for nothing, where several fields of a page would say the same. */
  readonly empty?: string | null;
  /** Told whenever the reading changes; null for an empty field. */
  readonly onReading?: (reading: ReadingOf | null) => void;
  readonly onTyped?: (text: string) => void;
  /** In place of the checker's reader; must be the same function at every render. */
  readonly read?: ReadAnswer;
}

/** How long a reading rests before it is announced, so that a screen reader is not interrupted at every key. */
const announcePause = 900;

/**
 * Where a student types an answer and sees at once how it is read: typeset as typed, never evaluated, or where it stops
 * being readable. Spelling aids of the browser are off, because they would change what was typed.
 */
export function AnswerField({
  name,
  id = fieldId(name),
  form,
  label,
  hint,
  defaultValue = '',
  disabled,
  empty = 'What you type is shown back here as it is read.',
  onReading,
  onTyped,
  read = readAnswer,
  kind,
  symbols = {},
  options,
}: AnswerFieldProps) {
  const [text, setText] = useState(defaultValue);
  const reading = useReading(text, { kind, symbols, options }, read);
  const spoken = useAnnouncement(reading);

  const tell = useRef(onReading);
  useEffect(() => {
    tell.current = onReading;
  });
  useEffect(() => tell.current?.(reading), [reading]);

  const stale = reading !== null && reading.text !== text;
  const unreadable = reading !== null && !reading.readable && !stale;
  return (
    <div>
      <label htmlFor={id} className="sr-only">
        {label}
      </label>
      <textarea
        id={id}
        name={name}
        form={form}
        rows={1}
        value={text}
        disabled={disabled}
        onChange={(event) => {
          setText(event.target.value);
          onTyped?.(event.target.value);
        }}
        aria-describedby={`${hint ? `${id}-hint ` : ''}${id}-reading`}
        aria-invalid={unreadable || undefined}
        spellCheck={false}
        autoComplete="off"
        autoCapitalize="off"
        autoCorrect="off"
        className="control answer font-mono text-small"
      />
      {hint ? (
        <p id={`${id}-hint`} className="mt-1 text-note text-grey">
          {hint}
        </p>
      ) : null}
      <ReadBack reading={reading} stale={stale} empty={empty ?? undefined} />
      <p id={`${id}-reading`} role="status" aria-live="polite" className="sr-only">
        {spoken}
      </p>
    </div>
  );
}

/** The words for a screen reader, once the reading has rested. */
function useAnnouncement(reading: ReadingOf | null): string {
  const [spoken, setSpoken] = useState('');
  useEffect(() => {
    const timer = setTimeout(() => setSpoken(wordsFor(reading)), announcePause);
    return () => clearTimeout(timer);
  }, [reading]);
  return spoken;
}

function wordsFor(reading: ReadingOf | null): string {
  if (!reading) return '';
  const remarks = reading.diagnostics.map(({ message, hint }) => (hint ? `${message} ${hint}` : message)).join(' ');
  if (!reading.readable) return `Not readable. ${remarks}`;
  return `Read as: ${reading.plain}${remarks ? `. Two ways to read this. ${remarks}` : ''}`;
}
