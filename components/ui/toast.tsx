'use client';

import { createContext, type ReactNode, useCallback, useContext, useMemo, useRef, useState } from 'react';

export type ToastTone = 'info' | 'error';

interface Toast {
  readonly id: number;
  readonly words: string;
  readonly tone: ToastTone;
}

type ShowToast = (words: string, tone?: ToastTone) => void;

const ToastContext = createContext<ShowToast>(() => undefined);

/** Shows a short line at the foot of the page: `const toast = useToast(); toast('Saved.')`. Errors stay until dismissed. */
export function useToast(): ShowToast {
  return useContext(ToastContext);
}

const shownFor = 6000;

/** Holds the region in which toasts appear; it stands once, in the layout. */
export function ToastProvider({ children }: { children: ReactNode }) {
  const [toasts, setToasts] = useState<readonly Toast[]>([]);
  const counter = useRef(0);
  const dismiss = useCallback((id: number) => setToasts((all) => all.filter((toast) => toast.id !== id)), []);
  const show = useCallback<ShowToast>(
    (words, tone = 'info') => {
      counter.current += 1;
      const id = counter.current;
      setToasts((all) => [...all.slice(-2), { id, words, tone }]);
      if (tone === 'info') setTimeout(() => dismiss(id), shownFor);
    },
    [dismiss],
  );
  const region = useMemo(() => <ToastRegion toasts={toasts} onDismiss={dismiss} />, [toasts, dismiss]);
  return (
    <ToastContext.Provider value={show}>
      {children}
      {region}
    </ToastContext.Provider>
  );
}

function ToastRegion({ toasts, onDismiss }: { toasts: readonly Toast[]; onDismiss: (id: number) => void }) {
  return (
    <div
      role="status"
      aria-live="polite"
      className="toast-region pointer-events-none fixed inset-x-4 bottom-4 z-10 flex flex-col items-center gap-2"
    >
      {toasts.map((toast) => (
        <p
          key={toast.id}
          className={`pointer-events-auto flex max-w-form items-baseline gap-4 rounded-leaf border border-edge border-l-4 bg-field px-4 py-2 text-small shadow-leaf ${
            toast.tone === 'error' ? 'border-l-madder' : 'border-l-blue'
          }`}
        >
          <span>{toast.words}</span>
          <button type="button" onClick={() => onDismiss(toast.id)} className="min-h-6 text-blue underline">
            dismiss
          </button>
        </p>
      ))}
    </div>
  );
}
