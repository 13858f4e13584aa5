/**
 * Distinct ways to point the spins of several sites up or down: one for each pattern up to turning all
 * of them over. The net spin is never negative; where it is zero the first magnetic site points up.
 * Sites without unpaired electrons always count as up.
 * @param unpaired - unpaired electrons per site
 * @returns patterns (true = up), all-up first, then by falling net spin
 */
export function spinFlips(unpaired: readonly number[]): boolean[][] {
  const magnetic = unpaired.flatMap((count, index) => (count > 0 ? [index] : []));
  if (magnetic.length > 16) throw new RangeError(`spinFlips takes at most 16 sites, got ${magnetic.length}`);
  const net = (pattern: readonly boolean[]) =>
    unpaired.reduce((sum, count, index) => sum + (pattern[index] ? count : -count), 0);
  const patterns: boolean[][] = [];
  for (let bits = 0; bits < 2 ** magnetic.length; bits++) {
    const pattern = unpaired.map(() => true);
    magnetic.forEach((site, position) => {
      pattern[site] = (bits & (1 << position)) === 0;
    });
    const total = net(pattern);
    if (total > 0 || (total === 0 && pattern[magnetic[0] ?? 0])) patterns.push(pattern);
  }
  return patterns.sort((a, b) => net(b) - net(a));
}
