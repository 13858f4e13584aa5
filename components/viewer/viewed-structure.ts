import type { Vector3 } from '@/lib/chemistry/structure';

/** A metal with its first sphere, atoms by 0-based index. */
export interface ViewedCentre {
  index: number;
  donors: readonly { index: number; distanceAngstrom: number }[];
}

/** What the viewer shows; plain data, so that a server page can hand it over. */
export interface ViewedStructure {
  title: string;
  elements: readonly string[];
  positionsAngstrom: readonly Vector3[];
  centres: readonly ViewedCentre[];
  /** Pairs of bonded atoms other than metal–donor; left out, short contacts are drawn as bonds. */
  bonds?: readonly (readonly [number, number])[];
}

const subtract = (a: Vector3, b: Vector3): Vector3 => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];

/** Distance of two points, Å. */
export function distanceAngstrom(a: Vector3, b: Vector3): number {
  return Math.hypot(...subtract(a, b));
}

/** Angle a–apex–b, degrees; null when an arm has no length. */
export function angleDegrees(a: Vector3, apex: Vector3, b: Vector3): number | null {
  const [u, v] = [subtract(a, apex), subtract(b, apex)];
  const lengths = Math.hypot(...u) * Math.hypot(...v);
  if (lengths === 0) return null;
  const cosine = (u[0] * v[0] + u[1] * v[1] + u[2] * v[2]) / lengths;
  return (Math.acos(Math.min(1, Math.max(-1, cosine))) * 180) / Math.PI;
}

/** Name of an atom: element and its number among the atoms of that element, "Cl2"; the number is left out for a lone one. */
export function atomNames(elements: readonly string[]): string[] {
  const totals = new Map<string, number>();
  for (const element of elements) totals.set(element, (totals.get(element) ?? 0) + 1);
  const seen = new Map<string, number>();
  return elements.map((element) => {
    const number = (seen.get(element) ?? 0) + 1;
    seen.set(element, number);
    return totals.get(element) === 1 ? element : `${element}${number}`;
  });
}

/** Every donor–metal–donor angle of a centre, degrees. */
export function sphereAngles(
  structure: Pick<ViewedStructure, 'positionsAngstrom'>,
  centre: ViewedCentre,
): { first: number; second: number; degrees: number }[] {
  const apex = structure.positionsAngstrom[centre.index];
  return centre.donors.flatMap((donor, at) =>
    centre.donors.slice(at + 1).flatMap((other) => {
      const [a, b] = [structure.positionsAngstrom[donor.index], structure.positionsAngstrom[other.index]];
      if (a === undefined || b === undefined || apex === undefined) return [];
      const degrees = angleDegrees(a, apex, b);
      return degrees === null ? [] : [{ first: donor.index, second: other.index, degrees }];
    }),
  );
}

/** Atoms nearest to one, closest first: those within 3 Å, eight at most. */
export function nearestAtoms(
  { positionsAngstrom }: Pick<ViewedStructure, 'positionsAngstrom'>,
  index: number,
  withinAngstrom = 3,
): { index: number; distanceAngstrom: number }[] {
  const origin = positionsAngstrom[index];
  if (origin === undefined) return [];
  return positionsAngstrom
    .map((position, other) => ({ index: other, distanceAngstrom: distanceAngstrom(origin, position) }))
    .filter((near) => near.index !== index && near.distanceAngstrom <= withinAngstrom)
    .sort((a, b) => a.distanceAngstrom - b.distanceAngstrom)
    .slice(0, 8);
}

/** Å; for drawing only: hydrogen, second period, anything heavier. */
function drawnRadius(element: string): number {
  if (element === 'H') return 0.35;
  return ['B', 'C', 'N', 'O', 'F'].includes(element) ? 0.78 : 1.1;
}

/** Bonds to draw besides the metal–donor lines: those given, else contacts shorter than the drawn radii allow. */
export function drawnBonds(structure: ViewedStructure): (readonly [number, number])[] {
  const metals = new Set(structure.centres.map((centre) => centre.index));
  if (structure.bonds !== undefined) {
    return structure.bonds.filter(([a, b]) => !metals.has(a) && !metals.has(b));
  }
  const { elements, positionsAngstrom } = structure;
  return positionsAngstrom.flatMap((a, i) =>
    positionsAngstrom.slice(i + 1).flatMap((b, offset) => {
      const j = i + 1 + offset;
      if (metals.has(i) || metals.has(j)) return [];
      const reach = (drawnRadius(elements[i] ?? '') + drawnRadius(elements[j] ?? '')) * 1.1;
      return distanceAngstrom(a, b) < reach ? [[i, j] as const] : [];
    }),
  );
}
