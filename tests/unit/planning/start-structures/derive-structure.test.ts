import { describe, expect, it } from 'vitest';
import type { Vector3 } from '@/lib/chemistry/structure';
import { deriveStructure } from '@/lib/planning/start-structures/derive-structure';
import type { BondedStructure, RecipeStep } from '@/lib/planning/start-structures/recipe';
import { norm, subtract } from '@/lib/planning/start-structures/vector';

// Covalent radii of Cordero et al., Dalton Trans. 2008, 2832.
const radii: Record<string, number> = { H: 0.31, O: 0.66, N: 0.71, C: 0.76, Cl: 1.02, Ni: 1.24, Zn: 1.22 };
const radius = (element: string) => radii[element] ?? null;
const derive = (start: BondedStructure, ...recipe: RecipeStep[]) => {
  const derived = deriveStructure(start, recipe, radius);
  if (!derived.ok) throw new Error(derived.error.message);
  return derived.value;
};
const code = (start: BondedStructure, step: RecipeStep) => {
  const derived = deriveStructure(start, [step], radius);
  return derived.ok ? null : derived.error.code;
};

const s = 2.2 / Math.sqrt(3);
const tetrahedron: BondedStructure = {
  structure: {
    elements: ['Ni', 'Cl', 'Cl', 'Cl', 'Cl'],
    positionsAngstrom: [
      [0, 0, 0],
      [s, s, s],
      [-s, -s, s],
      [s, -s, -s],
      [-s, s, -s],
    ],
  },
  bonds: [
    [0, 1],
    [0, 2],
    [0, 3],
    [0, 4],
  ],
};
const at = ({ structure }: BondedStructure, index: number): Vector3 =>
  structure.positionsAngstrom[index] ?? [NaN, NaN, NaN];
const distance = (item: BondedStructure, i: number, j: number) => norm(subtract(at(item, i), at(item, j)));
function angle(item: BondedStructure, i: number, j: number, k: number): number {
  const [a, b] = [subtract(at(item, i), at(item, j)), subtract(at(item, k), at(item, j))];
  const cosine = (a[0] * b[0] + a[1] * b[1] + a[2] * b[2]) / (norm(a) * norm(b));
  return (Math.acos(Math.max(-1, Math.min(1, cosine))) * 180) / Math.PI;
}

