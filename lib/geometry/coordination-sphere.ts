import { type BondGraph, COINCIDENCE_ANGSTROM } from '../chemistry/bonds';
import { covalentRadiusAngstrom, type SpinState } from '../chemistry/covalent-radii';
import { angleDegrees, distance, subtract } from '../chemistry/linear-algebra';
import { forEachNeighbourPair } from '../chemistry/neighbour-pairs';
import type { Structure, Vector3 } from '../chemistry/structure';

/** Every distance below is measured against a sum of covalent radii (Cordero 2008), Å. Common practice. */
export const SPHERE_TOLERANCES = {
  /** A donor lies within the sum of radii + this. */
  donor: 0.45,
  /** Beyond it a donor must follow the one before without a gap … */
  gap: 0.3,
  /** … and within the sum of (smaller) radii + this. */
  stretchedDonor: 0.75,
  /** A long contact lies within the sum of (smaller) radii + this. */
  longContact: 0.9,
  /** An atom bonded to a donor is not a donor itself when it is this much farther out. */
  behindDonor: 0.2,
} as const;
/** A long contact keeps at least this angle from every donor. Common practice. */
const LONG_CONTACT_ANGLE_DEGREES = 50;

/** A bond that counts for "behind a donor" exceeds the sum of radii by no more than this. Common practice. */
const SHORT_BOND_TOLERANCE = 0.15;

/** Elements with a lone pair to give: only these are long contacts or stretched donors. */
const lonePairElements = new Set(['N', 'O', 'F', 'P', 'S', 'Cl', 'As', 'Se', 'Br', 'Te', 'I']);
const nobleGases = new Set(['He', 'Ne', 'Ar', 'Kr', 'Xe', 'Rn']);

export interface SphereContact {
  index: number;
  element: string;
  distanceAngstrom: number;
}

export interface CoordinationSphere {
  /** Index of the metal. */
  index: number;
  element: string;
  /** By distance, then index. */
  donors: SphereContact[];
  /** Second band: contacts beyond the sphere, such as Jahn–Teller axial ligands. By distance. */
  longContacts: SphereContact[];
  /** Other metals within the sum of (smaller) radii + 0.45 Å; never counted as donors. */
  metalContacts: SphereContact[];
}

/** Donors that a person added to or took out of one centre. */
export interface DonorChange {
  centre: number;
  add: readonly number[];
  remove: readonly number[];
}

export interface SphereOptions {
  /** Spin state of metals by atom index; without it Mn, Fe and Co count with their larger radius. */
  spinStates?: ReadonlyMap<number, SpinState>;
  donorChanges?: readonly DonorChange[];
}

interface Candidate extends SphereContact {
  /** Distance beyond the sum of radii in force. */
  excess: number;
  /** Distance beyond the sum with the metal's smaller radius. */
  compactExcess: number;
}

/**
 * The coordination sphere of every metal of a structure.
 * A donor is a non-metal within the sum of covalent radii + 0.45 Å. Farther lone-pair atoms follow as long as
 * no gap above 0.3 Å opens, so that a stretched bond is not cut off by a line on the ruler. Left out: atoms
 * behind a donor (bonded to one and 0.2 Å farther out, such as the carbon of a chelating carboxylate) and
 * hydrogens, save hydrides (bonded to no non-metal but hydrogen or boron).
 * Beyond the sphere, lone-pair atoms that are not bonded to a donor and keep 50° from every donor are long
 * contacts, up to the sum of radii + 0.9 Å.
 * @param graph - bonds of the same structure (`findBonds`)
 * @returns one sphere per metal, in atom order; a lone metal has no donors
 * Errors: throws RangeError when a donor change names an atom or a centre that is not there.
 * Source of the radii: lib/chemistry/covalent-radii.ts; the tolerances are common practice.
 */
