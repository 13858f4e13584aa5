'use client';

import { useEffect, useId, useRef, type ReactNode } from 'react';

export interface DialogProps {
  open: boolean;
  onClose: () => void;
  title: ReactNode;
  children: ReactNode;
  actions?: ReactNode;
}

/** A modal question. The browser's own <dialog> keeps the focus inside, closes on Escape and gives it back. */
export function Dialog({ open, onClose, title, children, actions }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const element = dialog.current;
    if (element === null) return;
    if (open && !element.open) element.showModal();
    if (!open && element.open) element.close();
  }, [open]);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={titleId}
      onClose={onClose}
      className="m-auto w-[min(560px,calc(100vw-28px))] border border-ink bg-page p-6 text-ink backdrop:bg-ink/40"
    >
      <h2 id={titleId} className="mb-3 text-head">
        {title}
      </h2>
      <div className="text-small text-ink-2">{children}</div>
      <div className="mt-5 flex flex-wrap gap-3">{actions}</div>
    </dialog>
  );
}
