import type { ReactNode } from 'react';
import { ThemeToggle } from '@/components/masthead/theme-toggle';
import { Wordmark } from '@/components/masthead/wordmark';

/** The way in: one leaf of the book on the desk, without the masthead of a group. */
export default function AccountsLayout({ children }: { children: ReactNode }) {
  return (
    <>
      <header className="flex min-h-[54px] items-center justify-between px-edge pt-3.5">
        <Wordmark />
        <ThemeToggle />
      </header>
      <main
        id="main"
        className="mx-auto w-full max-w-[560px] px-edge py-9 max-book:max-w-none max-book:py-5 has-[[data-spread]]:max-w-[1080px]"
      >
        <div className="border border-rule-strong bg-page px-9 py-9 max-book:px-5 max-book:py-7">
          {children}
        </div>
      </main>
    </>
  );
}
