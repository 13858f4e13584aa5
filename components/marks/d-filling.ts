/** One level of a ligand field: its symmetry label and how many d orbitals share it. */
export interface FieldLevel {
  label: string;
  orbitals: number;
}

export interface DField {
  name: string;
  /** Lowest level first. */
  levels: readonly FieldLevel[];
}

const unsplit: DField = { name: 'unsplit field', levels: [{ label: 'd', orbitals: 5 }] };

// Order of the levels for σ donors: common practice of ligand-field textbooks; real orders vary with the ligands.
const fields: Record<string, DField> = {
  'OC-6': {
    name: 'octahedral field',
    levels: [
      { label: 't2g', orbitals: 3 },
      { label: 'eg', orbitals: 2 },
    ],
  },
  'T-4': {
    name: 'tetrahedral field',
    levels: [
      { label: 'e', orbitals: 2 },
      { label: 't2', orbitals: 3 },
    ],
  },
  'SP-4': {
    name: 'square planar field',
    levels: [
      { label: 'eg', orbitals: 2 },
      { label: 'a1g', orbitals: 1 },
      { label: 'b2g', orbitals: 1 },
      { label: 'b1g', orbitals: 1 },
    ],
  },
  'TBPY-5': {
    name: 'trigonal bipyramidal field',
    levels: [
      { label: 'e″', orbitals: 2 },
      { label: 'e′', orbitals: 2 },
      { label: 'a1′', orbitals: 1 },
    ],
  },
  'SPY-5': {
    name: 'square pyramidal field',
    levels: [
      { label: 'e', orbitals: 2 },
      { label: 'b2', orbitals: 1 },
      { label: 'a1', orbitals: 1 },
      { label: 'b1', orbitals: 1 },
    ],
  },
  'TPR-6': {
    name: 'trigonal prismatic field',
    levels: [
      { label: 'a1′', orbitals: 1 },
      { label: 'e′', orbitals: 2 },
      { label: 'e″', orbitals: 2 },
    ],
  },
};

const flattenedTetrahedral: DField = {
  name: 'flattened tetrahedral field',
  levels: [
    { label: 'e', orbitals: 2 },
    { label: 't2, lower pair', orbitals: 2 },
    { label: 't2, upper', orbitals: 1 },
  ],
};

/** The field drawn for a polyhedral symbol; five orbitals in one row where no order is commonly agreed. */
export function dField(geometry: string, flattened = false): DField {
  if (geometry === 'T-4' && flattened) return flattenedTetrahedral;
  return fields[geometry] ?? unsplit;
}

/**
 * Electrons in each of the five d orbitals, lowest first: pairs as low as they go, then the unpaired ones.
 * @param dCount - d electrons, 0–10
 * @param multiplicity - 2S + 1 of the metal's own electrons
 * @returns five numbers 0–2; null when no such filling of five orbitals exists
 */
export function dFilling(dCount: number, multiplicity: number): number[] | null {
  const unpaired = multiplicity - 1;
  const pairs = (dCount - unpaired) / 2;
  if (!Number.isInteger(pairs) || !Number.isInteger(unpaired) || pairs < 0 || unpaired < 0) return null;
  if (pairs + unpaired > 5) return null;
  return [0, 1, 2, 3, 4].map((orbital) => (orbital < pairs ? 2 : orbital < pairs + unpaired ? 1 : 0));
}

/** Electrons per level, lowest first, with the level's label; null as for `dFilling`. */
export function dConfiguration(
  geometry: string,
  dCount: number,
  multiplicity: number,
  flattened = false,
): { label: string; electrons: number }[] | null {
  const filling = dFilling(dCount, multiplicity);
  if (filling === null) return null;
  let next = 0;
  return dField(geometry, flattened).levels.map(({ label, orbitals }) => {
    const electrons = filling.slice(next, next + orbitals).reduce((sum, count) => sum + count, 0);
    next += orbitals;
    return { label, electrons };
  });
}
