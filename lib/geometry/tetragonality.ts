import { angleDegrees, norm } from '../chemistry/linear-algebra';
import type { Vector3 } from '../chemistry/structure';
import { type OctahedralPairs, octahedralPairs } from './octahedral-pairs';
import { sphereAngles } from './sphere-angles';

export interface AxialSplit {
  /** Positions in the list given: axial contacts (one or two). */
  axial: number[];
  equatorial: number[];
  meanAxialAngstrom: number;
  meanEquatorialAngstrom: number;
  /** Mean equatorial ÷ mean axial distance: below 1 elongated, above 1 compressed. */
  tetragonality: number;
  kind: 'elongated' | 'compressed' | 'regular';
}

/** Axial and equatorial means closer than this are called regular. Common practice. */
const REGULAR_ANGSTROM = 0.02;
/** Two long contacts farther from a straight line than this do not share an axis. */
const STRAIGHT_DEGREES = 150;

/**
 * Axial and equatorial distances of a sphere.
 * Six donors: the axis is the trans pair whose mean differs most from that of the other four. Five donors:
 * the apex of a square pyramid, or both poles of a trigonal bipyramid when τ₅ ≥ 0.5. Four donors with one
 * long contact or two on one line ("4 + 2"): the long contacts are axial.
 * @param donors - relative to the metal, Å
 * @param longContacts - likewise; counted behind the donors in the positions returned
 * @param pairs - the trans pairs of six donors, when known already
 * @returns null for other spheres
 * Source of the ratio: B. J. Hathaway & D. E. Billing, Coord. Chem. Rev. 1970, 5, 143 (from memory).
 */
export function axialSplit(
  donors: readonly Vector3[],
  longContacts: readonly Vector3[],
  pairs?: OctahedralPairs,
): AxialSplit | null {
  const lengths = [...donors, ...longContacts].map(norm);
  const axial = axialPositions(donors, longContacts, lengths, pairs);
  if (!axial) return null;
  const members = lengths.map((_, i) => i).filter((i) => i < donors.length || axial.includes(i));
  const equatorial = members.filter((i) => !axial.includes(i));
  const mean = (positions: readonly number[]) =>
    positions.reduce((sum, i) => sum + (lengths[i] ?? 0), 0) / positions.length;
  const [meanAxialAngstrom, meanEquatorialAngstrom] = [mean(axial), mean(equatorial)];
  const difference = meanAxialAngstrom - meanEquatorialAngstrom;
  const kind =
    Math.abs(difference) < REGULAR_ANGSTROM ? 'regular' : difference > 0 ? 'elongated' : 'compressed';
  return {
    axial,
    equatorial,
    meanAxialAngstrom,
    meanEquatorialAngstrom,
    tetragonality: meanEquatorialAngstrom / meanAxialAngstrom,
    kind,
  };
}

function axialPositions(
  donors: readonly Vector3[],
  longContacts: readonly Vector3[],
  lengths: readonly number[],
  pairs: OctahedralPairs | undefined,
): number[] | null {
  if (donors.length === 6) {
    const total = lengths.slice(0, 6).reduce((sum, d) => sum + d, 0);
    const contrast = ([i, j]: readonly [number, number]) => {
      const pair = (lengths[i] ?? 0) + (lengths[j] ?? 0);
      return Math.abs(pair / 2 - (total - pair) / 4);
    };
    return [...([...(pairs ?? octahedralPairs(donors))].sort((a, b) => contrast(b) - contrast(a))[0] ?? [])];
  }
  if (donors.length === 5) {
    const [largest, second] = sphereAngles(donors).sort((a, b) => b.degrees - a.degrees);
    if (!largest || !second) return null;
    if (largest.degrees - second.degrees >= 30) return [largest.first, largest.second];
    const base = new Set([largest.first, largest.second, second.first, second.second]);
    const apex = [0, 1, 2, 3, 4].filter((i) => !base.has(i));
    return apex.length === 1 ? apex : null;
  }
  if (donors.length === 4 && longContacts.length === 1) return [4];
  if (donors.length === 4 && longContacts.length === 2) {
    const [a, b] = longContacts as [Vector3, Vector3];
    return angleDegrees(a, b) >= STRAIGHT_DEGREES ? [4, 5] : null;
  }
  return null;
}
