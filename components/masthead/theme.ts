/** A person's choice of theme; `system` follows the device. Kept in the cookie `theme`, read by the root layout. */
export type ThemeChoice = 'system' | 'light' | 'dark';

export const themeCookie = 'theme';

/** The choice in a cookie's value; anything unknown is the device's own. */
export function parseThemeChoice(value: string | undefined): ThemeChoice {
  return value === 'light' || value === 'dark' ? value : 'system';
}

/** The class that <html> carries for a choice; none lets the device decide. */
export function themeClass(choice: ThemeChoice): string | undefined {
  return choice === 'system' ? undefined : choice;
}
