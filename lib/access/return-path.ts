/**
 * Where to go after signing in: a path of this site, never another one.
 * @param wanted - as it came in the address, not trusted
 */
export function returnPath(wanted: string | null | undefined, otherwise = '/'): string {
  // A second slash or backslash would name another host: //host, /\host; so would /..//host once resolved.
  if (!wanted || !/^\/[\x21-\x7e]*$/.test(wanted)) return otherwise;
  const here = 'http://here.invalid';
  const url = URL.canParse(wanted, here) ? new URL(wanted, here) : null;
  if (url?.origin !== here || url.pathname.startsWith('//')) return otherwise;
  return url.pathname + url.search + url.hash;
}
