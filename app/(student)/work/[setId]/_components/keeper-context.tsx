'use client';

import { useRouter } from 'next/navigation';
import { createContext, type ReactNode, useContext, useEffect, useState, useSyncExternalStore } from 'react';
import { type Draft, DraftKeeper, type PartRef } from './draft-keeper';
import { keepByFetch } from './keep-by-fetch';

type KeptPart = PartRef & { readonly text: string; readonly revision: number };

const KeeperContext = createContext<DraftKeeper | null>(null);

/**
 * Keeps the drafts of a page: around the running head, which tells when something was saved, and the questions. When the
 * closing time comes the page is loaded anew, and is read-only then.
 */
export function KeeperProvider({
  parts,
  closesAt,
  children,
}: {
  parts: readonly KeptPart[];
  closesAt: string | null;
  children: ReactNode;
}) {
  const [keeper] = useState(
    () =>
      new DraftKeeper(
        { send: keepByFetch, memory: typeof localStorage === 'undefined' ? noMemory : localStorage, now: Date.now },
        parts,
      ),
  );
  useEffect(() => {
    keeper.recover();
    return keepWhileOpen(keeper);
  }, [keeper]);
  useRefreshAt(closesAt);
  return <KeeperContext value={keeper}>{children}</KeeperContext>;
}

const noMemory = { getItem: () => null, setItem: () => undefined, removeItem: () => undefined };

/** Sends what is held when the page is left, when the connection is back, and when the person is. */
function keepWhileOpen(keeper: DraftKeeper): () => void {
  const leave = () => keeper.flush(true);
  const comeBack = () => keeper.flush();
  const turn = () => (document.visibilityState === 'hidden' ? leave() : comeBack());
  window.addEventListener('pagehide', leave);
  window.addEventListener('online', comeBack);
  window.addEventListener('focus', comeBack);
  document.addEventListener('visibilitychange', turn);
  return () => {
    window.removeEventListener('pagehide', leave);
    window.removeEventListener('online', comeBack);
    window.removeEventListener('focus', comeBack);
    document.removeEventListener('visibilitychange', turn);
    leave();
    keeper.stop();
  };
}

/** The longest that a browser's timer can wait, in milliseconds. */
const longestTimer = 2 ** 31 - 1;

function useRefreshAt(moment: string | null): void {
  const router = useRouter();
  useEffect(() => {
    if (moment === null) return undefined;
    const wait = new Date(moment).getTime() - Date.now() + 500;
    if (wait <= 0 || wait > longestTimer) return undefined;
    const timer = setTimeout(() => router.refresh(), wait);
    return () => clearTimeout(timer);
  }, [moment, router]);
}

/** The keeper of this page's drafts. */
export function useKeeper(): DraftKeeper {
  const keeper = useContext(KeeperContext);
  if (!keeper) throw new Error('Drafts are kept inside a KeeperProvider.');
  return keeper;
}

/** The draft of one part; the component follows it. */
export function useDraft(part: PartRef): Draft {
  const keeper = useKeeper();
  return useSyncExternalStore(
    keeper.subscribe,
    () => keeper.draftOf(part),
    () => keeper.draftOf(part),
  );
}