export function findSpheres(
  structure: Structure,
  graph: BondGraph,
  options: SphereOptions = {},
): CoordinationSphere[] {
  const { elements } = structure;
  const metals = graph.metals.flatMap((metal, index) => (metal ? [index] : []));
  const contacts = contactsOf(structure, metals, options);
  const changes = new Map((options.donorChanges ?? []).map((change) => [change.centre, change]));
  for (const centre of changes.keys()) {
    if (!graph.metals[centre])
      throw new RangeError(`donor change for atom ${centre}, which is no metal centre`);
  }
  return metals.map((index) => {
    const { candidates, metalContacts } = contacts.get(index) ?? { candidates: [], metalContacts: [] };
    candidates.sort((a, b) => a.excess - b.excess || a.index - b.index);
    const found = chooseDonors(candidates, graph, structure);
    const donors = changeDonors(structure, index, found, changes.get(index));
    const removed = new Set(changes.get(index)?.remove);
    const longContacts = chooseLongContacts(structure, graph.neighbours, index, donors, candidates).filter(
      (contact) => !removed.has(contact.index),
    );
    return {
      index,
      element: elements[index] ?? '',
      donors: donors.map(toContact).sort(byDistance),
      longContacts: longContacts.map(toContact).sort(byDistance),
      metalContacts: metalContacts.sort(byDistance),
    };
  });
}

const byDistance = (a: SphereContact, b: SphereContact) =>
  a.distanceAngstrom - b.distanceAngstrom || a.index - b.index;

const toContact = ({ index, element, distanceAngstrom }: SphereContact): SphereContact => ({
  index,
  element,
  distanceAngstrom,
});

type Contacts = Map<number, { candidates: Candidate[]; metalContacts: SphereContact[] }>;

/** Everything within reach of each metal, sorted into possible donors and other metals. */
function contactsOf(structure: Structure, metals: readonly number[], options: SphereOptions): Contacts {
  const { elements, positionsAngstrom } = structure;
  const radiusOf = new Map<string, number | null>();
  for (const element of new Set(elements)) radiusOf.set(element, covalentRadiusAngstrom(element));
  const contacts: Contacts = new Map(metals.map((index) => [index, { candidates: [], metalContacts: [] }]));
  if (metals.length === 0) return contacts;

  const metalSet = new Set(metals);
  const radiusInForce = new Map(
    metals.map((index) => [
      index,
      covalentRadiusAngstrom(elements[index] ?? '', options.spinStates?.get(index) ?? 'high'),
    ]),
  );
  const largest = Math.max(...[...radiusInForce.values()].map((radius) => radius ?? 0));
  const largestOther = Math.max(...[...radiusOf.values()].map((radius) => radius ?? 0));
  const cutoff = largest + Math.max(largestOther, 0) + SPHERE_TOLERANCES.longContact;

  const take = (metal: number, other: number, distanceAngstrom: number) => {
    const entry = contacts.get(metal);
    const element = elements[other] ?? '';
    const own = radiusInForce.get(metal);
    const compact = radiusOf.get(elements[metal] ?? '');
    const theirs = radiusOf.get(element);
    if (!entry || own == null || compact == null || theirs == null) return;
    const compactExcess = distanceAngstrom - compact - theirs;
    if (metalSet.has(other)) {
      if (compactExcess <= SPHERE_TOLERANCES.donor)
        entry.metalContacts.push({ index: other, element, distanceAngstrom });
      return;
    }
    const excess = distanceAngstrom - own - theirs;
    if (excess > SPHERE_TOLERANCES.donor && compactExcess > SPHERE_TOLERANCES.longContact) return;
    entry.candidates.push({ index: other, element, distanceAngstrom, excess, compactExcess });
  };
  forEachNeighbourPair(positionsAngstrom, cutoff, (first, second, distanceAngstrom) => {
    if (distanceAngstrom < COINCIDENCE_ANGSTROM) return;
    if (metalSet.has(first)) take(first, second, distanceAngstrom);
    if (metalSet.has(second)) take(second, first, distanceAngstrom);
  });
  return contacts;
}

