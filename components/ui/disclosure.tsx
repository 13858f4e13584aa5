import type { ReactNode } from 'react';

/** More of the same, shown on demand; works without script. */
export function Disclosure({
  summary,
  children,
  open,
}: {
  summary: ReactNode;
  children: ReactNode;
  open?: boolean;
}) {
  return (
    <details open={open} className="group/more">
      <summary className="flex list-none items-center gap-2 py-1 text-small text-ink-2 hover:text-ink [&::-webkit-details-marker]:hidden">
        <svg
          aria-hidden="true"
          width="9"
          height="9"
          viewBox="0 0 9 9"
          className="transition-transform group-open/more:rotate-90 motion-reduce:transition-none"
        >
          <path d="M2 0l6 4.5L2 9z" fill="currentColor" />
        </svg>
        {summary}
      </summary>
      <div className="pt-2">{children}</div>
    </details>
  );
}
