import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeAll, describe, expect, it } from 'vitest';
import { atomColour } from '@/components/viewer/atom-colours';
import { FlatProjection } from '@/components/viewer/flat-projection';
import { SphereTable } from '@/components/viewer/sphere-table';
import { StructureViewer } from '@/components/viewer/structure-viewer';
import {
  atomNames,
  drawnBonds,
  nearestAtoms,
  sphereAngles,
  type ViewedStructure,
} from '@/components/viewer/viewed-structure';

afterEach(cleanup);

beforeAll(() => {
  // jsdom has no observer: nothing is ever seen, so that the 3D library stays out of these tests.
  globalThis.IntersectionObserver = class {
    root = null;
    rootMargin = '';
    scrollMargin = '';
    thresholds = [];
    observe() {}
    unobserve() {}
    disconnect() {}
    takeRecords() {
      return [];
    }
  };
});

/** A regular tetrahedron: alternate corners of a cube, metal in the middle; every angle is acos(−1/3). */
const tetrahedron: ViewedStructure = {
  title: '[ZnCl4]2-',
  elements: ['Zn', 'Cl', 'Cl', 'Cl', 'Cl'],
  positionsAngstrom: [
    [0, 0, 0],
    [1.3, 1.3, 1.3],
    [1.3, -1.3, -1.3],
    [-1.3, 1.3, -1.3],
    [-1.3, -1.3, 1.3],
  ],
  centres: [
    { index: 0, donors: [1, 2, 3, 4].map((index) => ({ index, distanceAngstrom: 1.3 * Math.sqrt(3) })) },
  ],
};

describe('viewed structure', () => {
  it('finds six tetrahedral angles', () => {
    const [centre] = tetrahedron.centres;
    const angles = centre === undefined ? [] : sphereAngles(tetrahedron, centre);
    expect(angles).toHaveLength(6);
    for (const { degrees } of angles) expect(degrees).toBeCloseTo((Math.acos(-1 / 3) * 180) / Math.PI, 9);
  });

  it('numbers atoms by element and leaves a lone one without', () => {
    expect(atomNames(tetrahedron.elements)).toEqual(['Zn', 'Cl1', 'Cl2', 'Cl3', 'Cl4']);
  });

  it('lists near atoms closest first', () => {
    expect(nearestAtoms(tetrahedron, 1).map(({ index }) => index)).toEqual([0]);
  });

  it('draws bonds of the ligands but leaves the metal to its dashed lines', () => {
    const water: ViewedStructure = {
      title: 'water on a metal',
      elements: ['Ni', 'O', 'H', 'H'],
      positionsAngstrom: [
        [0, 0, 0],
        [2.07, 0, 0],
        [2.65, 0.77, 0],
        [2.65, -0.77, 0],
      ],
      centres: [{ index: 0, donors: [{ index: 1, distanceAngstrom: 2.07 }] }],
    };
    expect(drawnBonds(water)).toEqual([
      [1, 2],
      [1, 3],
    ]);
  });
});

describe('viewer in words', () => {
  it('tells every distance and angle in a table', () => {
    render(<SphereTable structure={tetrahedron} />);
    expect(screen.getAllByText('2.252')).toHaveLength(5); // four donors and their mean
    expect(screen.getAllByText('109.5')).toHaveLength(6);
    expect(screen.getByText('Cl1–Zn–Cl2')).toBeTruthy();
  });

  it('has a still projection with the same labels', () => {
    const { container } = render(
      <FlatProjection structure={tetrahedron} labels={{ distances: true, angles: true, names: true }} />,
    );
    const texts = [...container.querySelectorAll('text')].map((text) => text.textContent);
    expect(texts.filter((text) => text === '2.252')).toHaveLength(4);
    expect(texts.filter((text) => text === '109.5°')).toHaveLength(6);
    expect(texts).toContain('Cl4');
    expect(container.querySelectorAll('circle')).toHaveLength(5);
  });

  it('announces the neighbours of a picked atom', async () => {
    render(<StructureViewer structure={tetrahedron} />);
    await userEvent.selectOptions(screen.getByRole('combobox'), 'Zn');
    const said = document.querySelector('[aria-live="polite"]')?.textContent;
    expect(said).toBe('Zn: Cl1 2.252 Å, Cl2 2.252 Å, Cl3 2.252 Å, Cl4 2.252 Å');
  });

  it('shows distances at first and other labels on demand', async () => {
    render(<StructureViewer structure={tetrahedron} />);
    const pressed = (name: string) => screen.getByRole('button', { name }).getAttribute('aria-pressed');
    expect([pressed('Distances'), pressed('Angles'), pressed('Atom names')]).toEqual([
      'true',
      'false',
      'false',
    ]);
    await userEvent.click(screen.getByRole('button', { name: 'Angles' }));
    expect(pressed('Angles')).toBe('true');
  });
});

/** Distance of two colours as a deuteranope sees them, CIE Lab. Matrix: Viénot, Brettel, Mollon 1999 (from memory). */
function deuteranopeDistance(first: string, second: string): number {
  const lab = (hex: string) => {
    const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
      const share = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
      return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
    });
    const seen = [
      0.29275 * r + 0.70725 * g,
      0.29275 * r + 0.70725 * g,
      -0.02234 * r + 0.02234 * g + b,
    ] as const;
    const f = (t: number) => (t > 0.008856 ? Math.cbrt(t) : 7.787 * t + 16 / 116);
    const x = f((0.4124 * seen[0] + 0.3576 * seen[1] + 0.1805 * seen[2]) / 0.9505);
    const y = f(0.2126 * seen[0] + 0.7152 * seen[1] + 0.0722 * seen[2]);
    const z = f((0.0193 * seen[0] + 0.1192 * seen[1] + 0.9505 * seen[2]) / 1.089);
    return [116 * y - 16, 500 * (x - y), 200 * (y - z)] as const;
  };
  const [a, b] = [lab(first), lab(second)];
  return Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]);
}

it('keeps the metals Mn to Zn apart for a deuteranope: at least 15 in CIE Lab', () => {
  const metals = ['Mn', 'Fe', 'Co', 'Ni', 'Cu', 'Zn'];
  for (const [index, metal] of metals.entries()) {
    for (const other of metals.slice(index + 1)) {
      expect(
        deuteranopeDistance(atomColour(metal), atomColour(other)),
        `${metal} and ${other}`,
      ).toBeGreaterThan(15);
    }
  }
});
