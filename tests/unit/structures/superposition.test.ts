import { describe, expect, it } from 'vitest';
import type { Structure, Vector3 } from '@/lib/chemistry/structure';
import { assignment } from '@/lib/structures/assignment';
import { matchAtoms } from '@/lib/structures/match-atoms';
import { substructure } from '@/lib/structures/substructure';
import { place, superposition } from '@/lib/structures/superposition';
import { moved, randomRotation, seededRandom, shuffled } from '../geometry/random-structures';

/** An octahedral hexaaqua ion: each water in the plane of its bond and the next axis. */
function hexaaqua(distance = 2.1): Structure {
  const axes: [Vector3, Vector3][] = [
    [
      [1, 0, 0],
      [0, 1, 0],
    ],
    [
      [-1, 0, 0],
      [0, 1, 0],
    ],
    [
      [0, 1, 0],
      [0, 0, 1],
    ],
    [
      [0, -1, 0],
      [0, 0, 1],
    ],
    [
      [0, 0, 1],
      [1, 0, 0],
    ],
    [
      [0, 0, -1],
      [1, 0, 0],
    ],
  ];
  const elements = ['Fe'];
  const positionsAngstrom: Vector3[] = [[0, 0, 0]];
  for (const [along, across] of axes) {
    const at = (out: number, side: number): Vector3 => [
      along[0] * out + across[0] * side,
      along[1] * out + across[1] * side,
      along[2] * out + across[2] * side,
    ];
    elements.push('O', 'H', 'H');
    positionsAngstrom.push(at(distance, 0), at(distance + 0.58, 0.77), at(distance + 0.58, -0.77));
  }
  return { elements, positionsAngstrom };
}

function match(fixed: Structure, moving: Structure) {
  const result = matchAtoms(fixed, moving);
  if (!result.ok) throw new Error(result.error.message);
  return result.value;
}

describe('superposition of paired points', () => {
  it('undoes a rotation and a translation', () => {
    const random = seededRandom(4);
    const ion = hexaaqua();
    for (let trial = 0; trial < 20; trial++) {
      const turned = moved(ion, randomRotation(random), [3 * random(), -40, 0.5]);
      const laid = superposition(ion.positionsAngstrom, turned.positionsAngstrom);
      expect(laid.rmsdAngstrom).toBeLessThan(1e-7);
      turned.positionsAngstrom.forEach((position, i) => {
        const expected = ion.positionsAngstrom[i] ?? [NaN, NaN, NaN];
        place(laid, position).forEach((x, axis) => expect(x).toBeCloseTo(expected[axis] ?? NaN, 7));
      });
    }
  });

  it('is 0.5 Å off at each end of two lines of 2 and 3 Å (by hand)', () => {
    // Distances 2 and 3 about a common middle: each end is 0.5 Å off.
    const laid = superposition(
      [
        [0, 0, 0],
        [2, 0, 0],
      ],
      [
        [5, 1, 0],
        [5, 4, 0],
      ],
    );
    expect(laid.rmsdAngstrom).toBeCloseTo(0.5, 9);
  });

  it('never turns a left hand into a right one', () => {
    const hand: Vector3[] = [
      [0, 0, 0],
      [1, 0, 0],
      [0, 2, 0],
      [0, 0, 3],
    ];
    const mirrored = hand.map(([x, y, z]): Vector3 => [-x, y, z]);
    expect(superposition(hand, mirrored).rmsdAngstrom).toBeGreaterThan(0.3);
  });

  it('throws for sets of different size', () => {
    expect(() => superposition([[0, 0, 0]], [])).toThrow(RangeError);
  });
});

describe('matching of atoms', () => {
  it('finds a hexaaqua ion again in any order and orientation', () => {
    const random = seededRandom(8);
    const ion = hexaaqua();
    for (let trial = 0; trial < 5; trial++) {
      const order = shuffled(
        ion.elements.map((_, i) => i),
        random,
      );
      const other = moved(substructure(ion, order), randomRotation(random), [1, 2, 3]);
      const laid = match(ion, other);
      expect(laid.rmsdAngstrom).toBeLessThan(1e-6);
      expect(laid.likeBy).toBe('bonds');
      expect([...laid.partner].sort((a, b) => a - b)).toEqual(order.map((_, i) => i));
      laid.partner.forEach((j, i) => expect(other.elements[j]).toBe(ion.elements[i]));
    }
  });

  it('gives the difference of the distances for two sizes of the same sphere', () => {
    const sphere = [0, 1, 4, 7, 10, 13, 16];
    const [a, b] = [substructure(hexaaqua(2.1), sphere), substructure(hexaaqua(2.0), sphere)];
    // Six donors 0.1 Å off and a metal in place: √(6 · 0.01/7).
    expect(match(a, b).rmsdAngstrom).toBeCloseTo(Math.sqrt(0.06 / 7), 6);
  });

  it('tells like atoms by element when the bonds differ', () => {
    const ion = hexaaqua();
    const opened = {
      elements: ion.elements,
      positionsAngstrom: ion.positionsAngstrom.map(
        (p, i): Vector3 => (i < 4 && i > 0 ? [p[0] + 2, p[1], p[2]] : p),
      ),
    };
    const laid = match(ion, opened);
    expect(laid.likeBy).toBe('element');
    expect(laid.rmsdAngstrom).toBeGreaterThan(0.3);
    expect(laid.rmsdAngstrom).toBeLessThan(2 * Math.sqrt(3 / 19));
  });

  it('matches single atoms, pairs and lines', () => {
    const atom = { elements: ['Fe'], positionsAngstrom: [[1, 2, 3]] as Vector3[] };
    expect(match(atom, atom).rmsdAngstrom).toBeLessThan(1e-9);
    const line = {
      elements: ['Cl', 'Cu', 'Cl'],
      positionsAngstrom: [
        [-2, 0, 0],
        [0, 0, 0],
        [2.2, 0, 0],
      ] as Vector3[],
    };
    const turned = {
      elements: ['Cu', 'Cl', 'Cl'],
      positionsAngstrom: [
        [0, 0, 0],
        [0, 0, 2.2],
        [0, 0, -2],
      ] as Vector3[],
    };
    expect(match(line, turned).rmsdAngstrom).toBeLessThan(1e-6);
  });

  it('refuses different compositions and empty structures', () => {
    const result = matchAtoms(hexaaqua(), substructure(hexaaqua(), [0, 1, 2, 3]));
    expect(result).toMatchObject({ ok: false, error: { code: 'different composition' } });
    const nothing = { elements: [], positionsAngstrom: [] };
    expect(matchAtoms(nothing, nothing)).toMatchObject({ ok: false, error: { code: 'no atoms' } });
  });
});

describe('assignment', () => {
  it('equals the best of all permutations', () => {
    const random = seededRandom(6);
    for (let trial = 0; trial < 30; trial++) {
      const cost = Array.from({ length: 4 }, () => Array.from({ length: 4 }, () => random()));
      const total = (columns: readonly number[]) =>
        columns.reduce((sum, c, r) => sum + (cost[r]?.[c] ?? NaN), 0);
      let least = Infinity;
      for (let code = 0; code < 256; code++) {
        const columns = [code & 3, (code >> 2) & 3, (code >> 4) & 3, code >> 6];
        if (new Set(columns).size === 4) least = Math.min(least, total(columns));
      }
      expect(total(assignment(cost))).toBeCloseTo(least, 12);
    }
  });
});
