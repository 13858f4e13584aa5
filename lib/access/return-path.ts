/**
 * Where to go after signing in: a path of this site, never another one.
 * @param wanted - as it came in the address, not trusted
 */
export function returnPath(wanted: string | null | undefined, otherwise = '/'): string {
  // A second slash or backslash would name another host: //host, /\host.
  if (!wanted || !/^\/(?![/\\])[\x21-\x7e]*$/.test(wanted)) return otherwise;
  const url = new URL(wanted, 'http://here.invalid');
  if (url.host !== 'here.invalid') return otherwise;
  return url.pathname + url.search + url.hash;
}
