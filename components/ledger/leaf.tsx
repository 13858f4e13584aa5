import type { ReactNode } from 'react';

/** One page of a spread, named by its running head. */
export function Leaf({ labelledBy, children }: { labelledBy?: string; children: ReactNode }) {
  return (
    <section
      aria-labelledby={labelledBy}
      className="min-w-0 px-7 pt-5.5 pb-7.5 max-book:px-3.5 max-book:pt-4 max-book:pb-5.5"
    >
      {children}
    </section>
  );
}
