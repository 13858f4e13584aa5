import type { ReactNode } from 'react';

/** A part of a page with a short note beside its name. */
export function LeafHead({ id, children, note }: { id?: string; children: ReactNode; note?: ReactNode }) {
  return (
    <h3 id={id} className="mt-7 mb-2.5 flex flex-wrap items-baseline gap-x-3 text-part">
      {children}
      {note === undefined ? null : (
        <small className="font-sans text-note tracking-normal text-ink-3">{note}</small>
      )}
    </h3>
  );
}
