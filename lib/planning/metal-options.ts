import { dSeries } from '../chemistry/electron-configuration';
import type { LeftOutCandidate } from './candidate';
import { geometriesFor, type CoordinationGeometry } from './coordination-geometries';
import { localSpinStates, type LocalSpinState } from './local-spin-states';
import type { ResolvedComplex, ResolvedMetal } from './resolve-complex';
import type { Likelihood } from './spin-state-rules';

/** One geometry and one spin state of one metal. */
export interface MetalOption {
  geometry: string;
  state: LocalSpinState;
  likelihood: Likelihood;
  notes: readonly string[];
}

const rank: Record<Likelihood, number> = { usual: 0, possible: 1, rare: 2 };
export const lessLikely = (a: Likelihood, b: Likelihood): Likelihood => (rank[a] >= rank[b] ? a : b);

/** All geometries × spin states of one metal, and what was left out with the reason. */
export function metalOptions(
  metal: ResolvedMetal,
  complex: ResolvedComplex,
): { options: MetalOption[]; leftOut: LeftOutCandidate[] } {
  const series = dSeries(metal.element) ?? 3;
  const label = `${metal.element}(${metal.oxidationState})`;
  const options: MetalOption[] = [];
  const leftOut: LeftOutCandidate[] = [];
  for (const geometry of geometriesFor(metal.coordinationNumber)) {
    if (metal.geometry !== null && metal.geometry !== geometry.symbol) continue;
    // A geometry asked for by name is planned even where it would not be proposed.
    const barrier = metal.geometry === null ? geometryBarrier(geometry, metal, series, complex) : null;
    if (barrier !== null) {
      leftOut.push({ metal: label, geometry: geometry.symbol, unpaired: null, reason: barrier });
      continue;
    }
    const states = localSpinStates(geometry.symbol, metal.dElectrons, series);
    for (const state of states.leftOut) leftOut.push({ metal: label, geometry: geometry.symbol, ...state });
    const preference = geometryPreference(geometry, metal.dElectrons);
    for (const state of states.kept) {
      options.push({
        geometry: geometry.symbol,
        state,
        likelihood: lessLikely(state.likelihood, preference.likelihood),
        notes: [state.note, preference.note].filter((note) => note !== null),
      });
    }
  }
  return { options, leftOut };
}

function geometryBarrier(
  geometry: CoordinationGeometry,
  metal: ResolvedMetal,
  series: 3 | 4 | 5,
  complex: ResolvedComplex,
): string | null {
  const { symbol } = geometry;
  const ofOneMetal = complex.metals.length === 1;
  if (ofOneMetal && complex.ligands.some(({ ligand }) => ligand.planarMacrocycle))
    if (symbol === 'T-4' || symbol === 'TBPY-5' || symbol === 'TPR-6')
      return 'the macrocycle holds its four donors in one plane';
  if (symbol === 'T-4' && metal.dElectrons === 8 && series > 3)
    return 'a d8 ion of the 4d or 5d row is square-planar';
  if (symbol === 'TPR-6') {
    const chelates = complex.ligands.reduce(
      (sum, { ligand, count }) => sum + (ligand.donors.length >= 2 ? count * (ligand.donors.length - 1) : 0),
      0,
    );
    if (ofOneMetal && chelates < 3)
      return 'nothing holds a trigonal prism: six separate donors twist to OC-6';
    if (metal.dElectrons >= 3 && metal.dElectrons !== 5 && metal.dElectrons !== 10)
      return 'the ligand field favours OC-6; a prism is met for d0 to d2, high-spin d5 and d10';
  }
  return null;
}

/** Heuristic site preferences (Cotton and Wilkinson; Greenwood and Earnshaw; from memory). */
function geometryPreference(
  geometry: CoordinationGeometry,
  dElectrons: number,
): { likelihood: Likelihood; note: string | null } {
  if (!geometry.usual) return { likelihood: 'rare', note: 'seldom; chelates with a small bite hold it' };
  if (geometry.symbol === 'SP-4' && [0, 1, 2, 3].includes(dElectrons))
    return { likelihood: 'rare', note: 'no ligand-field reason for a square plane' };
  if (geometry.symbol === 'SP-4' && (dElectrons === 10 || dElectrons === 5))
    return { likelihood: 'possible', note: 'no ligand-field reason for a square plane; macrocycles hold it' };
  if (geometry.symbol === 'T-4' && dElectrons === 3)
    return { likelihood: 'rare', note: 'large octahedral site preference of d3' };
  if (geometry.symbol === 'T-4' && dElectrons === 9)
    return { likelihood: 'usual', note: 'a regular tetrahedron does not occur: start flattened' };
  return { likelihood: 'usual', note: null };
}
