import { anionRadiiAngstrom, cationRadii } from '../chemistry/ionic-radii';
import type { SpinState } from '../chemistry/covalent-radii';

export interface IonicRadiusSum {
  oxidationState: number;
  spinState: SpinState | null;
  cationRadiusAngstrom: number;
  /** Mean over the donors of cation radius + anion radius. */
  meanSumAngstrom: number;
}

/**
 * Sum of ionic radii to set beside a mean metal–donor distance, for each oxidation and spin state of the
 * metal that the table has at this coordination number.
 * Convention: donors stand as O²⁻, F⁻, Cl⁻, Br⁻, I⁻, S²⁻ (six-coordinate) and N³⁻ (four-coordinate), the only
 * forms the table has; for neutral donors the sum is a yardstick, not a prediction.
 * @param squarePlanar - takes the square-planar entries of four-coordinate ions where there are any
 * @returns [] when the table has no such ion or a donor element is missing from it
 * Source: R. D. Shannon, Acta Cryst. 1976, A32, 751.
 */
export function ionicRadiusSums(
  metal: string,
  donorElements: readonly string[],
  coordinationNumber: number,
  squarePlanar: boolean,
): IonicRadiusSum[] {
  const anions = donorElements.map((element) => anionRadiiAngstrom[element]);
  if (anions.length === 0 || anions.some((radius) => radius === undefined)) return [];
  const anionMean = anions.reduce<number>((sum, radius) => sum + (radius ?? 0), 0) / anions.length;
  return cationRadii
    .filter(
      (ion) =>
        ion.element === metal &&
        ion.coordinationNumber === coordinationNumber &&
        ion.squarePlanar === (squarePlanar && coordinationNumber === 4),
    )
    .map((ion) => ({
      oxidationState: ion.oxidationState,
      spinState: ion.spinState,
      cationRadiusAngstrom: ion.radiusAngstrom,
      meanSumAngstrom: ion.radiusAngstrom + anionMean,
    }));
}
