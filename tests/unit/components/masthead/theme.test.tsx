import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { SearchField } from '@/components/masthead/search-field';
import { parseThemeChoice, themeClass } from '@/components/masthead/theme';
import { applyTheme, ThemeToggle } from '@/components/masthead/theme-toggle';

afterEach(() => {
  cleanup();
  applyTheme('system');
});

describe('theme', () => {
  it('follows the device unless the cookie says light or dark', () => {
    expect([undefined, 'purple', 'light', 'dark'].map(parseThemeChoice)).toEqual([
      'system',
      'system',
      'light',
      'dark',
    ]);
    expect(themeClass('system')).toBeUndefined();
  });

  it('turns from what the device shows, and keeps the choice in a cookie', async () => {
    vi.stubGlobal('matchMedia', () => ({ matches: true }));
    render(<ThemeToggle />);
    await userEvent.click(screen.getByRole('button'));
    expect(document.documentElement.className).toBe('light');
    expect(document.cookie).toContain('theme=light');
    await userEvent.click(screen.getByRole('button'));
    expect(document.documentElement.className).toBe('dark');
    expect(document.cookie).toContain('theme=dark');
    vi.unstubAllGlobals();
  });
});

it('brings the cursor to the search on /, but not while someone types elsewhere', async () => {
  render(
    <>
      <SearchField />
      <input aria-label="other" />
    </>,
  );
  await userEvent.click(screen.getByLabelText('other'));
  await userEvent.keyboard('/');
  expect(document.activeElement).toBe(screen.getByLabelText('other'));
  screen.getByLabelText('other').blur();
  await userEvent.keyboard('/');
  expect(document.activeElement).toBe(screen.getByRole('searchbox'));
});