describe('a derived starting structure', () => {
  it('is a square plane when a tetrahedron is flattened, and a tetrahedron again when raised', () => {
    const square = derive(tetrahedron, { kind: 'set elevation', centre: 0, elevationDegrees: 0 });
    const angles = [1, 2, 3].flatMap((i) =>
      [1, 2, 3, 4].filter((j) => j > i).map((j) => Math.round(angle(square, i, 0, j))),
    );
    expect(angles.toSorted((a, b) => a - b)).toEqual([90, 90, 90, 90, 180, 180]);
    for (const donor of [1, 2, 3, 4]) expect(distance(square, 0, donor)).toBeCloseTo(2.2, 10);
    // arctan(1/√2): elevation of a tetrahedron's corners above its middle plane
    const back = derive(square, { kind: 'set elevation', centre: 0, elevationDegrees: 35.26438968 });
    for (const donor of [2, 3, 4]) expect(angle(back, 1, 0, donor)).toBeCloseTo(109.4712, 3);
    expect(back.clashes).toEqual([]);
  });

  it('gets longer bonds with a larger ion: nickel to zinc in T-4 by 0.05 Å (Shannon 0.55 and 0.60)', () => {
    const zinc = derive(tetrahedron, {
      kind: 'exchange metal',
      centre: 0,
      element: 'zn',
      radiusDifferenceAngstrom: 0.05,
    });
    expect(zinc.structure.elements[0]).toBe('Zn');
    for (const donor of [1, 2, 3, 4]) expect(distance(zinc, 0, donor)).toBeCloseTo(2.25, 10);
    expect(zinc.recipe).toHaveLength(1);
  });

  it('has two waters on the axis, six donors and no clash', () => {
    const six = derive(
      tetrahedron,
      { kind: 'set elevation', centre: 0, elevationDegrees: 0 },
      { kind: 'add axial water', centre: 0, distanceAngstrom: 2.1 },
    );
    expect(six.structure.elements.slice(5)).toEqual(['O', 'H', 'H', 'O', 'H', 'H']);
    expect(angle(six, 5, 0, 8)).toBeCloseTo(180, 4);
    for (const donor of [1, 2, 3, 4]) expect(angle(six, donor, 0, 5)).toBeCloseTo(90, 6);
    // Gas-phase water: 0.9572 Å and 104.52°.
    expect(distance(six, 5, 6)).toBeCloseTo(0.9572, 10);
    expect(angle(six, 6, 5, 7)).toBeCloseTo(104.52, 6);
    expect(six.bonds).toHaveLength(10);
    expect(six.clashes).toEqual([]);
    // …and without them it is the square plane again.
    const four = derive(six, { kind: 'remove ligands', centre: 0, donors: [5, 8] });
    expect(four.structure.elements).toEqual(['Ni', 'Cl', 'Cl', 'Cl', 'Cl']);
    expect(four.bonds).toHaveLength(4);
  });

  it('is elongated along one axis by moving two opposite ligands with their hydrogens', () => {
    const six = derive(
      tetrahedron,
      { kind: 'set elevation', centre: 0, elevationDegrees: 0 },
      { kind: 'add axial water', centre: 0, distanceAngstrom: 2.1 },
      { kind: 'shift donors', centre: 0, donors: [5, 8], shiftAngstrom: 0.3 },
    );
    expect(distance(six, 0, 5)).toBeCloseTo(2.4, 10);
    expect(distance(six, 0, 8)).toBeCloseTo(2.4, 10);
    expect(distance(six, 8, 9)).toBeCloseTo(0.9572, 10);
    expect(distance(six, 0, 1)).toBeCloseTo(2.2, 10);
  });

  it('twists a chelate as one body from T-4 to a plane', () => {
    // Two N–C–N chelates, one in the xz plane below, one in the yz plane above: dihedral angle 90°.
    const chelates: BondedStructure = {
      structure: {
        elements: ['Zn', 'N', 'N', 'C', 'N', 'N', 'C'],
        positionsAngstrom: [
          [0, 0, 0],
          [1.1, 0, 1.7],
          [-1.1, 0, 1.7],
          [0, 0, 2.5],
          [0, 1.1, -1.7],
          [0, -1.1, -1.7],
          [0, 0, -2.5],
        ],
      },
      bonds: [
        [0, 1],
        [0, 2],
        [1, 3],
        [2, 3],
        [0, 4],
        [0, 5],
        [4, 6],
        [5, 6],
      ],
    };
    const flat = derive(chelates, { kind: 'twist', centre: 0, donors: [4, 5], degrees: 90 });
    for (const position of flat.structure.positionsAngstrom) expect(position[1]).toBeCloseTo(0, 10);
    expect(distance(flat, 4, 6)).toBeCloseTo(distance(chelates, 4, 6), 10);
    expect(code(chelates, { kind: 'set elevation', centre: 0, elevationDegrees: 0 })).toBe(
      'ligand cannot move alone',
    );
    expect(code(chelates, { kind: 'shift donors', centre: 0, donors: [4], shiftAngstrom: 0.2 })).toBe(
      'ligand cannot move alone',
    );
  });

  it('reports a clash', () => {
    const close = derive(tetrahedron, {
      kind: 'exchange metal',
      centre: 0,
      element: 'Ni',
      radiusDifferenceAngstrom: -1,
    });
    // Chlorides 1.2 Å from the metal are 1.96 Å apart: below 1.02 + 1.02 + 0.5.
    expect(close.clashes).toHaveLength(6);
    expect(close.clashes[0]?.distanceAngstrom).toBeCloseTo(1.2 * Math.sqrt(8 / 3), 10);
    const bent: BondedStructure = {
      structure: {
        elements: ['O', 'O', 'H'],
        positionsAngstrom: [
          [0, 0, 0],
          [0, 0, 1.5],
          [0, 0, 9],
        ],
      },
      bonds: [],
    };
    const clash = deriveStructure(bent, [], radius);
    expect(clash.ok && clash.value.clashes).toEqual([{ atoms: [0, 1], distanceAngstrom: 1.5 }]);
  });

  it('is refused for atoms and elements that are not there', () => {
    expect(code(tetrahedron, { kind: 'add axial water', centre: 9, distanceAngstrom: 2 })).toBe(
      'no such atom',
    );
    expect(
      code(tetrahedron, { kind: 'exchange metal', centre: 0, element: 'Xx', radiusDifferenceAngstrom: 0 }),
    ).toBe('unknown element');
    expect(code(tetrahedron, { kind: 'remove ligands', centre: 0, donors: [0] })).toBe('not a donor');
    expect(
      code({ ...tetrahedron, bonds: [[0, 1]] }, { kind: 'set elevation', centre: 0, elevationDegrees: 0 }),
    ).toBe('not four-coordinate');
  });
});
