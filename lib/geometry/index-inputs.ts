import type { CentreDescription } from './centre-description';
import type { IndexKey } from './index-keys';

export interface IndexInput {
  label: string;
  value: number;
  unit: 'Å' | '°' | '';
}

/**
 * The numbers that went into an index, in the order they are used: what the explanation shows under the
 * formula. Atoms are numbered from 1 here, as a person counts them.
 */
export function indexInputs(key: IndexKey, centre: CentreDescription): IndexInput[] {
  switch (key) {
    case 'tau4':
    case 'tau4Prime':
    case 'tau5':
      return angles(centre)
        .sort((a, b) => b.value - a.value)
        .slice(0, 2);
    case 'sigmaDegrees':
    case 'angleVarianceDegrees2':
      return angles(centre)
        .sort((a, b) => a.value - b.value)
        .slice(0, 12);
    case 'chelatePlaneAngleDegrees':
      return centre.chelates.map((ring) => ({
        label: `bite ${ring.donors.map((donor) => donor + 1).join(', ')} (${ring.ringSize}-membered ring)`,
        value: ring.biteAngleDegrees,
        unit: '°',
      }));
    case 'path':
      return (centre.shapes ?? [])
        .filter((shape) => shape.id === centre.path?.from || shape.id === centre.path?.to)
        .map((shape) => ({ label: `S(${shape.id})`, value: shape.measure, unit: '' }));
    case 'axial':
      return [...distances(centre), ...centre.longContacts.map(contactInput)];
    default:
      return distances(centre);
  }
}

const contactInput = (contact: { element: string; index: number; distanceAngstrom: number }): IndexInput => ({
  label: `${contact.element}${contact.index + 1}`,
  value: contact.distanceAngstrom,
  unit: 'Å',
});

const distances = (centre: CentreDescription) => centre.donors.map(contactInput);

function angles(centre: CentreDescription): IndexInput[] {
  const name = (site: number) => (centre.sites[site]?.atoms ?? []).map((atom) => atom + 1).join('/');
  return centre.angles.map(({ sites: [first, second], angleDegrees }) => ({
    label: `${name(first)}–${centre.element}–${name(second)}`,
    value: angleDegrees,
    unit: '°',
  }));
}
