import type { ReactNode } from 'react';

/** A part that runs across both pages, under a strong rule: moment ruler, checks. */
export function AcrossPages({
  id,
  title,
  note,
  children,
}: {
  id: string;
  title: ReactNode;
  note?: ReactNode;
  children: ReactNode;
}) {
  return (
    <section aria-labelledby={id} className="border-t border-rule-strong px-7 pt-5.5 pb-6.5 max-book:px-3.5">
      <h3 id={id} className="mb-2.5 flex flex-wrap items-baseline gap-x-3.5 text-head">
        {title}
        {note === undefined ? null : (
          <small className="font-sans text-note tracking-normal text-ink-3">{note}</small>
        )}
      </h3>
      {children}
    </section>
  );
}
