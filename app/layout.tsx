import type { Metadata, Viewport } from 'next';
import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { parseThemeChoice, themeClass, themeCookie } from '@/components/masthead/theme';
import { SkipLink } from '@/components/ui/skip-link';
import { colourTokens } from '@/tailwind.config';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Spinstead', template: '%s · Spinstead' },
  description: 'Calculated beside measured spin states of metal complexes.',
};

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: colourTokens.desk[0] },
    { media: '(prefers-color-scheme: dark)', color: colourTokens.desk[1] },
  ],
};

export default async function RootLayout({ children }: { children: ReactNode }) {
  // The choice is read on the server, so that the first paint already has it: no flash, no inline script.
  const choice = parseThemeChoice((await cookies()).get(themeCookie)?.value);
  return (
    <html lang="en-GB" className={themeClass(choice)}>
      <body>
        <SkipLink />
        {children}
      </body>
    </html>
  );
}
