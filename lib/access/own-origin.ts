/**
 * Whether a request may change something with the session cookie: it is a reading one, or the browser says that
 * it comes from this very site. A browser always says so on other methods; a missing Origin counts as foreign.
 * @param siteUrl - the public address of the site, when it is known
 */
export function isOwnOrigin(method: string, headers: Headers, siteUrl: string | undefined): boolean {
  if (method === 'GET' || method === 'HEAD' || method === 'OPTIONS') return true;
  const origin = headers.get('origin');
  if (!origin || !URL.canParse(origin)) return false;
  const { host } = new URL(origin);
  if (siteUrl && URL.canParse(siteUrl) && new URL(siteUrl).origin === origin) return true;
  // The address the browser asked for: a page cannot forge its Host.
  return host === headers.get('host');
}
