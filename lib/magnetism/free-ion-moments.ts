/** Free-ion quantities of a dⁿ ion with a given number of unpaired electrons; moments in μ_B. */
export interface FreeIonMoments {
  spin: number;
  /** Total orbital quantum number L used for the limit */
  orbitalL: number;
  spinOnly: number;
  /** μ(S+L) = √(4S(S + 1) + L(L + 1)): spin and orbit both free, uncoupled */
  spinPlusOrbit: number;
  /** μ(J) = g_J √(J(J + 1)) of the Hund ground level; null for spin states below the Hund maximum */
  totalJ: number | null;
}

/** L of the Hund ground term of dⁿ: S, D, F, F, D, S, D, F, F, D, S for n = 0 … 10. */
const hundL = [0, 2, 3, 3, 2, 0, 2, 3, 3, 2, 0];

const hundUnpaired = (dCount: number) => (dCount <= 5 ? dCount : 10 - dCount);

/** Landé factor times √(J(J + 1)). */
function jMoment(spin: number, orbitalL: number, j: number): number {
  if (j === 0) return 0;
  const lande = 1.5 + (spin * (spin + 1) - orbitalL * (orbitalL + 1)) / (2 * j * (j + 1));
  return lande * Math.sqrt(j * (j + 1));
}

/**
 * Spin-only, spin-plus-orbit and J moments of a dⁿ ion. For the Hund spin state L is that of the ground term; for
 * fewer unpaired electrons the free ion has no unique term and L is taken from the Hund term with as many unpaired
 * electrons (0 when there are none), which serves as a limit only.
 * @param dCount - number of d electrons, 0–10
 * @param unpaired - number of unpaired electrons
 * @returns null when dⁿ cannot carry that many unpaired electrons
 * Source: Van Vleck, The Theory of Electric and Magnetic Susceptibilities (1932); Hund's rules.
 * Checked against: tests/published/magnetism-spin-only.test.ts.
 */
export function freeIonMoments(dCount: number, unpaired: number): FreeIonMoments | null {
  if (!Number.isInteger(dCount) || dCount < 0 || dCount > 10)
    throw new RangeError(`dCount must be a whole number from 0 to 10, received ${dCount}`);
  const most = hundUnpaired(dCount);
  if (!Number.isInteger(unpaired) || unpaired < 0 || unpaired > most || (most - unpaired) % 2 !== 0)
    return null;
  const spin = unpaired / 2;
  const isHund = unpaired === most;
  const orbitalL = (isHund ? hundL[dCount] : hundL[unpaired]) ?? 0;
  const j = dCount < 5 ? Math.abs(orbitalL - spin) : orbitalL + spin;
  return {
    spin,
    orbitalL,
    spinOnly: Math.sqrt(unpaired * (unpaired + 2)),
    spinPlusOrbit: Math.sqrt(4 * spin * (spin + 1) + orbitalL * (orbitalL + 1)),
    totalJ: isHund ? jMoment(spin, orbitalL, j) : null,
  };
}