/** @param candidates - by ascending excess */
function chooseDonors(candidates: readonly Candidate[], graph: BondGraph, structure: Structure): Candidate[] {
  const { neighbours } = graph;
  const { elements } = structure;
  const donors: Candidate[] = [];
  const excessOf = new Map<number, number>();
  let farthest = -Infinity;
  for (const candidate of candidates) {
    const { index, element, excess, compactExcess } = candidate;
    if (nobleGases.has(element)) continue;
    if (element === 'H' && !isHydride(index, graph, elements)) continue;
    if (excess > SPHERE_TOLERANCES.donor) {
      const stretched =
        lonePairElements.has(element) &&
        compactExcess <= SPHERE_TOLERANCES.stretchedDonor &&
        excess - farthest <= SPHERE_TOLERANCES.gap;
      if (!stretched) continue;
    }
    const behind = (neighbours[index] ?? []).some((neighbour) => {
      const nearer = excessOf.get(neighbour);
      return (
        nearer !== undefined &&
        excess - nearer > SPHERE_TOLERANCES.behindDonor &&
        isShortBond(structure, index, neighbour)
      );
    });
    if (behind) continue;
    donors.push(candidate);
    excessOf.set(index, excess);
    farthest = excess;
  }
  return donors;
}

/**
 * Whether two neighbours are surely bonded: crowded donors of a distorted sphere may come within the usual
 * tolerance of a bond without belonging to one ligand.
 */
function isShortBond(structure: Structure, a: number, b: number): boolean {
  const [first, second] = [structure.positionsAngstrom[a], structure.positionsAngstrom[b]];
  const radii = [a, b].map((atom) => covalentRadiusAngstrom(structure.elements[atom] ?? '') ?? 0);
  return (
    first !== undefined &&
    second !== undefined &&
    distance(first, second) <= (radii[0] ?? 0) + (radii[1] ?? 0) + SHORT_BOND_TOLERANCE
  );
}

function isHydride(index: number, graph: BondGraph, elements: readonly string[]): boolean {
  return (graph.neighbours[index] ?? []).every((neighbour) => {
    const element = elements[neighbour] ?? '';
    return element === 'H' || element === 'B' || graph.metals[neighbour];
  });
}

function chooseLongContacts(
  structure: Structure,
  neighbours: BondGraph['neighbours'],
  metal: number,
  donors: readonly SphereContact[],
  candidates: readonly Candidate[],
): Candidate[] {
  const donorIndices = new Set(donors.map((donor) => donor.index));
  const from = (index: number): Vector3 =>
    subtract(
      structure.positionsAngstrom[index] ?? [0, 0, 0],
      structure.positionsAngstrom[metal] ?? [0, 0, 0],
    );
  return candidates.filter(
    (candidate) =>
      !donorIndices.has(candidate.index) &&
      lonePairElements.has(candidate.element) &&
      candidate.compactExcess <= SPHERE_TOLERANCES.longContact &&
      !(neighbours[candidate.index] ?? []).some((neighbour) => donorIndices.has(neighbour)) &&
      donors.every(
        (donor) => angleDegrees(from(donor.index), from(candidate.index)) >= LONG_CONTACT_ANGLE_DEGREES,
      ),
  );
}

function changeDonors(
  structure: Structure,
  metal: number,
  found: readonly SphereContact[],
  change: DonorChange | undefined,
): readonly SphereContact[] {
  if (!change) return found;
  const kept = found.filter((donor) => !change.remove.includes(donor.index));
  const added = [...new Set(change.add)].flatMap((index): SphereContact[] => {
    const [element, position] = [structure.elements[index], structure.positionsAngstrom[index]];
    const centre = structure.positionsAngstrom[metal];
    if (element === undefined || !position || !centre || index === metal) {
      throw new RangeError(
        `donor ${index} for centre ${metal}: indices run from 0 to ${structure.elements.length - 1}`,
      );
    }
    if (kept.some((donor) => donor.index === index)) return [];
    return [{ index, element, distanceAngstrom: distance(position, centre) }];
  });
  return [...kept, ...added];
}
