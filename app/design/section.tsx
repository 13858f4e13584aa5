import type { ReactNode } from 'react';

/** One group of primitives: its name and what it is for, then the parts. */
export function Section({
  id,
  title,
  note,
  children,
}: {
  id: string;
  title: string;
  note?: string;
  children: ReactNode;
}) {
  return (
    <section
      aria-labelledby={id}
      className="grid grid-cols-[230px_minmax(0,1fr)] gap-x-9 border-b border-rule-strong px-9 pt-8.5 pb-9.5 last:border-b-0 max-book:grid-cols-1 max-book:gap-y-4 max-book:px-3.5 max-book:py-6"
    >
      <header>
        <h2 id={id} className="text-head">
          {title}
        </h2>
        {note === undefined ? null : <p className="mt-2 text-small text-pretty text-ink-2">{note}</p>}
      </header>
      <div className="min-w-0">{children}</div>
    </section>
  );
}
