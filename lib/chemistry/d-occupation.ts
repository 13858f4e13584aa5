import type { LigandFieldLevel } from './ligand-field-levels';

export interface OccupiedLevel extends LigandFieldLevel {
  electrons: number;
  /** Unpaired electrons in this set of orbitals. */
  unpaired: number;
}

export interface DOccupation {
  levels: readonly OccupiedLevel[];
  /** For example "t2g4 eg2" or "(xz,yz)4 (z2)2 (xy)1 (x2-y2)0", in the order of the levels. */
  text: string;
  unpaired: number;
  /** One-electron stabilisation, octahedral Dq; pairing energy not included. */
  stabilisationDq: number;
}

/**
 * Lowest occupation of a set of d levels for a number of electrons and of unpaired electrons: with
 * p = (n − u)/2 pairs and u single electrons, the p lowest orbitals hold pairs, the next u one each.
 * Convention: order of levels as given; within a degenerate set Hund's rule.
 * @param dElectrons - 0–10
 * @param unpaired - same parity as `dElectrons`, at most min(n, 10 − n)
 * @returns null when that many unpaired electrons cannot be placed
 */
export function dOccupation(
  levels: readonly LigandFieldLevel[],
  dElectrons: number,
  unpaired: number,
): DOccupation | null {
  const most = Math.min(dElectrons, 10 - dElectrons);
  if (unpaired < 0 || unpaired > most || (dElectrons - unpaired) % 2 !== 0) return null;
  let pairs = (dElectrons - unpaired) / 2;
  let singles = unpaired;
  const occupied = levels.map((item) => {
    const size = item.orbitals.length;
    const doubly = Math.min(pairs, size);
    const singly = Math.min(singles, size - doubly);
    pairs -= doubly;
    singles -= singly;
    return { ...item, electrons: 2 * doubly + singly, unpaired: singly };
  });
  return {
    levels: occupied,
    text: occupied.map((item) => occupancy(item.label, item.electrons)).join(' '),
    unpaired,
    stabilisationDq: occupied.reduce((sum, item) => sum + item.electrons * item.energyDq, 0),
  };
}

/** "t2g4", "t2^3", "(z2)1": a label that ends in a digit must not run into the number of electrons. */
function occupancy(label: string, electrons: number): string {
  if (label === 't2') return `t2^${electrons}`;
  return label.startsWith('(') || ['t2g', 'eg', 'e'].includes(label)
    ? `${label}${electrons}`
    : `(${label})${electrons}`;
}

/** Unpaired electrons when levels fill strictly from below, Hund's rule only within a degenerate set. */
export function strongFieldUnpaired(levels: readonly LigandFieldLevel[], dElectrons: number): number {
  let left = dElectrons;
  let unpaired = 0;
  for (const item of levels) {
    const here = Math.min(left, 2 * item.orbitals.length);
    unpaired += Math.min(here, 2 * item.orbitals.length - here);
    left -= here;
  }
  return unpaired;
}
