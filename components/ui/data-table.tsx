import type { ReactNode, TableHTMLAttributes } from 'react';
import { classNames } from './class-names';

/**
 * The plain table: hairlines between rows, strong rules above and below; wide ones scroll inside their own frame.
 * Give cells with figures the class `num`, a selected row `data-selected`.
 */
export function DataTable({
  caption,
  captionShown = false,
  children,
  className,
  ...rest
}: TableHTMLAttributes<HTMLTableElement> & {
  caption: ReactNode;
  captionShown?: boolean;
  children: ReactNode;
}) {
  return (
    // A frame that can scroll must be reachable by keyboard (WCAG 2.1.1).
    <div
      className="relative overflow-x-auto"
      role="group"
      aria-label={typeof caption === 'string' ? caption : undefined}
      tabIndex={0}
    >
      <table className={classNames('data-table', className)} {...rest}>
        <caption className={captionShown ? 'pb-2 text-left text-small text-ink-2' : 'sr-only'}>
          {caption}
        </caption>
        {children}
      </table>
    </div>
  );
}
