'use client';

import { useRouter } from 'next/navigation';
import { useState, useTransition } from 'react';
import { type ActionResult } from '@/app/_server/action-result';
import { useToast } from '@/components/ui/toast';
import { type HandInResult } from '@/lib/services/hand-in-answers';
import { handIn } from '../actions';
import { type DraftKeeper } from './draft-keeper';
import { type Press } from './hand-in-form';
import { forgetHandIn, keyForHandIn, type SentAnswer } from './hand-in-memory';

/** What became of the last press of a question: nothing yet, a question back, or a refusal. */
export type HandInNews =
  | {
      readonly kind: 'ask';
      readonly part: string;
      readonly unreadable: readonly { partKey: string; message: string }[];
    }
  | { readonly kind: 'refused'; readonly part: string; readonly message: string; readonly isSignedOut: boolean };

const lost =
  'The connection was lost before an answer came. What you typed is kept in this browser. Press again when you are back: it will be stored once.';

/** Hands in answers of one question and tells what became of it. While one is on its way, a second press does nothing. */
export function useHandIn(drawId: string, keeper: DraftKeeper) {
  const [pressed, setPressed] = useState<string | null>(null);
  const [news, setNews] = useState<HandInNews | null>(null);
  const [refreshing, startRefresh] = useTransition();
  const toast = useToast();
  const router = useRouter();

  async function press({ part, confirmUnreadable }: Press, answers: readonly SentAnswer[]): Promise<void> {
    if (pressed !== null || refreshing) return;
    setPressed(part);
    setNews(null);
    const clientKey = keyForHandIn(localStorage, drawId, answers);
    const result = await reach({ drawId, answers, clientKey, confirmUnreadable });
    setPressed(null);
    if (result === null) {
      setNews({ kind: 'refused', part, message: lost, isSignedOut: false });
      return;
    }
    if (!result.ok) {
      setNews({ kind: 'refused', part, message: result.message, isSignedOut: result.code === 'signed-out' });
      return;
    }
    forgetHandIn(localStorage, drawId);
    if (result.value.kind === 'ask') {
      setNews({ kind: 'ask', part, unreadable: result.value.unreadable });
      return;
    }
    for (const { partKey, text, revision } of result.value.parts) keeper.handedIn({ drawId, partKey }, text, revision);
    toast(wordsFor(result.value));
    startRefresh(() => router.refresh());
  }

  return { press, pressed, isBusy: pressed !== null || refreshing, news, clearNews: () => setNews(null) };
}

/** Null where the server could not be reached or gave no answer of ours. */
async function reach(input: Parameters<typeof handIn>[0]): Promise<ActionResult<HandInResult> | null> {
  try {
    return await handIn(input);
  } catch {
    return null;
  }
}

function wordsFor({ parts }: Extract<HandInResult, { kind: 'handed-in' }>): string {
  const receipts = [...new Set(parts.map(({ receipt }) => receipt))];
  const which =
    parts.length === 1 ? `Part ${parts[0]?.partKey ?? ''}` : `Parts ${parts.map(({ partKey }) => partKey).join(', ')}`;
  return `${which} submitted. Receipt ${receipts.join(', ')}.`;
}
