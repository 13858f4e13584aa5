/** What must be equal before two energies may be subtracted. */
export interface LevelOfTheory {
  program: string | null;
  functional: string | null;
  basis: string | null;
  dispersion: string | null;
  solvation: string | null;
  relativity: string | null;
}

/**
 * One text per level of theory; runs of different texts are never compared by energy. The program belongs to it:
 * total energies of two programs differ by grids and thresholds even under one name of a functional.
 * @returns null when functional or basis is not printed, for then nobody knows what the energy is of
 */
export function levelKey(level: LevelOfTheory): string | null {
  if (level.functional === null || level.basis === null) return null;
  return [level.program, level.functional, level.basis, level.dispersion, level.solvation, level.relativity]
    .map((part) => (part ?? '–').toLowerCase())
    .join(' | ');
}

/** The level as people write it: "B3LYP/def2-svp, NWChem". */
export function levelWords(level: LevelOfTheory): string {
  const method = `${level.functional ?? 'functional not printed'}/${level.basis ?? 'basis not printed'}`;
  return [method, level.dispersion, level.solvation, level.relativity, level.program]
    .filter((part) => part !== null)
    .join(', ');
}
