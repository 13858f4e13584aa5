import type { ReactNode } from 'react';

export interface FieldWords {
  label: ReactNode;
  /** What to enter and where to find it; always shown. */
  hint?: ReactNode;
  /** Why the value is refused, and what would do; the input is kept. */
  error?: ReactNode;
}

/** Ids of hint and error for a control's aria-describedby; undefined when there is neither. */
export function describedBy(id: string, { hint, error }: FieldWords): string | undefined {
  const ids = [hint ? `${id}-hint` : '', error ? `${id}-why` : ''].filter(Boolean);
  return ids.length === 0 ? undefined : ids.join(' ');
}

export const controlClass =
  'w-full rounded border border-rule-strong bg-page px-2.5 py-2 text-body leading-[1.3] text-ink placeholder:text-ink-3 placeholder:opacity-100 aria-invalid:border-dissent aria-invalid:border-b-2 disabled:border-dashed disabled:text-ink-3';

/** Label, control, hint and error, in reading order. */
export function FieldFrame({
  id,
  label,
  hint,
  error,
  optional = false,
  children,
}: FieldWords & { id: string; optional?: boolean; children: ReactNode }) {
  return (
    <div className="grid content-start gap-1 text-small">
      <label htmlFor={id} className="text-ink-2">
        {label}
        {optional ? <span className="text-ink-3">, optional</span> : null}
      </label>
      {children}
      {hint ? (
        <p id={`${id}-hint`} className="text-note text-ink-3">
          {hint}
        </p>
      ) : null}
      {error ? (
        <p id={`${id}-why`} className="text-dissent">
          {error}
        </p>
      ) : null}
    </div>
  );
}
