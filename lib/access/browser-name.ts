/** Order matters: each of these also names the ones below it. */
const browsers: readonly [RegExp, string][] = [
  [/\bEdgA?\//, 'Edge'],
  [/\bOPR\//, 'Opera'],
  [/\bFirefox\/|\bFxiOS\//, 'Firefox'],
  [/\bChrome\/|\bCriOS\/|\bHeadlessChrome\//, 'Chrome'],
  [/\bSafari\//, 'Safari'],
  [/^curl\//, 'curl'],
];
const systems: readonly [RegExp, string][] = [
  [/\biPhone\b|\biPad\b/, 'iOS'],
  [/\bAndroid\b/, 'Android'],
  [/\bWindows\b/, 'Windows'],
  [/\bMac OS X\b/, 'macOS'],
  [/\bLinux\b/, 'Linux'],
];

/** What a person would call the browser of a user-agent header: "Firefox on Linux". */
export function browserName(userAgent: string): string {
  const name = ([pattern]: readonly [RegExp, string]) => pattern.test(userAgent);
  const browser = browsers.find(name)?.[1];
  const system = systems.find(name)?.[1];
  if (!browser && !system) return 'Unknown browser';
  return system ? `${browser ?? 'Unknown browser'} on ${system}` : (browser ?? 'Unknown browser');
}
