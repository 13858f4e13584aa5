import Link from 'next/link';
import type { ReactNode } from 'react';
import { classNames } from './class-names';

export type SortDirection = 'ascending' | 'descending';

export interface SortHeadProps {
  children: ReactNode;
  /** Second line: unit or note. */
  under?: ReactNode;
  numeric?: boolean;
  /** The direction this column is sorted in now. */
  sorted?: SortDirection;
  /** Address of the page sorted by this column; a table that lives in the client gives `onSort` instead. */
  href?: string;
  onSort?: () => void;
  className?: string;
}

/** A column head that sorts. Without href and onSort it is a plain head. */
export function SortHead({
  children,
  under,
  numeric = false,
  sorted,
  href,
  onSort,
  className,
}: SortHeadProps) {
  const control = href !== undefined ? 'link' : onSort !== undefined ? 'button' : null;
  return (
    <th
      role="columnheader"
      scope="col"
      aria-sort={sorted}
      className={classNames(numeric && 'num', className)}
    >
      {control === 'link' && href !== undefined ? (
        <Link href={href} scroll={false} className="sort" data-sorted={sorted}>
          {children}
        </Link>
      ) : control === 'button' ? (
        <button type="button" onClick={onSort} className="sort" data-sorted={sorted}>
          {children}
        </button>
      ) : (
        children
      )}
      {under === undefined ? null : (
        <>
          <br />
          {under}
        </>
      )}
    </th>
  );
}
