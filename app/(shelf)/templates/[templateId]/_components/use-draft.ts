'use client';

import { useCallback, useEffect, useRef, useState } from 'react';
import { type TemplateDraft } from '@/lib/templates/draft';
import { saveDraft } from '../actions';
import { type RenderedPreview } from './render-preview';

/** How long typing must rest before the draft is sent, in milliseconds. */
const PAUSE = 400;
/** How long after a failure the draft is sent again. */
const RETRY = 4_000;

export type DraftStatus =
  | { is: 'saved' }
  | { is: 'unsaved' | 'saving' }
  | { is: 'failed'; message: string }
  | { is: 'conflict'; message: string };

/** What a draft is made of: the question itself, and the topics it is found under. */
export type Sheet = { draft: TemplateDraft; topics: string[] };

export interface DraftState extends Sheet {
  readonly revision: number;
  readonly status: DraftStatus;
  /** What the draft makes; null until the server has worked the first one out. */
  readonly preview: RenderedPreview | null;
  /** Changes the question; it is kept at the next rest. */
  readonly change: (next: Partial<TemplateDraft>) => void;
  readonly changeTopics: (topics: string[]) => void;
}

/**
 * Keeps a draft as it is typed. What is not on the server yet is in the browser's own store, so that a reload loses
 * nothing; a change made elsewhere meanwhile stops the saving and is told, and nothing is overwritten.
 */
export function useDraft(
  templateId: string,
  initial: Sheet & { revision: number; preview: Promise<RenderedPreview> },
): DraftState {
  const [sheet, setSheet] = useState<Sheet>({ draft: initial.draft, topics: initial.topics });
  const [revision, setRevision] = useState(initial.revision);
  const [status, setStatus] = useState<DraftStatus>({ is: 'saved' });
  const [preview, setPreview] = useState<RenderedPreview | null>(null);
  const firstPreview = initial.preview;
  const latest = useRef<Sheet>(sheet);
  const sending = useRef(false);
  const known = useRef(initial.revision);
  const key = `halfmark template ${templateId}`;

  const send = useCallback(async () => {
    if (sending.current) return;
    sending.current = true;
    setStatus({ is: 'saving' });
    const sent = latest.current;
    const result = await saveDraft({ templateId, revision: known.current, ...sent }).catch(() => null);
    sending.current = false;
    if (result?.ok) {
      known.current = result.value.revision;
      setRevision(result.value.revision);
      setPreview(result.value.preview);
      const isLatest = sent === latest.current;
      if (isLatest) forget(key);
      setStatus({ is: isLatest ? 'saved' : 'unsaved' });
    } else if (result?.code === 'conflict') {
      setStatus({ is: 'conflict', message: result.message });
    } else {
      setStatus({ is: 'failed', message: result?.message ?? 'Halfmark cannot be reached.' });
    }
  }, [key, templateId]);

  useEffect(() => {
    if (status.is !== 'unsaved' && status.is !== 'failed') return;
    const timer = setTimeout(() => void send(), status.is === 'failed' ? RETRY : PAUSE);
    return () => clearTimeout(timer);
  }, [sheet, status.is, send]);

  useEffect(() => {
    // A draft saved meanwhile has brought a later one.
    void firstPreview.then((first) => setPreview((present) => present ?? first));
  }, [firstPreview]);

  useEffect(() => {
    const kept = recall(key);
    if (kept?.revision !== known.current) return;
    latest.current = kept.sheet;
    // eslint's rule against setting state in an effect does not know a store outside React: it is read once.
    queueMicrotask(() => {
      setSheet(kept.sheet);
      setStatus({ is: 'unsaved' });
    });
  }, [key]);

  const put = useCallback(
    (next: Sheet) => {
      latest.current = next;
      keep(key, { revision: known.current, sheet: next });
      setSheet(next);
      setStatus((before) => (before.is === 'conflict' ? before : { is: 'unsaved' }));
    },
    [key],
  );

  return {
    ...sheet,
    revision,
    status,
    preview,
    change: useCallback((next) => put({ ...latest.current, draft: { ...latest.current.draft, ...next } }), [put]),
    changeTopics: useCallback((topics) => put({ ...latest.current, topics }), [put]),
  };
}

type Kept = { revision: number; sheet: Sheet };

/** The browser may refuse its store (private windows, no room): the draft is then only on the page and the server. */
function keep(key: string, kept: Kept): void {
  try {
    localStorage.setItem(key, JSON.stringify(kept));
  } catch {
    return;
  }
}

function forget(key: string): void {
  try {
    localStorage.removeItem(key);
  } catch {
    return;
  }
}

function recall(key: string): Kept | null {
  try {
    const text = localStorage.getItem(key);
    return text === null ? null : (JSON.parse(text) as Kept);
  } catch {
    return null;
  }
}
