import type { ReactNode } from 'react';

export interface FootNote {
  id?: string;
  /** The bold words it opens with. */
  lead: ReactNode;
  text: ReactNode;
}

/** Notes under the book: conventions, cautions, what † means. */
export function Foot({ notes }: { notes: readonly FootNote[] }) {
  return (
    <footer className="mx-edge mt-5 mb-12 grid grid-cols-3 gap-9 max-book:grid-cols-1 max-book:gap-3.5">
      {notes.map(({ id, lead, text }, index) => (
        <p key={id ?? index} id={id} className="max-w-[58ch] text-note text-pretty text-ink-2">
          <b className="font-semibold text-ink">{lead}</b> {text}
        </p>
      ))}
    </footer>
  );
}
