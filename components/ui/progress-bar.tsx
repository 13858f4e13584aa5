import type { ReactNode } from 'react';

/** Real progress, never a spinner: a bar, what is done, what is left. `value` null means not yet known. */
export function ProgressBar({
  label,
  value,
  done,
  left,
}: {
  label: string;
  /** Share done, 0–1. */
  value: number | null;
  /** "14.2 of 22.9 MB sent" */
  done?: ReactNode;
  /** "12 files · 4 read · 1 refused" */
  left?: ReactNode;
}) {
  const percent = value === null ? null : Math.round(Math.min(1, Math.max(0, value)) * 100);
  return (
    <div>
      <div
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={percent ?? undefined}
        aria-valuetext={typeof done === 'string' ? done : undefined}
        className={`h-3 border p-0.5 ${percent === null ? 'border-dashed border-rule-strong' : 'border-ink'}`}
      >
        <div className="h-full bg-ink" style={{ width: `${percent ?? 0}%` }} />
      </div>
      {done === undefined && left === undefined ? null : (
        <p className="mt-2 flex flex-wrap justify-between gap-x-4 text-small text-ink-2">
          <b className="font-semibold text-ink">{done}</b>
          <span>{left}</span>
        </p>
      )}
    </div>
  );
}
