import { describe, expect, it } from 'vitest';
import { deckLines, flippedPair, refusalCode, request } from './deck-cases';

// Input language after the Psi4 1.3 manual; run for real in tests/integration/decks.test.ts.
describe('a Psi4 deck', () => {
  it('says an optimisation with frequencies line by line', () => {
    const lines = deckLines(
      request(
        {
          program: 'Psi4',
          functional: 'PBE0',
          basisPerElement: { Fe: 'def2-TZVP' },
          scf: { difficult: true },
        },
        { task: 'optimisation and frequencies' },
      ),
    );
    expect(lines).toEqual([
      // Comment; echoed in the output's input section.
      '# SP1234567W FeCl4 m5 optimisation and frequencies',
      'memory 7200 MB',
      'molecule {',
      // Charge and multiplicity.
      '  -2 5',
      '  Fe      0.00000000     0.00000000     0.00000000',
      '  Cl      1.90000000     0.00000000     1.25000000',
      '  Cl     -1.90000000     0.00000000     1.25000000',
      '  Cl      0.00000000     1.90000000    -1.25000000',
      '  Cl      0.00000000    -1.90000000    -1.25000000',
      '  units angstrom',
      // c1: no symmetry, so that no determinant is shut out; the frame stays as given.
      '  symmetry c1',
      '  no_reorient',
      '  no_com',
      '}',
      'basis {',
      '  assign def2-svp',
      '  assign Fe def2-tzvp',
      '}',
      'set {',
      // uks: unrestricted Kohn–Sham. df: density fitting. sad: guess from atomic densities.
      '  reference uks',
      '  scf_type df',
      '  guess sad',
      '  maxiter 300',
      // Grid of 590 directions and 99 shells.
      '  dft_spherical_points 590',
      '  dft_radial_points 99',
      // Mix 40 % of the last density into the new one.
      '  damping_percentage 40',
      '  geom_maxiter 100',
      // Gaussian's default thresholds.
      '  g_convergence gau',
      '}',
      "energy_last, wfn = optimize('pbe0', return_wfn=True)",
      "energy_last, wfn = frequency('pbe0', return_wfn=True)",
      '',
    ]);
  });

  it('breaks the symmetry of two equal single electrons by mixing the frontier orbitals', () => {
    expect(deckLines(request({ program: 'Psi4' }, flippedPair))).toContain('  guess_mix true');
  });

  it('refuses what Psi4 does not have', () => {
    expect(refusalCode(request({ program: 'Psi4' }, { task: 'stability' }))).toBe('task not available');
    expect(refusalCode(request({ program: 'Psi4', relativity: 'ZORA' }))).toBe('relativity not available');
    expect(
      refusalCode(
        request(
          { program: 'Psi4', solvation: { model: 'CPCM', solvent: 'water' } },
          { task: 'optimisation' },
        ),
      ),
    ).toBe('solvation not available');
  });
});
