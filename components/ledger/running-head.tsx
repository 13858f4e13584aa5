import type { ReactNode } from 'react';

/** Italic head over a line in the side's own hue: Calculated on the left page, Measured on the right. */
export function RunningHead({
  side,
  id,
  title = side === 'calculated' ? 'Calculated' : 'Measured',
  children,
}: {
  side: 'calculated' | 'measured';
  id?: string;
  title?: ReactNode;
  /** Provenance of the page: level of theory and runs, or convention of uncertainty. */
  children?: ReactNode;
}) {
  const hue = side === 'calculated' ? 'text-calc' : 'text-meas';
  return (
    <div
      className={`flex items-baseline justify-between gap-x-3.5 gap-y-1 border-b-2 border-current pb-[9px] max-book:flex-wrap ${hue}`}
    >
      <h2 id={id} className="text-running tracking-[-0.012em] italic">
        {title}
      </h2>
      <p className="text-note text-ink-3">{children}</p>
    </div>
  );
}
