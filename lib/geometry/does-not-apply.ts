import { bondValenceOxidationStates } from '../chemistry/bond-valence-parameters';
import { anionRadiiAngstrom } from '../chemistry/ionic-radii';
import type { CentreDescription } from './centre-description';
import type { IndexKey } from './index-keys';

/** Coordination numbers that an index is defined for; the others have reasons of their own. */
const definedFor: Partial<Record<IndexKey, readonly number[]>> = {
  tau4: [4],
  tau4Prime: [4],
  tau5: [5],
  sigmaDegrees: [6],
  thetaDegrees: [6],
  angleVarianceDegrees2: [4, 6],
  quadraticElongation: [4, 6],
  shapes: [2, 3, 4, 5, 6, 7, 8, 9],
  path: [4, 5, 6],
  axial: [4, 5, 6],
  planeDisplacement: [3, 4, 5, 6],
};

/**
 * Why a value of a centre is null, as it is shown in place of the number.
 * @returns for example "does not apply (coordination number 6)"; null when the value is there
 */
export function doesNotApply(key: IndexKey, centre: CentreDescription): string | null {
  if (centre[key] !== null) return null;
  return `does not apply (${reason(key, centre)})`;
}

function reason(key: IndexKey, centre: CentreDescription): string {
  if (centre.donors.length === 0) return 'no donor atoms';
  const numbers = definedFor[key];
  if (numbers && !numbers.includes(centre.coordinationNumber)) {
    return `coordination number ${centre.coordinationNumber}`;
  }
  switch (key) {
    case 'quadraticElongation':
      return 'the donors lie in a plane and enclose no volume';
    case 'axial':
      return centre.coordinationNumber === 4 ? 'no long contacts on an axis' : 'no single axis';
    case 'planeDisplacement':
      return 'the donors lie near no plane';
    case 'chelatePlaneAngleDegrees':
      return centre.chelates.length === 2
        ? 'the two chelate rings share a donor'
        : `${centre.chelates.length} chelate ring${centre.chelates.length === 1 ? '' : 's'}, two are needed`;
    case 'bondValenceSum':
      return bondValenceOxidationStates(centre.element).length === 0
        ? `no bond-valence parameters for ${centre.element}`
        : `no oxidation state of ${centre.element} has parameters for every donor: ${donorElements(centre)}`;
    case 'ionicRadiusSums':
      return ionicReason(centre);
    default:
      return 'the donors coincide with the metal';
  }
}

const donorElements = (centre: CentreDescription) =>
  [...new Set(centre.donors.map((donor) => donor.element))].join(', ');

function ionicReason(centre: CentreDescription): string {
  const missing = [...new Set(centre.donors.map((donor) => donor.element))].filter(
    (element) => anionRadiiAngstrom[element] === undefined,
  );
  if (missing.length > 0) return `no ionic radius for ${missing.join(', ')}`;
  return `no ionic radius for ${centre.element} with coordination number ${centre.coordinationNumber}`;
}
