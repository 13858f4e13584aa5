import Link from 'next/link';
import type { ReactNode } from 'react';
import { VisuallyHidden } from '@/components/ui/visually-hidden';

export interface IndexTab {
  href: string;
  label: ReactNode;
  current?: boolean;
  /** A number that asks for attention, with its word: 2 "open". */
  count?: { value: number; word: string };
}

/** Index tabs cut into the book's top edge; each is a page. */
export function IndexTabs({ label = 'Study', tabs }: { label?: string; tabs: readonly IndexTab[] }) {
  return (
    <nav
      aria-label={label}
      className="relative z-[1] mt-6.5 flex gap-0.5 overflow-x-auto px-edge [scrollbar-width:none] max-book:mt-4.5 print:hidden"
    >
      {tabs.map((tab) => (
        <Link
          key={tab.href}
          href={tab.href}
          aria-current={tab.current ? 'page' : undefined}
          className="border border-b-0 border-transparent px-4.5 pt-[9px] pb-2.5 text-[0.9375rem] whitespace-nowrap text-ink-2 no-underline -outline-offset-4! hover:text-ink hover:underline aria-[current=page]:-mb-px aria-[current=page]:border-rule-strong aria-[current=page]:bg-page aria-[current=page]:pb-[11px] aria-[current=page]:font-semibold aria-[current=page]:text-ink max-book:px-3"
        >
          {tab.label}
          {tab.count === undefined || tab.count.value === 0 ? null : (
            <>
              {/* The spaces part the words of the link's name for screen readers. */}{' '}
              <span className="text-note font-bold text-dissent">{tab.count.value}</span>{' '}
              <VisuallyHidden>{tab.count.word}</VisuallyHidden>
            </>
          )}
        </Link>
      ))}
    </nav>
  );
}
