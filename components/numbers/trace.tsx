import Link from 'next/link';
import type { ReactNode } from 'react';

/** Dotted underline: this number opens the lines that it was read from, or the readings it was made of. */
export const traceClass =
  'underline decoration-dotted decoration-1 underline-offset-4 decoration-current hover:decoration-solid hover:decoration-2 cursor-pointer';

export interface TraceProps {
  children: ReactNode;
  /** Where the source is shown; a link. Without it give `onClick` from a client component. */
  href?: string;
  /** Read by screen readers in place of the number alone: "2.444 ångström, show source". */
  label?: string;
  onClick?: () => void;
  expanded?: boolean;
  controls?: string;
}

/** A number that can be traced. */
export function Trace({ children, href, label, onClick, expanded, controls }: TraceProps) {
  if (href !== undefined) {
    return (
      <Link href={href} aria-label={label} className={traceClass}>
        {children}
      </Link>
    );
  }
  return (
    <button
      type="button"
      aria-label={label}
      aria-expanded={expanded}
      aria-controls={controls}
      onClick={onClick}
      className={traceClass}
    >
      {children}
    </button>
  );
}
