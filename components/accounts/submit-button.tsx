'use client';
import type { ReactNode } from 'react';
import { useFormStatus } from 'react-dom';

interface SubmitButtonProps {
  children: ReactNode;
  /** Said while the form is on its way. */
  pending?: string;
  kind?: 'main' | 'plain';
}

/** Sends its form once: it is inert while the form is on its way. */
export function SubmitButton({ children, pending = 'One moment …', kind = 'main' }: SubmitButtonProps) {
  const status = useFormStatus();
  const look =
    kind === 'main'
      ? 'border-ink bg-ink text-page hover:bg-ink-2'
      : 'border-rule-strong bg-transparent text-ink hover:bg-page-sunk';
  return (
    <button
      type="submit"
      aria-disabled={status.pending || undefined}
      onClick={(event) => {
        if (status.pending) event.preventDefault();
      }}
      className={`min-h-10 rounded border px-4 py-1.5 font-semibold ${look}`}
    >
      {status.pending ? pending : children}
    </button>
  );
}
