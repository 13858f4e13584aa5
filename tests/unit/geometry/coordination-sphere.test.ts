import { describe, expect, it } from 'vitest';
import type { Structure, Vector3 } from '@/lib/chemistry/structure';
import { describeCentres } from '@/lib/geometry/describe-centres';
import { doesNotApply } from '@/lib/geometry/does-not-apply';
import { indexCards } from '@/lib/geometry/index-cards';
import { indexInputs } from '@/lib/geometry/index-inputs';
import { indexKeys } from '@/lib/geometry/index-keys';
import { sphereChanges } from '@/lib/geometry/sphere-change';
import { sphereStructure } from './random-structures';

function structure(...atoms: [string, number, number, number][]): Structure {
  return {
    elements: atoms.map(([element]) => element),
    positionsAngstrom: atoms.map(([, x, y, z]): Vector3 => [x, y, z]),
  };
}

function only(input: Structure, options = {}) {
  const [centre, ...others] = describeCentres(input, options);
  if (!centre || others.length > 0) throw new Error('expected one centre');
  return centre;
}

const square = (d: number): Vector3[] => [
  [d, 0, 0],
  [-d, 0, 0],
  [0, d, 0],
  [0, -d, 0],
];
const octahedron = (equatorial: number, axial: number): Vector3[] => [
  ...square(equatorial),
  [0, 0, axial],
  [0, 0, -axial],
];

describe('donors and long contacts', () => {
  it('reads tenorite copper as 4 + 2 (Åsbrink & Norrby 1970: 1.951, 1.961 and 2.784 Å)', () => {
    const centre = only(sphereStructure('Cu', 'O', octahedron(1.956, 2.784)));
    expect(centre.notation).toBe('4 + 2');
    expect(centre.nearest).toBe('SP-4');
    expect(centre.axial?.kind).toBe('elongated');
    expect(centre.axial?.axial).toEqual(centre.longContacts.map((contact) => contact.index));
    expect(centre.axial?.tetragonality).toBeCloseTo(1.956 / 2.784, 9);
  });

  it('counts moderately elongated copper as six-coordinate', () => {
    const centre = only(sphereStructure('Cu', 'O', octahedron(2.0, 2.4)));
    expect(centre.notation).toBe('6');
    expect(centre.axial).toMatchObject({
      kind: 'elongated',
      meanAxialAngstrom: 2.4,
      meanEquatorialAngstrom: 2,
    });
  });

  it('follows a stretched bond while no gap opens, and stops at a gap', () => {
    const donors = (last: number): Vector3[] => [
      [1.95, 0, 0],
      [-2.2, 0, 0],
      [0, 2.35, 0],
      [0, 0, last],
    ];
    expect(only(sphereStructure('Zn', 'O', donors(2.45))).notation).toBe('4');
    expect(only(sphereStructure('Zn', 'O', donors(2.7))).notation).toBe('3 + 1');
  });

  it('uses the radius of the spin state that is given', () => {
    const sphere = sphereStructure('Co', 'O', octahedron(1.9, 2.5));
    expect(only(sphere).coordinationNumber).toBe(6);
    const low = only(sphere, { spinStates: new Map([[0, 'low']]) });
    expect(low.notation).toBe('4 + 2');
    expect(low.spinStateUsed).toBe('low');
    expect(
      only(sphereStructure('Ni', 'O', square(1.9)), { spinStates: new Map([[0, 'low']]) }).spinStateUsed,
    ).toBeNull();
  });

  it('leaves hydrogens of water out and counts hydrides', () => {
    const water = structure(['Ni', 0, 0, 0], ['O', 1.6, 0, 0], ['H', 1.6, 0.96, 0], ['H', 0, 1.5, 0]);
    expect(only(water).donors.map((donor) => donor.index)).toEqual([3, 1]);
  });

  it('does not count the carbon between the oxygens of a chelating carboxylate', () => {
    const centre = only(
      structure(['Mn', 0, 0, 0], ['O', 1.95, 1.1, 0], ['O', 1.95, -1.1, 0], ['C', 2.55, 0, 0]),
    );
    expect(centre.donors.map((donor) => donor.element)).toEqual(['O', 'O']);
    expect(centre.chelates).toMatchObject([{ donors: [1, 2], ringSize: 4 }]);
  });

  it('names a lone metal without inventing zeros', () => {
    const centre = only(structure(['Fe', 1, 1, 1]));
    expect(centre).toMatchObject({ coordinationNumber: 0, notation: '0', donors: [], nearest: null });
    expect(centre.meanDistanceAngstrom).toBeNull();
    expect(centre.baurDistortion).toBeNull();
    for (const key of indexKeys) expect(doesNotApply(key, centre)).toBe('does not apply (no donor atoms)');
  });

  it('answers with no centre for a molecule without a metal and for no atoms', () => {
    expect(describeCentres(structure(['O', 0, 0, 0], ['H', 0.96, 0, 0]))).toEqual([]);
    expect(describeCentres({ elements: [], positionsAngstrom: [] })).toEqual([]);
  });

  it('stays finite with coincident atoms', () => {
    const centre = only(
      structure(['Fe', 0, 0, 0], ['O', 0, 0, 0], ['O', 2, 0, 0], ['O', 2, 0, 0], ['O', -2, 0, 0]),
    );
    expect(centre.donors.map((donor) => donor.index)).toEqual([2, 3, 4]);
    expect(JSON.stringify(centre)).not.toContain('NaN');
  });
});

