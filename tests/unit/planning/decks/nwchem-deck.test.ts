import { describe, expect, it } from 'vitest';
import { deckLines, flippedPair, refusalCode, request } from './deck-cases';

// Directives after the NWChem user documentation; run for real in tests/integration/decks.test.ts.
describe('an NWChem deck', () => {
  it('says an optimisation with frequencies line by line', () => {
    const lines = deckLines(
      request(
        {
          program: 'NWChem',
          dispersion: 'D3(0)',
          solvation: { model: 'COSMO', solvent: 'water' },
          basisPerElement: { Fe: 'def2-TZVP' },
          scf: { difficult: true },
        },
        { task: 'optimisation and frequencies' },
      ),
    );
    expect(lines).toEqual([
      // echo: print the input, and with it the title. start: stem of the files written.
      'echo',
      'start sp1234567w',
      'title "SP1234567W FeCl4 m5 optimisation and frequencies"',
      // Per process: nine tenths of 8000 over four.
      'memory total 1800 mb',
      'charge -2',
      // noautosym: no symmetry from the coordinates; nocenter: leave them where they are.
      'geometry units angstroms noautosym nocenter',
      '  Fe      0.00000000     0.00000000     0.00000000',
      '  Cl      1.90000000     0.00000000     1.25000000',
      '  Cl     -1.90000000     0.00000000     1.25000000',
      '  Cl      0.00000000     1.90000000    -1.25000000',
      '  Cl      0.00000000    -1.90000000    -1.25000000',
      'end',
      // Spherical functions: five d, seven f.
      'basis "ao basis" spherical',
      '  Fe library "def2-tzvp"',
      '  Cl library "def2-svp"',
      'end',
      // COSMO continuum with the permittivity of water.
      'cosmo',
      '  dielec 78.36',
      'end',
      'dft',
      '  xc b3lyp',
      // odft: unrestricted, also where the multiplicity would not ask for it.
      '  odft',
      '  mult 5',
      '  iterations 300',
      '  grid fine',
      // D3 with zero damping.
      '  disp vdw 3',
      // Damp the first 30 cycles by half, shift the virtual orbitals by 0.3 hartree.
      '  convergence ncydp 30 damp 50 lshift 0.3',
      // Mulliken populations of charge and spin.
      '  mulliken',
      'end',
      'driver',
      '  maxiter 100',
      'end',
      'task dft optimize',
      // No analytic second derivatives with COSMO.
      'task dft frequencies numerical',
      '',
    ]);
  });

  it('puts a broken-symmetry guess together from the ions, the flipped one with negative multiplicity', () => {
    const text = deckLines(request({ program: 'NWChem' }, flippedPair)).join('\n');
    expect(text).toContain('set geometry part1\ncharge -2\ndft\n  xc b3lyp\n  odft\n  mult 1\n');
    expect(text).toContain('set geometry part2\ncharge 2\ndft\n  xc b3lyp\n  odft\n  mult 2\n');
    expect(text).toContain('set geometry part3\ncharge 2\ndft\n  xc b3lyp\n  odft\n  mult -2\n');
    expect(text).toContain(
      'vectors input fragment sp1234567w_part1.movecs sp1234567w_part2.movecs sp1234567w_part3.movecs output',
    );
  });

  it('leaves internal coordinates out where none are needed or none can be built', () => {
    const geometryLine = (lines: string[]) => lines.find((line) => line.startsWith('geometry'));
    const linear = {
      structure: {
        elements: ['Cu', 'Cl', 'Cl'],
        positionsAngstrom: [
          [0, 0, 0],
          [1.2, 1.2, 1.2],
          [-1.2, -1.2, -1.2],
        ] as [number, number, number][],
      },
      charge: -1,
      multiplicity: 1,
      task: 'optimisation' as const,
    };
    // noautoz: Cartesian coordinates; NWChem ends with an error for a linear molecule otherwise.
    expect(geometryLine(deckLines(request({ program: 'NWChem' }, linear)))).toMatch(/ noautoz$/);
    expect(geometryLine(deckLines(request({ program: 'NWChem' })))).toMatch(/ noautoz$/);
    expect(geometryLine(deckLines(request({ program: 'NWChem' }, { task: 'optimisation' })))).toMatch(
      / nocenter$/,
    );
  });

  it('adds the core potential of a def2 set from rubidium on', () => {
    const text = deckLines(
      request(
        { program: 'NWChem' },
        {
          structure: {
            elements: ['Pd', 'H', 'H'],
            positionsAngstrom: [
              [0, 0, 0],
              [1.6, 0, 0],
              [-1.6, 0, 0],
            ],
          },
          charge: 0,
          multiplicity: 1,
        },
      ),
    ).join('\n');
    expect(text).toContain('ecp\n  Pd library "def2-ecp"\nend');
  });

  it('refuses what NWChem does not have', () => {
    expect(refusalCode(request({ program: 'NWChem' }, { task: 'stability' }))).toBe('task not available');
    expect(refusalCode(request({ program: 'NWChem', dispersion: 'D4' }))).toBe('dispersion not available');
    expect(
      refusalCode(request({ program: 'NWChem', solvation: { model: 'SMD', solvent: 'chloroform' } })),
    ).toBe('solvation not available');
  });
});
