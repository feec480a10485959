'use client';

import { type KeyboardEvent, useEffect, useRef, useState } from 'react';
import { commentBoxId } from './credit-fields';
import { type QuickCredit } from './quick-credits';

interface MarkingKeys {
  readonly quick: readonly QuickCredit[];
  readonly onCredit: (credit: string) => void;
  /** Further letters and what they do. */
  readonly letters?: Readonly<Record<string, () => void>>;
}

/**
 * The keys of a marking page. They act while the focus is on the page itself, never while one writes: digits give a
 * credit, Enter sends the form, C goes to the comment; Escape leaves a field and Ctrl+Enter sends from within it.
 */
export function useMarkingKeys({ quick, onCredit, letters = {} }: MarkingKeys) {
  const region = useRef<HTMLDivElement>(null);
  const form = useRef<HTMLFormElement>(null);
  useEffect(() => region.current?.focus({ preventScroll: true }), []);

  const onKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    if (event.defaultPrevented || event.altKey) return;
    if (event.key === 'Enter' && (event.ctrlKey || event.metaKey)) {
      event.preventDefault();
      form.current?.requestSubmit();
      return;
    }
    if (event.ctrlKey || event.metaKey) return;
    if (isWriting(event.target)) {
      if (event.key === 'Escape') region.current?.focus();
      return;
    }
    const credit = quick.find(({ key }) => key === event.key);
    const letter = letters[event.key.toLowerCase()];
    if (credit) onCredit(credit.words);
    else if (event.key === 'Enter' && event.target === region.current) form.current?.requestSubmit();
    else if (event.key.toLowerCase() === 'c') document.getElementById(commentBoxId)?.focus();
    else if (letter) letter();
    else return;
    event.preventDefault();
  };
  return { region, form, onKeyDown };
}

function isWriting(target: EventTarget): boolean {
  return (
    target instanceof HTMLInputElement || target instanceof HTMLTextAreaElement || target instanceof HTMLSelectElement
  );
}

/** How long this page has been looked at, in milliseconds: time in the background does not count. */
export function useTimeSpent(): () => number {
  const spent = useRef(0);
  const since = useRef<number | null>(null);
  useEffect(() => {
    const follow = () => {
      const now = performance.now();
      if (since.current !== null) spent.current += now - since.current;
      since.current = document.visibilityState === 'visible' ? now : null;
    };
    follow();
    document.addEventListener('visibilitychange', follow);
    return () => document.removeEventListener('visibilitychange', follow);
  }, []);
  return () => Math.round(spent.current + (since.current === null ? 0 : performance.now() - since.current));
}

/** What is typed at a desk, kept in this tab under a name so that a lost hold or a reload loses nothing. */
export function useKeptText(name: string, initial: string) {
  const [text, setText] = useState(initial);
  useEffect(() => {
    const kept = sessionStorage.getItem(name);
    if (kept !== null) setText(kept);
  }, [name]);
  const set = (next: string) => {
    setText(next);
    sessionStorage.setItem(name, next);
  };
  return [text, set] as const;
}
