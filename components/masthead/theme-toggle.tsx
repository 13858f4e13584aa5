'use client';

import { themeClass, themeCookie, type ThemeChoice } from './theme';

const YEAR_S = 31_536_000;

/** Shows a theme at once and keeps the choice for the next visit. */
export function applyTheme(choice: ThemeChoice): void {
  const root = document.documentElement;
  root.classList.remove('light', 'dark');
  const name = themeClass(choice);
  if (name !== undefined) root.classList.add(name);
  const life = choice === 'system' ? 'Max-Age=0' : `Max-Age=${YEAR_S}`;
  document.cookie = `${themeCookie}=${choice}; Path=/; ${life}; SameSite=Lax`;
}

function shownTheme(): 'light' | 'dark' {
  const { classList } = document.documentElement;
  if (classList.contains('dark')) return 'dark';
  if (classList.contains('light')) return 'light';
  return window.matchMedia('(prefers-color-scheme: dark)').matches ? 'dark' : 'light';
}

/** The half-disc button: turns light into dark and back. */
export function ThemeToggle() {
  return (
    <button
      type="button"
      aria-label="Switch between light and dark"
      title="Light or dark"
      className="grid size-7 place-items-center text-ink-2 hover:text-ink"
      onClick={() => applyTheme(shownTheme() === 'dark' ? 'light' : 'dark')}
    >
      <svg aria-hidden="true" width="18" height="18" viewBox="0 0 18 18">
        <circle cx="9" cy="9" r="7" fill="none" stroke="currentColor" strokeWidth="1.4" />
        <path d="M9 2a7 7 0 0 1 0 14z" fill="currentColor" />
      </svg>
    </button>
  );
}