describe('crowded donors', () => {
  it('are all counted when two of them come close without being bonded', () => {
    // N···N 1.68 Å: within the usual tolerance of a bond, too long for one; the second nitrogen is 0.4 Å farther out.
    const donors: Vector3[] = [
      [1.8, 0, 0],
      [1.63, 1.67, 0],
      [-2, 0, 0],
      [0, -2, 0],
    ];
    expect(only(sphereStructure('Mn', 'N', donors)).coordinationNumber).toBe(4);
  });

  it('lose the far atom of an end-on ligand', () => {
    const centre = only(
      structure(['Mn', 0, 0, 0], ['O', 1.9, 0, 0], ['O', 2.35, 1.25, 0], ['Cl', -2.3, 0, 0]),
    );
    expect(centre.donors.map((donor) => donor.index)).toEqual([1, 3]);
  });
});

describe('π-bound groups, bridges and metal–metal contacts', () => {
  const fivefold = (z: number): [string, number, number, number][] =>
    Array.from({ length: 5 }, (_, i) => {
      const angle = (2 * Math.PI * i) / 5;
      return ['C', 1.21 * Math.cos(angle), 1.21 * Math.sin(angle), z];
    });

  it('gives ferrocene two η⁵ sites on a line', () => {
    const centre = only(structure(['Fe', 0, 0, 0], ...fivefold(1.66), ...fivefold(-1.66)));
    expect(centre.donors).toHaveLength(10);
    expect(centre.sites.map((site) => site.hapticity)).toEqual([5, 5]);
    expect(centre.coordinationNumber).toBe(2);
    expect(centre.nearest).toBe('L-2');
    expect(centre.meanDistanceAngstrom).toBeCloseTo(Math.hypot(1.21, 1.66), 9);
  });

  it('gives an alkene one site and a side-on peroxide two', () => {
    const sideOn = (element: string, bond: number) =>
      structure(
        ['Pt', 0, 0, 0],
        [element, 2.05, bond / 2, 0],
        [element, 2.05, -bond / 2, 0],
        ['Cl', -2.3, 0, 0],
      );
    expect(
      only(sideOn('C', 1.38))
        .sites.map((site) => site.hapticity)
        .sort(),
    ).toEqual([1, 2]);
    expect(only(sideOn('O', 1.46)).sites.map((site) => site.hapticity)).toEqual([1, 1, 1]);
  });

  it('names bridging donors and the metal across', () => {
    const [first, second] = describeCentres(
      structure(
        ['Cu', -1.3, 0, 0],
        ['Cu', 1.3, 0, 0],
        ['O', 0, 1.45, 0],
        ['O', 0, -1.45, 0],
        ['Cl', -3.5, 0, 0],
      ),
    );
    expect(first?.donors.find((donor) => donor.index === 2)?.bridgesTo).toEqual([1]);
    expect(first?.donors.find((donor) => donor.index === 4)?.bridgesTo).toEqual([]);
    expect(second?.metalContacts).toMatchObject([{ element: 'Cu', index: 0 }]);
    expect(second?.donors.map((donor) => donor.element)).toEqual(['O', 'O']);
  });
});

describe('donors changed by hand', () => {
  const sphere = sphereStructure('Cu', 'O', octahedron(1.956, 2.784));
  it('are used in every number and recorded', () => {
    const centre = only(sphere, { donorChanges: [{ centre: 0, add: [5, 6], remove: [] }] });
    expect(centre.notation).toBe('6');
    expect(centre.nearest).toBe('OC-6');
    expect(centre.donorChanges).toEqual({ added: [5, 6], removed: [] });
    expect(centre.donors.filter((donor) => donor.addedByHand).map((donor) => donor.index)).toEqual([5, 6]);
  });

  it('can be taken out and then stay out', () => {
    const centre = only(sphere, { donorChanges: [{ centre: 0, add: [], remove: [1, 5] }] });
    expect(centre.notation).toBe('3 + 1');
    expect(centre.donorChanges.removed).toEqual([1, 5]);
  });

  it('throw when they name an atom or a centre that is not there', () => {
    expect(() => only(sphere, { donorChanges: [{ centre: 0, add: [99], remove: [] }] })).toThrow(/donor 99/);
    expect(() => only(sphere, { donorChanges: [{ centre: 1, add: [], remove: [] }] })).toThrow(
      /no metal centre/,
    );
  });
});

