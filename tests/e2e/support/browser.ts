import { chromium, type Browser, type Page } from 'playwright-core';
import { demoAccounts } from '@/lib/access/demo-accounts';
import type { Role } from '@/lib/access/roles';

export function openBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
      '--no-first-run',
      '--disable-quic',
      '--use-angle=swiftshader',
    ],
  });
}

/** A page in a fresh profile, signed in as the demo's person of this role; errors of the page are collected. */
export async function pageOf(
  browser: Browser,
  url: string,
  role: Role,
): Promise<{ page: Page; errors: string[] }> {
  const account = demoAccounts.find((each) => each.role === role);
  if (!account) throw new Error(`The demo has no ${role}.`);
  const context = await browser.newContext({ viewport: { width: 1440, height: 1000 }, baseURL: url });
  const page = await context.newPage();
  const errors: string[] = [];
  page.on('pageerror', (error) => errors.push(error.message));
  page.on('console', (message) => {
    if (message.type() === 'error') errors.push(message.text());
  });
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(account.email);
  await page.getByLabel('Password').fill(account.password);
  await Promise.all([
    page.waitForURL((address) => address.pathname === '/'),
    page.getByRole('button', { name: 'Sign in', exact: true }).click(),
  ]);
  return { page, errors };
}
