'use client';

import { useEffect, useState } from 'react';
import { type AnswerKind, type SymbolTable } from '@/lib/checker/contract';
import { type Reading } from '@/lib/checker/reader';

/** What the reader is told about the answer it reads. */
export interface ReadingRequest {
  readonly kind: AnswerKind;
  readonly symbols: SymbolTable;
  readonly options?: {
    readonly choices?: readonly string[];
    readonly definitions?: Readonly<Record<string, string>>;
  };
}

/** The checker's reader, or something that answers like it. */
export type ReadAnswer = (text: string, request: ReadingRequest) => Reading;

/** A reading with the text it belongs to. */
export interface ReadingOf extends Reading {
  readonly text: string;
}

/** How long a text must rest before it is read, in milliseconds: a half-typed formula is not a fault yet. */
export const readingPause = { readable: 60, unreadable: 600 } as const;

/**
 * Reads a text as it is typed. A readable one is shown almost at once; that it is not readable is said only after a rest,
 * so that nobody is scolded in the middle of a formula. While both differ, `text` is that of the older reading.
 *
 * @returns the latest reading, or null for an empty text
 */
export function useReading(text: string, request: ReadingRequest, read: ReadAnswer): ReadingOf | null {
  const [reading, setReading] = useState<ReadingOf | null>(() =>
    text.trim() ? { ...read(text, request), text } : null,
  );
  const told = JSON.stringify(request);

  useEffect(() => {
    let rest: ReturnType<typeof setTimeout> | undefined;
    const soon = setTimeout(() => {
      if (!text.trim()) {
        setReading(null);
        return;
      }
      const next = { ...read(text, JSON.parse(told) as ReadingRequest), text };
      if (next.readable) setReading(next);
      else rest = setTimeout(() => setReading(next), readingPause.unreadable - readingPause.readable);
    }, readingPause.readable);
    return () => {
      clearTimeout(soon);
      clearTimeout(rest);
    };
  }, [text, told, read]);

  return text.trim() ? reading : null;
}
