/** Whether the invented group and its accounts may be used: set by the launcher, never by default. */
export function isDemoMode(): boolean {
  return process.env.SPINSTEAD_DEMO === '1';
}
