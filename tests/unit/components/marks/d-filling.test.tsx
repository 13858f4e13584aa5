import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { DConfiguration } from '@/components/marks/d-configuration';
import { dConfiguration, dFilling } from '@/components/marks/d-filling';
import { DOrbitalGlyph } from '@/components/marks/d-orbital-glyph';

afterEach(cleanup);

const electrons = (geometry: string, dCount: number, multiplicity: number) =>
  dConfiguration(geometry, dCount, multiplicity)?.map((level) => level.electrons);

describe('d fillings', () => {
  // Textbook configurations (common practice): high- and low-spin octahedral, tetrahedral, square planar.
  it.each([
    ['OC-6', 5, 6, [3, 2]],
    ['OC-6', 5, 2, [5, 0]],
    ['OC-6', 6, 5, [4, 2]],
    ['OC-6', 6, 1, [6, 0]],
    ['OC-6', 7, 4, [5, 2]],
    ['OC-6', 8, 3, [6, 2]],
    ['T-4', 7, 4, [4, 3]],
    ['T-4', 9, 2, [4, 5]],
    ['SP-4', 8, 1, [4, 2, 2, 0]],
  ])('%s d%i of multiplicity %i fills its levels with %j', (geometry, dCount, multiplicity, levels) => {
    expect(electrons(geometry, dCount, multiplicity)).toEqual(levels);
  });

  it('holds every electron and the asked number of unpaired ones wherever a filling exists', () => {
    for (let dCount = 0; dCount <= 10; dCount += 1) {
      for (let unpaired = dCount % 2; unpaired <= Math.min(dCount, 10 - dCount); unpaired += 2) {
        const filling = dFilling(dCount, unpaired + 1) ?? [];
        expect(filling.reduce((sum, count) => sum + count, 0)).toBe(dCount);
        expect(filling.filter((count) => count === 1)).toHaveLength(unpaired);
      }
    }
  });

  it.each([
    [9, 4],
    [5, 5],
    [3, 6],
  ])('refuses d%i of multiplicity %i', (dCount, multiplicity) =>
    expect(dFilling(dCount, multiplicity)).toBeNull(),
  );

  it('draws as many arrows as electrons and says the field', () => {
    render(<DOrbitalGlyph geometry="OC-6" dCount={6} multiplicity={5} />);
    const glyph = screen.getByRole('img', { name: 'd6, octahedral field, 4 unpaired' });
    expect(glyph.querySelectorAll('path[stroke-width="1.25"]')).toHaveLength(6);
  });

  it('says so when five orbitals cannot hold the state', () => {
    render(<DOrbitalGlyph geometry="T-4" dCount={9} multiplicity={4} />);
    expect(screen.getByRole('img').getAttribute('aria-label')).toMatch(/no such filling/);
  });

  it('prints configurations only where the notation is in use', () => {
    const oc6 = render(<DConfiguration geometry="OC-6" dCount={6} multiplicity={5} />);
    expect(oc6.container.textContent).toBe('t2g4 eg2');
    expect(render(<DConfiguration geometry="SP-4" dCount={8} multiplicity={1} />).container.textContent).toBe(
      '',
    );
  });
});
