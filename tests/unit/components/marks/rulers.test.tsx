import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { EnergyLadder } from '@/components/marks/energy-ladder';
import { ladderTicks, spreadLabels } from '@/components/marks/ladder-scale';
import { bandText, momentAxisEnd, momentTicks } from '@/components/marks/moment-axis';
import { MomentRuler } from '@/components/marks/moment-ruler';
import { RowRuler } from '@/components/marks/row-ruler';
import { ShapeStrip } from '@/components/marks/shape-strip';

afterEach(cleanup);

const bands = [
  { label: 'T-4 flattened, doublet', low: 1.9, high: 2.2, favoured: true, verdictWord: 'consistent' },
  { label: 'SP-4, doublet', low: 1.7, high: 2.2, favoured: false },
];

describe('moment ruler', () => {
  it('has ticks at the spin-only moments of n = 0 to 5', () => {
    // Textbook spin-only moments in μB, two decimals.
    expect(momentTicks(6.4).map(({ moment }) => moment.toFixed(2))).toEqual([
      '0.00',
      '1.73',
      '2.83',
      '3.87',
      '4.90',
      '5.92',
    ]);
  });

  it('grows for centres with more electrons instead of cutting them off', () => {
    const end = momentAxisEnd([{ label: 'Gd', low: 7.6, high: 8, favoured: true }], null);
    expect(end).toBeGreaterThan(8);
    expect(momentTicks(end).at(-1)?.unpaired).toBeGreaterThanOrEqual(7);
  });

  it('says every band, verdict and the measured value', () => {
    render(<MomentRuler bands={bands} measured={{ mu: 1.97, expandedU: 0.04 }} />);
    const label = screen.getByRole('img').getAttribute('aria-label');
    expect(label).toContain('T-4 flattened, doublet: 1.9–2.2, consistent.');
    expect(label).toContain('SP-4, doublet: 1.7–2.2.');
    expect(label).toContain('Measured 1.97 ± 0.04 Bohr magnetons.');
  });

  it('draws the favoured band solid and the others broken, at their share of the axis', () => {
    const { container } = render(<MomentRuler bands={bands} measured={null} />);
    const [favoured, other] = [...container.querySelectorAll('rect')];
    expect(favoured?.hasAttribute('stroke-dasharray')).toBe(false);
    expect(other?.getAttribute('stroke-dasharray')).toBe('4 3');
    expect(Number.parseFloat(favoured?.getAttribute('x') ?? '')).toBeCloseTo((1.9 / 6.4) * 100, 1);
    expect(screen.getByRole('img').getAttribute('aria-label')).toContain('Not measured.');
  });

  it('in a row puts the diamond over its moment', () => {
    const { container } = render(<RowRuler band={null} measured={{ mu: 3.2, expandedU: 0.1 }} width={168} />);
    expect(container.querySelector('path.fill-meas')?.getAttribute('d')).toMatch(/^M84 /);
  });

  it('prints a band of one value once', () => expect(bandText({ low: 0, high: 0 })).toBe('0'));
});

describe('energy ladder', () => {
  it('has round ticks that reach past the highest rung', () => {
    expect(ladderTicks(26.4)).toEqual([0, 10, 20, 30]);
    expect(ladderTicks(0)).toEqual([0]);
    expect(ladderTicks(200.1).at(-1)).toBeGreaterThanOrEqual(200.1);
  });

  it('moves labels apart without changing their order or leaving the drawing', () => {
    const places = spreadLabels([10, 12, 150, 152], 40, 160);
    expect(places).toEqual([10, 50, 120, 160]);
  });

  it('lists rungs in words, highest first, and writes the gap', () => {
    const { container } = render(
      <EnergyLadder
        dCount={9}
        rungs={[
          {
            label: 'flattened T-4',
            kJ: 0,
            favoured: true,
            multiplicity: 2,
            geometry: 'T-4',
            flattened: true,
          },
          { label: 'SP-4', kJ: 26.4, favoured: false, multiplicity: 2, geometry: 'SP-4' },
        ]}
      />,
    );
    const items = screen.getAllByRole('listitem');
    expect(items[0]?.textContent).toContain('SP-4, doublet, 26.4 kilojoule per mole above the lowest');
    expect(items[1]?.textContent).toContain('0.0 kilojoule per mole above the lowest, favoured');
    expect(container.querySelector('text.fill-calc')?.textContent).toBe('26.4');
  });
});

describe('shape strip', () => {
  it('says the value and puts it between its ends', () => {
    const { container } = render(
      <ShapeStrip from="T-4" to="SP-4" indexName="τ4" markers={[{ value: 0.716, label: 'Cu' }]} />,
    );
    expect(screen.getByRole('img').getAttribute('aria-label')).toContain('Cu 0.716');
    const marker = container.querySelector('path.fill-calc')?.parentElement;
    expect(marker?.getAttribute('x')).toBe('28.40%');
  });
});
