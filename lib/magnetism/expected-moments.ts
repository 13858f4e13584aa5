import { freeIonMoments } from './free-ion-moments';
import { momentBands } from './moment-bands';

/** A metal ion: element symbol (IUPAC case), oxidation state, number of d electrons. */
export interface MetalIon {
  element: string;
  oxidationState: number;
  dCount: number;
}

/** Where a measured moment is expected, μ_B per metal ion. */
export interface ExpectedMoments {
  low: number;
  high: number;
  spinOnly: number;
  /** Upper free-ion limit μ(S+L) */
  spinPlusOrbit: number;
  /**
   * soft: a handbook range recalled, not seen again; limits: no range for this ion, spin state and geometry,
   * so low and high are the spin-only and free-ion limits; handbook: a range that was read in the source.
   */
  tag: 'handbook' | 'soft' | 'limits';
  source: string;
  /** The widest range met in print, when it differs from low … high */
  wider: { low: number; high: number } | null;
  confidence: 'high' | 'medium' | 'low';
  note: string | null;
}

/** Moments up to this value are read as diamagnetic (temperature-independent part and impurity); common practice. */
const DIAMAGNETIC_LIMIT = 0.5;

function limitsBand(spinOnly: number, spinPlusOrbit: number, dCount: number): ExpectedMoments {
  const notes = ['no handbook range for this ion, spin state and geometry'];
  if (dCount < 5 && spinOnly > 0)
    notes.push('spin–orbit coupling may bring ions of the first half of the series slightly below spin-only');
  return {
    low: spinOnly,
    high: spinOnly === 0 ? DIAMAGNETIC_LIMIT : spinPlusOrbit,
    spinOnly,
    spinPlusOrbit,
    tag: 'limits',
    source: 'spin-only √(n(n + 2)) to free-ion √(4S(S + 1) + L(L + 1))',
    wider: null,
    confidence: 'low',
    note: notes.join('; '),
  };
}

/**
 * Band of room-temperature moments for one candidate: a handbook range where one exists for the ion, the spin state
 * and the geometry, otherwise the limits from spin-only to μ(S+L), so labelled.
 * @param ion - element, oxidation state and d count (0–10)
 * @param multiplicity - 2S + 1
 * @param geometry - IUPAC polyhedral symbol such as OC-6; null when unknown (then limits only, unless any geometry)
 * @returns null when the d count cannot carry this multiplicity
 * Checked against: tests/published/magnetism-spin-only.test.ts.
 */
export function expectedMoments(
  ion: MetalIon,
  multiplicity: number,
  geometry: string | null,
): ExpectedMoments | null {
  const unpaired = multiplicity - 1;
  const free = freeIonMoments(ion.dCount, unpaired);
  if (free === null) return null;
  const row = momentBands.find(
    (band) =>
      band.element === ion.element &&
      band.oxidationState === ion.oxidationState &&
      band.unpaired === unpaired &&
      (band.geometries.includes('any') || (geometry !== null && band.geometries.includes(geometry))),
  );
  if (!row) return limitsBand(free.spinOnly, free.spinPlusOrbit, ion.dCount);
  return {
    low: row.low,
    high: row.high,
    spinOnly: free.spinOnly,
    spinPlusOrbit: free.spinPlusOrbit,
    tag: 'soft',
    source: row.seen === null ? row.source : `${row.source}; seen: ${row.seen}`,
    wider: row.wider,
    confidence: row.confidence,
    note: row.note,
  };
}
