import type { CentreDescription } from './centre-description';

export interface SphereChange {
  /** Atom index of the metal. */
  centre: number;
  element: string;
  donorsLost: number[];
  donorsGained: number[];
  coordinationNumber: { start: number; end: number };
  /** Nearest ideal polyhedron, IUPAC symbol; null where the coordination number has none. */
  nearest: { start: string | null; end: string | null };
  /** Change of the mean distance, Å; null when either has none. */
  meanDistanceChangeAngstrom: number | null;
  /** Whether donors or nearest polyhedron changed. */
  changed: boolean;
}

/**
 * What moved in each coordination sphere between two geometries of the same atoms in the same order (start and
 * end of an optimisation). Centres are paired by atom index; a centre that only one of them has is left out.
 */
export function sphereChanges(
  start: readonly CentreDescription[],
  end: readonly CentreDescription[],
): SphereChange[] {
  return start.flatMap((before): SphereChange[] => {
    const after = end.find((centre) => centre.index === before.index && centre.element === before.element);
    if (!after) return [];
    const [donorsBefore, donorsAfter] = [before, after].map((centre) =>
      centre.donors.map((donor) => donor.index),
    );
    const donorsLost = (donorsBefore ?? []).filter((donor) => !donorsAfter?.includes(donor));
    const donorsGained = (donorsAfter ?? []).filter((donor) => !donorsBefore?.includes(donor));
    const [meanBefore, meanAfter] = [before.meanDistanceAngstrom, after.meanDistanceAngstrom];
    return [
      {
        centre: before.index,
        element: before.element,
        donorsLost,
        donorsGained,
        coordinationNumber: { start: before.coordinationNumber, end: after.coordinationNumber },
        nearest: { start: before.nearest, end: after.nearest },
        meanDistanceChangeAngstrom: meanBefore === null || meanAfter === null ? null : meanAfter - meanBefore,
        changed: donorsLost.length > 0 || donorsGained.length > 0 || before.nearest !== after.nearest,
      },
    ];
  });
}
