/** One candidate's expected range of the effective moment, μB. */
export interface MomentBand {
  label: string;
  low: number;
  high: number;
  favoured: boolean;
  /** "consistent", "excluded", "cannot tell"; with the reason where the page has room. */
  verdictWord?: string;
}

/** A measured effective moment with its expanded uncertainty (k = 2), or only an upper limit; μB. */
export type MeasuredMoment = { mu: number; expandedU: number } | { upperLimit: number };

/** Spin-only moment of n unpaired electrons, μB, with g = 2: √(n(n + 2)). Common practice. */
export function spinOnlyMoment(unpaired: number): number {
  return Math.sqrt(unpaired * (unpaired + 2));
}

/** Where the axis ends: 6.4 μB for a 3d centre, further when a band or a value reaches past it. */
export function momentAxisEnd(bands: readonly MomentBand[], measured: MeasuredMoment | null): number {
  const top =
    measured === null ? 0 : 'mu' in measured ? measured.mu + measured.expandedU : measured.upperLimit;
  const furthest = Math.max(top, ...bands.map((band) => band.high));
  return furthest <= 6.3 ? 6.4 : Math.ceil(furthest * 1.06);
}

/** Spin-only ticks that fit on the axis: n = 0…5 at least. */
export function momentTicks(axisEnd: number): { unpaired: number; moment: number }[] {
  const ticks: { unpaired: number; moment: number }[] = [];
  for (let unpaired = 0; spinOnlyMoment(unpaired) <= axisEnd; unpaired += 1) {
    ticks.push({ unpaired, moment: spinOnlyMoment(unpaired) });
  }
  return ticks;
}

/** "1.97 ± 0.04" or "< 0.30": the digits follow the band's and the uncertainty's two decimals. */
export function measuredMomentText(measured: MeasuredMoment): string {
  return 'mu' in measured
    ? `${measured.mu.toFixed(2)} ± ${measured.expandedU.toFixed(2)}`
    : `< ${String(Number(measured.upperLimit.toFixed(2)))}`;
}

/** A band in print: "1.9–2.2", or one number where low and high agree. */
export function bandText({ low, high }: Pick<MomentBand, 'low' | 'high'>): string {
  if (low === high) return low === 0 ? '0' : low.toFixed(1);
  return `${low.toFixed(1)}–${high.toFixed(1)}`;
}
