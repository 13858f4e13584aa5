import { cross, dot, subtract } from '../chemistry/linear-algebra';
import type { Vector3 } from '../chemistry/structure';
import { type OctahedralPairs, octahedralPairs } from './octahedral-pairs';

/** Below this share of the regular volume the sphere is flat, and a regular polyhedron of its volume means nothing. */
const FLAT = 1e-3;

/**
 * Quadratic elongation ⟨λ⟩ = (1/n) Σ (lᵢ/l₀)², l₀ the centre-to-vertex distance of the regular polyhedron of
 * the same volume: V = (4/3) l₀³ for an octahedron, V = (8√3/27) l₀³ for a tetrahedron.
 * @param donors - relative to the metal
 * @param pairs - the trans pairs of six donors, when known already
 * @returns 1 for the regular polyhedron, larger otherwise; null unless there are four or six donors, and
 * for flat spheres (a square plane encloses no volume)
 * Source: K. Robinson, G. V. Gibbs, P. H. Ribbe, Science 1971, 172, 567. Checked against:
 * tests/published/geometry.test.ts.
 */
export function quadraticElongation(donors: readonly Vector3[], pairs?: OctahedralPairs): number | null {
  const n = donors.length;
  if (n !== 4 && n !== 6) return null;
  const meanSquare = donors.reduce((sum, donor) => sum + dot(donor, donor), 0) / n;
  const perCube = n === 6 ? 4 / 3 : (8 * Math.sqrt(3)) / 27;
  const volume =
    n === 6 ? octahedronVolume(donors, pairs ?? octahedralPairs(donors)) : tetrahedronVolume(donors);
  if (!(volume > FLAT * perCube * meanSquare ** 1.5)) return null;
  return meanSquare / (volume / perCube) ** (2 / 3);
}

function tetrahedronVolume(donors: readonly Vector3[]): number {
  const [a, b, c, d] = donors as [Vector3, Vector3, Vector3, Vector3];
  return Math.abs(dot(subtract(b, a), cross(subtract(c, a), subtract(d, a)))) / 6;
}

/** Eight tetrahedra from the metal to the faces. */
function octahedronVolume(donors: readonly Vector3[], [first, second, third]: OctahedralPairs): number {
  let volume = 0;
  for (const i of first) {
    for (const j of second) {
      const [a, b] = [donors[i], donors[j]];
      if (!a || !b) continue;
      const normal = cross(a, b);
      for (const k of third) volume += Math.abs(dot(normal, donors[k] ?? [0, 0, 0])) / 6;
    }
  }
  return volume;
}
