import 'server-only';

/** An absolute address of this site, for mails; never built from what a request claims to be its host. */
export function siteUrl(path: string): string {
  const base = process.env.NEXTAUTH_URL;
  if (!base) throw new Error('NEXTAUTH_URL is not set: give the public address of the site.');
  return new URL(path, base).href;
}
