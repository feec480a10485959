'use client';

import { type ReactNode, useEffect, useId, useRef } from 'react';

export interface DialogProps {
  readonly open: boolean;
  /** Called on Escape, on a press outside and by the closing button; the caller sets `open` to false. */
  readonly onClose: () => void;
  readonly title: string;
  readonly children: ReactNode;
  /** Buttons at the foot, the safest first. */
  readonly actions?: ReactNode;
}

/**
 * A native modal dialog: the page behind is inert, Escape closes it, and the focus goes back to what opened it. The first
 * control, or one with `autoFocus`, takes the focus.
 */
export function Dialog({ open, onClose, title, children, actions }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();

  useEffect(() => {
    const element = dialog.current;
    if (!element) return;
    if (open && !element.open) element.showModal();
    if (!open && element.open) element.close();
  }, [open]);

  return (
    <dialog
      ref={dialog}
      aria-labelledby={titleId}
      className="leaf"
      onClose={onClose}
      onClick={(event) => {
        if (event.target === dialog.current) onClose();
      }}
    >
      {open ? (
        <div className="px-6 pt-5 pb-6">
          <div className="mb-3 flex items-baseline justify-between gap-4">
            <p id={titleId} role="heading" aria-level={2} className="text-lead font-semibold">
              {title}
            </p>
            <button type="button" onClick={onClose} className="min-h-6 text-small text-blue underline">
              close
            </button>
          </div>
          <div className="grid gap-3">{children}</div>
          {actions ? <div className="mt-5 flex flex-wrap gap-3">{actions}</div> : null}
        </div>
      ) : null}
    </dialog>
  );
}
