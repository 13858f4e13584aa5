import type { Structure } from '../../chemistry/structure';

/** Whether all atoms lie on one line, within 0.05 Å; true for one and two atoms. */
export function isLinear({ positionsAngstrom }: Structure): boolean {
  const [first, ...others] = positionsAngstrom;
  if (!first) return true;
  const vectors = others.map((at) => [at[0] - first[0], at[1] - first[1], at[2] - first[2]] as const);
  const along = vectors.toSorted((a, b) => Math.hypot(...b) - Math.hypot(...a))[0];
  if (!along) return true;
  const length = Math.hypot(...along);
  return vectors.every((vector) => {
    const projection = (vector[0] * along[0] + vector[1] * along[1] + vector[2] * along[2]) / length;
    return Math.sqrt(Math.max(0, Math.hypot(...vector) ** 2 - projection ** 2)) < 0.05;
  });
}
