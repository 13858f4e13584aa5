import { electronCount, multiplicityFits } from '../../chemistry/electron-count';
import type { DeckRefusal, DeckRequest, MagneticSite } from './deck-request';

/** The parts a broken-symmetry guess is put together from. */
export interface BrokenSymmetryPlan {
  sites: readonly MagneticSite[];
  flipped: readonly MagneticSite[];
  highSpinMultiplicity: number;
  /** Everything that is no site, closed shell. Empty when every atom is a site. */
  rest: { atomIndices: readonly number[]; charge: number };
}

const bad = (message: string): { refusal: DeckRefusal } => ({ refusal: { code: 'bad sites', message } });

/** Check the magnetic sites of a request against its atoms, charge, multiplicity and electrons. */
export function brokenSymmetryPlan(
  request: DeckRequest,
): { plan: BrokenSymmetryPlan } | { refusal: DeckRefusal } {
  const sites = request.sites ?? [];
  const { elements } = request.structure;
  const flipped = sites.filter((site) => !site.spinUp);
  if (sites.length < 2 || flipped.length === 0 || flipped.length === sites.length)
    return bad('broken symmetry needs at least two magnetic sites, some of them flipped');
  if (new Set(sites.map((site) => site.atomIndex)).size !== sites.length)
    return bad('an atom is named twice among the magnetic sites');
  for (const site of sites) {
    const element = elements[site.atomIndex];
    if (element === undefined) return bad(`there is no atom ${site.atomIndex + 1} for a magnetic site`);
    const electrons = electronCount([element], site.oxidationState);
    if (site.unpaired < 1 || electrons === null || !multiplicityFits(electrons, site.unpaired + 1))
      return bad(
        `${element} with charge ${site.oxidationState} cannot have ${site.unpaired} unpaired electrons`,
      );
  }
  const total = sites.reduce((sum, site) => sum + site.unpaired, 0);
  const net = total - 2 * flipped.reduce((sum, site) => sum + site.unpaired, 0);
  if (net + 1 !== request.multiplicity)
    return bad(
      `the sites leave ${net} unpaired electrons, the multiplicity says ${request.multiplicity - 1}`,
    );
  const named = new Set(sites.map((site) => site.atomIndex));
  const atomIndices = elements.flatMap((_, index) => (named.has(index) ? [] : [index]));
  const charge = request.charge - sites.reduce((sum, site) => sum + site.oxidationState, 0);
  const restElectrons = electronCount(
    atomIndices.map((index) => elements[index] ?? ''),
    charge,
  );
  if (restElectrons === null || restElectrons % 2 !== 0)
    return bad('the atoms beside the magnetic sites do not make a closed shell; check the oxidation states');
  return { plan: { sites, flipped, highSpinMultiplicity: total + 1, rest: { atomIndices, charge } } };
}