describe('chelates and planes', () => {
  /** Two O–C–C–O chelates; `turn` is the angle between their planes, degrees. */
  function bisChelate(turn: number): Structure {
    const half: [string, number, number][] = [
      ['O', 1.45, 1.3],
      ['C', 2.65, 0.75],
      ['C', 2.65, -0.75],
      ['O', 1.45, -1.3],
    ];
    const angle = (turn * Math.PI) / 180;
    return structure(
      ['Cu', 0, 0, 0],
      ...half.map(([e, x, y]): [string, number, number, number] => [e, x, y, 0]),
      ...half.map(([e, x, y]): [string, number, number, number] => [
        e,
        -x,
        y * Math.cos(angle),
        y * Math.sin(angle),
      ]),
    );
  }

  it.each([0, 35, 90])('finds %i° between the planes of a bis-chelate', (turn) => {
    const centre = only(bisChelate(turn));
    expect(centre.chelatePlaneAngleDegrees).toBeCloseTo(turn, 6);
    expect(centre.chelates.map((ring) => ring.ringSize)).toEqual([5, 5]);
    expect(centre.chelates[0]?.biteAngleDegrees).toBeCloseTo((2 * Math.atan2(1.3, 1.45) * 180) / Math.PI, 9);
  });

  it('measures the metal above the base of a square pyramid', () => {
    const donors: Vector3[] = [...square(1.95).map(([x, y]): Vector3 => [x, y, -0.3]), [0, 0, 2.2]];
    const centre = only(sphereStructure('Cu', 'O', donors));
    expect(centre.planeDisplacement?.distanceAngstrom).toBeCloseTo(0.3, 9);
    expect(centre.axial?.axial).toEqual([5]);
  });

  it('sees no plane in a tetrahedron', () => {
    const t = 1.3;
    const centre = only(
      sphereStructure('Zn', 'Cl', [
        [t, t, t],
        [t, -t, -t],
        [-t, t, -t],
        [-t, -t, t],
      ]),
    );
    expect(centre.planeDisplacement).toBeNull();
    expect(doesNotApply('planeDisplacement', centre)).toBe('does not apply (the donors lie near no plane)');
  });
});

describe('explanations', () => {
  it('say why an index does not apply', () => {
    const six = only(sphereStructure('Fe', 'O', octahedron(2.1, 2.1)));
    expect(doesNotApply('tau4', six)).toBe('does not apply (coordination number 6)');
    expect(doesNotApply('sigmaDegrees', six)).toBeNull();
    const plane = only(sphereStructure('Ni', 'P', square(2.2)));
    expect(doesNotApply('quadraticElongation', plane)).toMatch(/enclose no volume/);
    expect(doesNotApply('bondValenceSum', plane)).toMatch(/no oxidation state of Ni has parameters .*: P/);
    expect(doesNotApply('ionicRadiusSums', plane)).toMatch(/no ionic radius for P/);
  });

  it('have a card with a source for every index, and its inputs', () => {
    const centre = only(sphereStructure('Cu', 'O', square(1.95)));
    for (const key of indexKeys) {
      expect(indexCards[key].source.length).toBeGreaterThan(10);
      expect(indexCards[key].meanings.length).toBeGreaterThan(0);
    }
    expect(indexInputs('tau4', centre).map((input) => input.value)).toEqual([180, 180]);
    expect(indexInputs('path', centre).map((input) => input.label)).toEqual(['S(SP-4)', 'S(T-4)']);
    expect(indexInputs('baurDistortion', centre)).toHaveLength(4);
  });
});

describe('what moved in a sphere', () => {
  it('names donors lost and a new nearest polyhedron', () => {
    const before = describeCentres(sphereStructure('Ni', 'O', octahedron(2.05, 2.1)));
    const after = describeCentres(sphereStructure('Ni', 'O', octahedron(1.9, 4)));
    expect(sphereChanges(before, after)).toMatchObject([
      {
        centre: 0,
        donorsLost: [5, 6],
        donorsGained: [],
        coordinationNumber: { start: 6, end: 4 },
        nearest: { start: 'OC-6', end: 'SP-4' },
        changed: true,
      },
    ]);
    expect(sphereChanges(before, before)[0]?.changed).toBe(false);
  });
});

describe('large structures', () => {
  it('describes a 10,000-atom cut-out within 2 s', () => {
    const atoms: [string, number, number, number][] = [];
    for (let i = 0; i < 10_000; i++) {
      const [x, y, z] = [i % 22, Math.floor(i / 22) % 22, Math.floor(i / 484)];
      atoms.push([(x + y + z) % 2 === 0 ? 'Ni' : 'O', x * 2.09, y * 2.09, z * 2.09]);
    }
    const start = performance.now();
    const centres = describeCentres(structure(...atoms));
    expect(performance.now() - start).toBeLessThan(2000);
    expect(centres).toHaveLength(5000);
    expect(Math.max(...centres.map((centre) => centre.coordinationNumber))).toBe(6);
  });
});
