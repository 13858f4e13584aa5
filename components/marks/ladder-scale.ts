/** Ticks of an energy axis from 0: round steps of 1, 2 or 5 times a power of ten, three to five of them. */
export function ladderTicks(highest: number): number[] {
  if (!(highest > 0)) return [0];
  const rough = highest / 3;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = ([1, 2, 5, 10].find((factor) => factor * power >= rough) ?? 10) * power;
  const count = Math.ceil((highest * 1.02) / step);
  return Array.from({ length: count + 1 }, (_, index) => Number((index * step).toPrecision(6)));
}

/**
 * Places for labels that want to stand at given heights but need room: moves them apart, keeping their order.
 * @param wanted - px from the top, ascending
 * @param room - px that each needs
 * @returns px from the top, ascending, at least `room` apart and within 0…`height` where that is possible
 */
export function spreadLabels(wanted: readonly number[], room: number, height: number): number[] {
  const places: number[] = [];
  for (const place of wanted) places.push(Math.max(place, (places.at(-1) ?? -Infinity) + room));
  let limit = height;
  for (let index = places.length - 1; index >= 0; index -= 1) {
    places[index] = Math.min(places[index] ?? 0, limit);
    limit = (places[index] ?? 0) - room;
  }
  return places;
}
