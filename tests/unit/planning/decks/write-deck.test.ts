import { describe, expect, it } from 'vitest';
import { findJobKey } from '@/lib/planning/job-key';
import type { DeckTask } from '@/lib/planning/method';
import { deckLines, ferrate, flippedPair, refusalCode, request } from './deck-cases';

const programs = ['ORCA', 'Gaussian', 'NWChem', 'Psi4'] as const;

describe('every deck', () => {
  it.each(programs)('of %s carries the job key whatever the label says', (program) => {
    const text = deckLines(request({ program }, { label: '"#!-_\\@* %} ²⁺\n$new_job' })).join('\n');
    expect(findJobKey(text)).toBe('SP1234567W');
    expect(text).toMatch(/^[\x20-\x7e\n]*$/);
    expect(text).not.toMatch(/\$new_job|@|\\/);
  });

  it.each(programs)('of %s is the same for the same request', (program) => {
    expect(deckLines(request({ program }))).toEqual(deckLines(request({ program })));
  });

  it.each(programs)('of %s takes the group’s own lines without losing its own', (program) => {
    const plain = deckLines(request({ program }));
    const lines = deckLines(
      request({
        program,
        extra: { lines: ['# our line'].map((l) => (program === 'Gaussian' ? 'our line' : l)) },
      }),
    );
    for (const line of plain) expect(lines).toContain(line);
    expect(lines.some((line) => line.includes('our line'))).toBe(true);
  });
});

describe('a deck is refused', () => {
  const line = (program: (typeof programs)[number], text: string) =>
    request({ program, extra: { lines: [text] } });
  it.each([
    [
      'a multiplicity of the wrong parity',
      'impossible multiplicity',
      request({ program: 'ORCA' }, { multiplicity: 4 }),
    ],
    ['a multiplicity of zero', 'impossible multiplicity', request({ program: 'ORCA' }, { multiplicity: 0 })],
    [
      'no electrons',
      'impossible multiplicity',
      request({ program: 'ORCA' }, { charge: 94, multiplicity: 1 }),
    ],
    ['a functional nobody has', 'functional not available', request({ program: 'ORCA', functional: 'XYZ' })],
    ['a basis nobody has', 'basis not available', request({ program: 'ORCA', basis: 'our basis' })],
    ['a basis outside the library', 'basis not available', request({ program: 'Psi4', basis: 'LANL2DZ' })],
    [
      'a basis without iron',
      'basis missing for element',
      request({ program: 'NWChem', basis: '6-311G(d,p)' }),
    ],
    [
      'an unknown element',
      'unknown element',
      request({ program: 'ORCA' }, { structure: { ...ferrate, elements: ['Xx', 'Cl', 'Cl', 'Cl', 'Cl'] } }),
    ],
    [
      'five thousand atoms',
      'too many atoms',
      request(
        { program: 'ORCA' },
        {
          structure: {
            elements: Array.from({ length: 5000 }, () => 'H'),
            positionsAngstrom: Array.from({ length: 5000 }, (_, index) => [index, 0, 0] as const),
          },
        },
      ),
    ],
    [
      'two atoms in one place',
      'bad structure',
      request(
        { program: 'ORCA' },
        {
          structure: {
            ...ferrate,
            positionsAngstrom: ferrate.positionsAngstrom.map(() => [0, 0, 0] as const),
          },
        },
      ),
    ],
    [
      'a second dispersion term',
      'dispersion not available',
      request({ program: 'Gaussian', functional: 'ωB97X-D', dispersion: 'D3(BJ)' }),
    ],
    [
      'an unknown solvent',
      'solvation not available',
      request({ program: 'ORCA', solvation: { model: 'CPCM', solvent: 'honey' } }),
    ],
    [
      'a key with a wrong check character',
      'bad job key',
      request({ program: 'ORCA' }, { jobKey: 'SP1234567X' }),
    ],
    ['other coordinates by the back door (ORCA)', 'bad extra line', line('ORCA', '* xyz 0 1')],
    ['another job by the back door (Gaussian)', 'bad extra line', line('Gaussian', '--Link1--')],
    ['another charge by the back door (NWChem)', 'bad extra line', line('NWChem', ' charge 3')],
    ['another molecule by the back door (Psi4)', 'bad extra line', line('Psi4', 'molecule x {')],
    ['an extra line with a line break', 'bad extra line', line('ORCA', 'a\nb')],
    ['broken symmetry without sites', 'bad sites', request({ program: 'ORCA' }, { task: 'broken symmetry' })],
    [
      'sites that do not add up',
      'bad sites',
      request({ program: 'ORCA' }, { ...flippedPair, multiplicity: 3 }),
    ],
    [
      'sites with other ions',
      'bad sites',
      request(
        { program: 'ORCA' },
        {
          ...flippedPair,
          charge: 0,
          sites: flippedPair.sites?.map((site) => ({ ...site, oxidationState: 1 })) ?? [],
        },
      ),
    ],
  ] as const)('for %s', (_what, code, wanted) => {
    expect(refusalCode(wanted)).toBe(code);
  });

  it.each<[DeckTask, boolean]>([
    ['single point', true],
    ['optimisation', true],
    ['frequencies', true],
    ['optimisation and frequencies', true],
    ['stability', true],
  ])('for no program without stability analysis, and %s is written elsewhere', (task, orcaCan) => {
    expect(refusalCode(request({ program: 'ORCA' }, { task })) === null).toBe(orcaCan);
    expect(refusalCode(request({ program: 'NWChem' }, { task })) === null).toBe(task !== 'stability');
  });
});
