/**
 * Reproducible random numbers: uniform() in (0, 1) from a 32-bit mixing counter ("mulberry32", public domain
 * method), normal() of mean 0 and variance 1 by the polar method of Marsaglia. Enough for Monte Carlo propagation,
 * not for secrets.
 * @param seed - any whole number; the same seed gives the same numbers
 */
export function seededRandom(seed: number): { uniform: () => number; normal: () => number } {
  let state = seed >>> 0;
  let spare: number | null = null;
  const uniform = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return (((t ^ (t >>> 14)) >>> 0) + 0.5) / 4294967296;
  };
  const normal = () => {
    if (spare !== null) {
      const kept = spare;
      spare = null;
      return kept;
    }
    for (;;) {
      const x = 2 * uniform() - 1;
      const y = 2 * uniform() - 1;
      const r = x * x + y * y;
      if (r > 0 && r < 1) {
        const factor = Math.sqrt((-2 * Math.log(r)) / r);
        spare = y * factor;
        return x * factor;
      }
    }
  };
  return { uniform, normal };
}
