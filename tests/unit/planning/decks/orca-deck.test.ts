import { describe, expect, it } from 'vitest';
import { deckLines, flippedPair, refusalCode, request } from './deck-cases';

// Keywords and blocks after the ORCA 5 manual (general structure of the input; DFT; SCF; CPCM; broken symmetry).
describe('an ORCA deck', () => {
  it('says an optimisation with frequencies line by line', () => {
    const lines = deckLines(
      request(
        {
          program: 'ORCA',
          dispersion: 'D3(BJ)',
          solvation: { model: 'CPCM', solvent: 'water' },
          basisPerElement: { Fe: 'def2-TZVP' },
          scf: { difficult: true },
        },
        { task: 'optimisation and frequencies' },
      ),
    );
    expect(lines).toEqual([
      // Comment; ORCA echoes it in its input section, where the job key is found again.
      '# SP1234567W FeCl4 m5 optimisation and frequencies',
      // UKS: unrestricted Kohn–Sham. B3LYP/G: B3LYP with VWN's RPA fit as Gaussian defines it. def2-SVP:
      // basis. RIJCOSX: Coulomb by density fitting, exchange by chain of spheres; def2/J its auxiliary
      // set. D3BJ: Grimme's D3 with Becke–Johnson damping. CPCM(Water): conductor-like continuum.
      // DefGrid2: integration grids. TightSCF: 1e-8 Eh. SlowConv: strong damping for open shells. Opt:
      // optimisation. Freq: analytic second derivatives at the optimised structure.
      '! UKS B3LYP/G def2-SVP RIJCOSX def2/J D3BJ CPCM(Water) DefGrid2 TightSCF SlowConv Opt Freq',
      // Parallel processes.
      '%pal nprocs 4 end',
      // MB per process: three quarters of 8000 over four.
      '%maxcore 1500',
      '%scf',
      // Most SCF cycles.
      '  MaxIter 300',
      // Fock matrices kept for DIIS (default 5), and how often the Fock matrix is built anew.
      '  DIISMaxEq 15',
      '  DirectResetFreq 5',
      'end',
      '%geom',
      // Most optimisation steps.
      '  MaxIter 100',
      'end',
      '%basis',
      // Another orbital basis for one element.
      '  NewGTO Fe "def2-TZVP" end',
      'end',
      // Cartesian coordinates in ångström, charge, multiplicity.
      '* xyz -2 5',
      'Fe      0.00000000     0.00000000     0.00000000',
      'Cl      1.90000000     0.00000000     1.25000000',
      'Cl     -1.90000000     0.00000000     1.25000000',
      'Cl      0.00000000     1.90000000    -1.25000000',
      'Cl      0.00000000    -1.90000000    -1.25000000',
      '*',
      '',
    ]);
  });

  it('says a broken-symmetry run from the high-spin side', () => {
    const lines = deckLines(request({ program: 'ORCA' }, flippedPair));
    // FlipSpin: atoms (from 0) whose spin is turned round after the high-spin SCF; FinalMs: M_S after it.
    expect(lines).toContain('  FlipSpin 2');
    expect(lines).toContain('  FinalMs 0.0');
    // The multiplicity in the coordinates line is the high-spin one.
    expect(lines).toContain('* xyz 2 3');
  });

  it('says a stability analysis', () => {
    const lines = deckLines(request({ program: 'ORCA' }, { task: 'stability' }));
    // STABPerform: analyse the determinant; STABRestartUHFifUnstable: go on to a lower one.
    expect(lines).toContain('  STABPerform true');
    expect(lines).toContain('  STABRestartUHFifUnstable true');
  });

  it('takes second derivatives of a meta-GGA numerically and fits Coulomb alone for a GGA', () => {
    expect(deckLines(request({ program: 'ORCA', functional: 'TPSSh' }, { task: 'frequencies' }))[1]).toMatch(
      / NumFreq$/,
    );
    expect(deckLines(request({ program: 'ORCA', functional: 'BP86' }))[1]).toBe(
      '! UKS BP86 def2-SVP RI def2/J DefGrid2 TightSCF',
    );
  });

  it('says SMD with its block and ZORA with its recontracted sets', () => {
    const smd = deckLines(request({ program: 'ORCA', solvation: { model: 'SMD', solvent: 'acetonitrile' } }));
    expect(smd.join('\n')).toContain('%cpcm\n  smd true\n  SMDsolvent "Acetonitrile"\nend');
    expect(deckLines(request({ program: 'ORCA', relativity: 'ZORA' }))[1]).toContain(
      'ZORA-def2-SVP RIJCOSX SARC/J ZORA',
    );
  });

  it('refuses what ORCA does not have', () => {
    expect(refusalCode(request({ program: 'ORCA', functional: 'ωB97X-D' }))).toBe('functional not available');
    expect(refusalCode(request({ program: 'ORCA', solvation: { model: 'COSMO', solvent: 'water' } }))).toBe(
      'solvation not available',
    );
    expect(refusalCode(request({ program: 'ORCA', basis: 'cc-pVDZ', relativity: 'DKH2' }))).toBe(
      'relativity not available',
    );
  });
});
