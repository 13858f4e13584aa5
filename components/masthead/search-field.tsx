'use client';

import { useEffect, useRef } from 'react';

/**
 * Search over the group: a plain GET form, so that it works before any script has loaded.
 * The key `/` brings the cursor here from anywhere but another field.
 */
export function SearchField({ action = '/search', value = '' }: { action?: string; value?: string }) {
  const input = useRef<HTMLInputElement>(null);
  useEffect(() => {
    const focusOnSlash = (event: KeyboardEvent) => {
      if (event.key !== '/' || event.ctrlKey || event.metaKey || event.altKey) return;
      if (
        event.target instanceof Element &&
        event.target.closest('input, textarea, select, [contenteditable]')
      ) {
        return;
      }
      event.preventDefault();
      input.current?.focus();
    };
    document.addEventListener('keydown', focusOnSlash);
    return () => document.removeEventListener('keydown', focusOnSlash);
  }, []);
  return (
    <form action={action} role="search" className="max-book:order-4 max-book:w-full">
      <label className="flex w-[290px] items-center gap-2 border-b border-rule-strong px-0.5 py-1 text-ink-3 focus-within:outline-2 focus-within:outline-offset-4 focus-within:outline-focus max-book:w-full">
        <svg aria-hidden="true" width="15" height="15" viewBox="0 0 15 15" fill="none" stroke="currentColor">
          <circle cx="6" cy="6" r="4.6" strokeWidth="1.4" />
          <path strokeWidth="1.4" d="M9.5 9.5L14 14" />
        </svg>
        <span className="sr-only">Search</span>
        <input
          ref={input}
          type="search"
          name="q"
          defaultValue={value}
          placeholder="Complex, job key, sample, file"
          aria-keyshortcuts="/"
          className="min-w-0 flex-1 bg-transparent text-small text-ink outline-none placeholder:text-ink-3"
        />
        <kbd className="rounded-[3px] border border-rule-strong px-1.5 py-0.5 font-sans text-[0.75rem] leading-none font-medium text-ink-2">
          /
        </kbd>
      </label>
    </form>
  );
}
