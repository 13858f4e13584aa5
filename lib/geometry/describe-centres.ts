import { type BondGraph, findBonds } from '../chemistry/bonds';
import { covalentRadiusAngstrom } from '../chemistry/covalent-radii';
import type { Structure, Vector3 } from '../chemistry/structure';
import { norm, subtract } from '../chemistry/linear-algebra';
import { angleVarianceDegrees2 } from './angle-variance';
import { baurDistortion } from './baur-distortion';
import { bondValenceSums, supportedOxidationState } from './bond-valence-sum';
import type { CentreDescription } from './centre-description';
import { chelatePlaneAngleDegrees, chelateRings } from './chelate-rings';
import { coordinationSites } from './coordination-sites';
import { type CoordinationSphere, findSpheres, type SphereOptions } from './coordination-sphere';
import { distancesByElement } from './distances-by-element';
import { interconversionPath } from './interconversion-path';
import { ionicRadiusSums } from './ionic-radius-sum';
import { meanSquareDistortion } from './mean-square-distortion';
import { type OctahedralPairs, octahedralPairs } from './octahedral-pairs';
import { planeDisplacement } from './plane-displacement';
import { quadraticElongation } from './quadratic-elongation';
import { sigmaDegrees } from './sigma';
import { type SphereAngle, sphereAngles } from './sphere-angles';
import { sphereShapes } from './sphere-shapes';
import { tau4 } from './tau4';
import { tau4Prime } from './tau4-prime';
import { tau5 } from './tau5';
import { axialSplit } from './tetragonality';
import { thetaDegrees } from './theta';

export interface DescribeOptions extends SphereOptions {
  /** Bonds of the structure when they are known already; found here otherwise. */
  bonds?: BondGraph;
}

/** Angles above this are called trans outside six-coordination. Common practice. */
const TRANS_DEGREES = 135;
/** Angles are listed up to this many sites; a larger sphere is a cluster or a misreading. */
const MOST_SITES_WITH_ANGLES = 16;

/**
 * Everything Spinstead says about the metal centres of a structure, in atom order.
 * @param structure - one molecule or cut-out, Å
 * @param options - spin states, donors changed by hand, known bonds
 * @returns one description per metal; [] without a metal. A lone metal has coordination number 0 and nulls.
 * Errors: throws RangeError for donor changes that name missing atoms or centres.
 */
export function describeCentres(structure: Structure, options: DescribeOptions = {}): CentreDescription[] {
  const graph = options.bonds ?? findBonds(structure);
  const spheres = findSpheres(structure, graph, options);
  const centresOf = new Map<number, number[]>();
  for (const sphere of spheres) {
    for (const { index } of sphere.donors) {
      const centres = centresOf.get(index);
      if (centres) centres.push(sphere.index);
      else centresOf.set(index, [sphere.index]);
    }
  }
  return spheres.map((sphere) => describeCentre(structure, graph, sphere, centresOf, options));
}

function describeCentre(
  structure: Structure,
  graph: BondGraph,
  sphere: CoordinationSphere,
  centresOf: ReadonlyMap<number, readonly number[]>,
  options: DescribeOptions,
): CentreDescription {
  const { element, index, donors, longContacts } = sphere;
  const change = options.donorChanges?.find((candidate) => candidate.centre === index);
  const spinState = options.spinStates?.get(index) ?? null;
  const spinMatters = covalentRadiusAngstrom(element, 'high') !== covalentRadiusAngstrom(element, 'low');

  const sites = coordinationSites(structure, graph, sphere);
  const offsets = sites.map((site) => site.offsetAngstrom);
  const coordinationNumber = sites.length;
  const firstAtom = (site: number) =>
    sites[site]?.atoms[0] ?? longContacts[site - sites.length]?.index ?? index;

  const distances = donors.map((donor) => donor.distanceAngstrom);
  const chelates = chelateRings(structure, graph, sphere);
  const metalAt = structure.positionsAngstrom[index] ?? [0, 0, 0];
  const longOffsets = longContacts.map(
    (contact): Vector3 => subtract(structure.positionsAngstrom[contact.index] ?? metalAt, metalAt),
  );
  const angles = offsets.length <= MOST_SITES_WITH_ANGLES ? sphereAngles(offsets) : [];
  const pairs = offsets.length === 6 ? octahedralPairs(offsets, angles) : undefined;
  const split = axialSplit(offsets, longOffsets, pairs);
  const plane = planeDisplacement(offsets, split);
  const shapes = sphereShapes(offsets);
  const nearest = shapes[0]?.symbol ?? null;
  const valence = bondValenceSums(element, donors);
  const donorElements = donors.map((donor) => donor.element);
  const radii = ionicRadiusSums(element, donorElements, coordinationNumber, nearest === 'SP-4');

  return {
    element,
    index,
    coordinationNumber,
    notation:
      longContacts.length > 0 ? `${coordinationNumber} + ${longContacts.length}` : String(coordinationNumber),
    spinStateUsed: spinMatters ? spinState : null,
    donors: donors.map((donor) => ({
      element: donor.element,
      index: donor.index,
      distanceAngstrom: donor.distanceAngstrom,
      bridgesTo: (centresOf.get(donor.index) ?? []).filter((centre) => centre !== index),
      addedByHand: change?.add.includes(donor.index) ?? false,
    })),
    sites: sites.map(({ atoms, hapticity, offsetAngstrom }) => ({
      atoms,
      hapticity,
      distanceAngstrom: norm(offsetAngstrom),
    })),
    longContacts,
    metalContacts: sphere.metalContacts,
    donorChanges: { added: [...(change?.add ?? [])], removed: [...(change?.remove ?? [])] },
    meanDistanceAngstrom:
      distances.length > 0 ? distances.reduce((sum, d) => sum + d, 0) / distances.length : null,
    meansByElement: distancesByElement(donors),
    baurDistortion: baurDistortion(distances),
    meanSquareDistortion: meanSquareDistortion(distances),
    angles: listAngles(angles, pairs),
    chelates,
    axial: split && {
      ...split,
      axial: split.axial.map(firstAtom),
      equatorial: split.equatorial.map(firstAtom),
    },
    planeDisplacement: plane && { ...plane, donors: plane.donors.map(firstAtom) },
    tau4: tau4(offsets),
    tau4Prime: tau4Prime(offsets),
    tau5: tau5(offsets),
    sigmaDegrees: sigmaDegrees(offsets),
    thetaDegrees: thetaDegrees(offsets, pairs),
    angleVarianceDegrees2: angleVarianceDegrees2(offsets),
    quadraticElongation: quadraticElongation(offsets, pairs),
    chelatePlaneAngleDegrees: chelatePlaneAngleDegrees(structure, index, chelates),
    shapes: shapes.length > 0 ? shapes : null,
    nearest,
    path: interconversionPath(coordinationNumber, shapes),
    bondValenceSum: valence.length > 0 ? valence : null,
    bondValenceSumWithLongContacts:
      longContacts.length > 0 && valence.length > 0
        ? bondValenceSums(element, [...donors, ...longContacts])
        : null,
    supportedOxidationState: supportedOxidationState(valence),
    ionicRadiusSums: radii.length > 0 ? radii : null,
  };
}

function listAngles(
  angles: readonly SphereAngle[],
  pairs: OctahedralPairs | undefined,
): CentreDescription['angles'] {
  const mate = new Map(pairs);
  return angles.map(({ first, second, degrees }) => ({
    sites: [first, second],
    angleDegrees: degrees,
    trans: pairs ? mate.get(first) === second : degrees > TRANS_DEGREES,
  }));
}
