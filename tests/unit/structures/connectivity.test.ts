import { describe, expect, it } from 'vitest';
import { findBonds, shortestPath } from '@/lib/chemistry/bonds';
import { forEachNeighbourPair } from '@/lib/chemistry/neighbour-pairs';
import type { Structure, Vector3 } from '@/lib/chemistry/structure';
import { connectivityChange } from '@/lib/structures/connectivity-change';
import { fragments } from '@/lib/structures/fragments';
import { ligandRings } from '@/lib/structures/rings';
import { seededRandom } from '../geometry/random-structures';

function ring(size: number, bond: number, element = 'C'): Structure {
  const radius = bond / (2 * Math.sin(Math.PI / size));
  return {
    elements: Array.from({ length: size }, () => element),
    positionsAngstrom: Array.from({ length: size }, (_, i): Vector3 => {
      const angle = (2 * Math.PI * i) / size;
      return [radius * Math.cos(angle), radius * Math.sin(angle), 0];
    }),
  };
}

const aqua = (distance: number): Structure => ({
  elements: ['Zn', 'O', 'H', 'H', 'Cl'],
  positionsAngstrom: [
    [0, 0, 0],
    [distance, 0, 0],
    [distance + 0.58, 0.77, 0],
    [distance + 0.58, -0.77, 0],
    [0, 2.2, 0],
  ],
});

describe('neighbour pairs', () => {
  it('are those of the double loop, each once, wherever the points lie', () => {
    const random = seededRandom(31);
    const points = Array.from(
      { length: 300 },
      (): Vector3 => [20 * random() - 30, 15 * random(), 4 * random()],
    );
    const expected: string[] = [];
    points.forEach((a, i) =>
      points.forEach((b, j) => {
        if (i < j && Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]) <= 2.5) expected.push(`${i},${j}`);
      }),
    );
    const found: string[] = [];
    forEachNeighbourPair(points, 2.5, (first, second) => found.push(`${first},${second}`));
    expect(found.sort()).toEqual(expected.sort());
    expect(found.length).toBeGreaterThan(100);
  });

  it('are found among points very far apart', () => {
    const found: number[] = [];
    forEachNeighbourPair(
      [
        [1e9, 0, 0],
        [-1e9, 0, 0],
        [1e9, 1, 0],
      ],
      1.5,
      (first, second) => found.push(first, second),
    );
    expect(found).toEqual([0, 2]);
  });
});

describe('bonds by covalent radii', () => {
  it('join a molecule of water and leave hydrogen bonds out', () => {
    const { bonds } = findBonds({
      elements: ['O', 'H', 'H', 'O'],
      positionsAngstrom: [
        [0, 0, 0],
        [0.96, 0, 0],
        [-0.24, 0.93, 0],
        [2.8, 0, 0],
      ],
    });
    expect(bonds.map(({ first, second }) => [first, second])).toEqual([
      [0, 1],
      [0, 2],
    ]);
  });

  it('do not join coincident atoms', () => {
    const { bonds } = findBonds({
      elements: ['O', 'O'],
      positionsAngstrom: [
        [0, 0, 0],
        [0.01, 0, 0],
      ],
    });
    expect(bonds).toEqual([]);
  });

  it('give the shortest way between two atoms, or none', () => {
    const { neighbours } = findBonds(ring(6, 1.4));
    expect(shortestPath(neighbours, 0, 2, () => false, 6)).toEqual([0, 1, 2]);
    expect(shortestPath(neighbours, 0, 2, (atom) => atom === 1, 6)).toEqual([0, 5, 4, 3, 2]);
    expect(shortestPath(neighbours, 0, 2, (atom) => atom === 1, 4)).toBeNull();
  });
});

describe('rings of ligands', () => {
  it('finds the ring of benzene once', () => {
    expect(ligandRings(findBonds(ring(6, 1.4)))).toHaveLength(1);
    expect(ligandRings(findBonds(ring(6, 1.4)))[0]).toHaveLength(6);
  });

  it('finds no ring in water', () => {
    expect(ligandRings(findBonds(aqua(2)))).toEqual([]);
  });
});

describe('what an optimisation did to the bonds', () => {
  it('names a ligand that came off', () => {
    const change = connectivityChange(aqua(2), aqua(4));
    expect(change).toEqual({
      ok: true,
      value: { formed: [], broken: [[0, 1]], dissociated: [[1, 2, 3]], associated: [] },
    });
  });

  it('names a ligand that came on', () => {
    const change = connectivityChange(aqua(4), aqua(2));
    expect(change).toMatchObject({
      ok: true,
      value: { formed: [[0, 1]], dissociated: [], associated: [[1, 2, 3]] },
    });
  });

  it('refuses other atoms', () => {
    const other = { ...aqua(2), elements: ['Cu', 'O', 'H', 'H', 'Cl'] };
    expect(connectivityChange(aqua(2), other)).toMatchObject({
      ok: false,
      error: { code: 'different atoms' },
    });
  });

  it('splits a structure into its fragments', () => {
    expect(fragments(findBonds(aqua(4)))).toEqual([
      [0, 4],
      [1, 2, 3],
    ]);
  });
});
