import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { IndexTabs } from '@/components/ledger/index-tabs';
import { StudyLedger } from '@/components/ledger/study-ledger';
import type { StudyLedgerRow } from '@/components/ledger/study-ledger-row';

afterEach(cleanup);

const row: StudyLedgerRow = {
  id: 'cu',
  href: '/complexes/cu',
  formula: '[CuCl4]2-',
  metalWords: 'Cu(II)',
  dCount: 9,
  favoured: { geometry: 'T-4', flattened: true, multiplicity: 2, note: 'flattened' },
  next: { gapKJPerMol: 26.4, words: 'doublet SP-4' },
  meanDistanceAngstrom: 2.354,
  distanceHref: '/runs/1#line',
  shape: { index: 'tau4', value: 0.716 },
  handbook: { low: 1.9, high: 2.2 },
  mark: 'dotted',
  moment: { mu: 1.97, expandedU: 0.04 },
  unpaired: { count: 1.21, expandedU: 0.02 },
  technique: 'Balance, 295 K',
  assignment: { state: 'open', words: 'no proposal' },
};

const cells = (given: StudyLedgerRow) => {
  render(
    <StudyLedger
      groups={[{ id: 'dry', title: 'Dry salts', rows: [given] }]}
      sortLinks={{ gap: '?sort=gap' }}
    />,
  );
  return within(screen.getAllByRole('row').at(-1) as HTMLElement)
    .getAllByRole('cell')
    .map((cell) => cell.textContent?.replaceAll('\u00a0', ' ') ?? '');
};

describe('StudyLedger', () => {
  it('writes out the roles that grid rows on phones would lose', () => {
    cells(row);
    const table = screen.getByRole('table');
    expect(table.getAttribute('role')).toBe('table');
    for (const element of table.querySelectorAll('tr')) expect(element.getAttribute('role')).toBe('row');
    for (const element of table.querySelectorAll('td')) expect(element.getAttribute('role')).toBe('cell');
    for (const element of table.querySelectorAll('th'))
      expect(element.getAttribute('role')).toMatch(/header$/);
  });

  it('puts calculated values left of the mark and measured ones right of it', () => {
    const texts = cells(row);
    expect(texts[0]).toContain('T-4 doublet');
    expect(texts[1]).toContain('26.4');
    expect(texts[2]).toContain('2.354');
    expect(texts[3]).toContain('0.716');
    expect(texts[4]).toContain('1.9–2.2');
    expect(texts[5]).toContain('cannot tell');
    expect(texts[6]).toBe('1.97 ± 0.04');
    expect(texts[8]).toContain('1.21 ± 0.02');
    expect(texts[10]).toContain('open');
  });

  it('says absent, not measured and not calculated where nobody has a value', () => {
    const texts = cells({
      ...row,
      favoured: null,
      meanDistanceAngstrom: null,
      shape: null,
      handbook: null,
      moment: null,
      unpaired: null,
      technique: null,
    });
    expect(texts.filter((text) => /absent/.test(text))).toHaveLength(2);
    expect(texts.join('|')).toContain('not calculated');
    expect(texts.join('|')).toContain('not measured');
    expect(texts.join('|')).not.toMatch(/NaN|null|undefined/);
  });

  it('sorts by links and lets a distance be traced', () => {
    cells(row);
    expect(screen.getByRole('link', { name: 'Next state' }).getAttribute('href')).toBe('?sort=gap');
    expect(screen.getByRole('link', { name: '2.354 ångström, show source' }).getAttribute('href')).toBe(
      '/runs/1#line',
    );
  });
});

it('marks the current index tab as the current page and says what its number means', () => {
  render(
    <IndexTabs
      tabs={[
        { href: '/s', label: 'Study', current: true },
        { href: '/d', label: 'Disagreements', count: { value: 2, word: 'open' } },
      ]}
    />,
  );
  expect(screen.getByRole('link', { name: 'Study' }).getAttribute('aria-current')).toBe('page');
  expect(screen.getByRole('link', { name: /Disagreements\s*2 open/ }).hasAttribute('aria-current')).toBe(
    false,
  );
});
