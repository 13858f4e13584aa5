import type { ReactNode } from 'react';
import { Gutter } from './gutter';

/** Two facing pages with the gutter between; on phones they stack and the gutter turns into a bar. */
export function Spread({ left, right, gutter }: { left: ReactNode; right: ReactNode; gutter?: ReactNode }) {
  return (
    <div className="grid grid-cols-[minmax(0,1fr)_var(--gutter-width)_minmax(0,1fr)] max-wide:[--gutter-width:44px] max-book:grid-cols-[minmax(0,1fr)]">
      {left}
      <Gutter>{gutter}</Gutter>
      {right}
    </div>
  );
}
