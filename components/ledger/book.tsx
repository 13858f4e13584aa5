import type { ReactNode } from 'react';

/** The open book on the desk: everything a page shows lies on its paper. */
export function Book({ children }: { children: ReactNode }) {
  return (
    <div className="book mx-edge border border-rule-strong bg-page print:mx-0 print:border-0">{children}</div>
  );
}
