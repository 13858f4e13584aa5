import type { ReactNode } from 'react';

/** The strip between the pages; a link mark may stand in it. */
export function Gutter({ children }: { children?: ReactNode }) {
  return (
    <div className="grid content-start justify-items-center border-x border-rule bg-gutter max-book:min-h-5 max-book:content-center max-book:border-x-0 max-book:border-y">
      {children}
    </div>
  );
}
