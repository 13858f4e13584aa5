import type { ReactNode } from 'react';

/** A square root with its bar over what it covers. */
export function SquareRoot({ children }: { children: ReactNode }) {
  return (
    <span className="whitespace-nowrap">
      √<span className="-ml-px border-t border-current px-0.5 pt-px">{children}</span>
    </span>
  );
}
