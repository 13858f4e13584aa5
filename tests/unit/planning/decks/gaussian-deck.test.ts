import { describe, expect, it } from 'vitest';
import { deckLines, flippedPair, refusalCode, request } from './deck-cases';

// Sections and keywords after the Gaussian 16 User's Reference.
describe('a Gaussian deck', () => {
  it('says an optimisation with frequencies and two basis sets line by line', () => {
    const lines = deckLines(
      request(
        {
          program: 'Gaussian',
          functional: 'PBE0',
          dispersion: 'D3(BJ)',
          solvation: { model: 'SMD', solvent: 'water' },
          basis: '6-31G(d)',
          basisPerElement: { Fe: 'LANL2DZ' },
          scf: { difficult: true },
          optimisation: { convergence: 'tight' },
        },
        { task: 'optimisation and frequencies' },
      ),
    );
    expect(lines).toEqual([
      // Link 0: checkpoint file, shared-memory cores, memory (85 % of the job's).
      '%chk=SP1234567W.chk',
      '%nprocshared=4',
      '%mem=6800MB',
      // #p: more printing. U: unrestricted. PBE1PBE: PBE0. GenECP: basis and core potentials follow below.
      // Opt with most steps and tight thresholds. Freq: second derivatives after it.
      '#p UPBE1PBE/GenECP Opt=(MaxCycles=100,Tight) Freq',
      // GD3BJ: D3 with Becke–Johnson damping. SCRF: SMD continuum of water.
      'EmpiricalDispersion=GD3BJ SCRF=(SMD,Solvent=Water) Int=(Grid=UltraFine)',
      // Int: (99,590) grid. XQC: quadratically convergent SCF if the first fails; NoVarAcc: full accuracy
      // from the first cycle; MaxCycle: most SCF cycles. Pop=Regular: frontier orbitals and charges.
      'SCF=(XQC,NoVarAcc,MaxCycle=300) Pop=Regular',
      '',
      // Title: no @ # ! - _ \ may stand here.
      'SP1234567W FeCl4 m5 optimisation and frequencies',
      '',
      // Charge and multiplicity, then atoms in ångström.
      '-2 5',
      'Fe      0.00000000     0.00000000     0.00000000',
      'Cl      1.90000000     0.00000000     1.25000000',
      'Cl     -1.90000000     0.00000000     1.25000000',
      'Cl      0.00000000     1.90000000    -1.25000000',
      'Cl      0.00000000    -1.90000000    -1.25000000',
      '',
      // Basis section: elements and 0, name of the set, end of the entry.
      'Fe 0',
      'LANL2DZ',
      '****',
      'Cl 0',
      '6-31G(d)',
      '****',
      '',
      // Potential section.
      'Fe 0',
      'LANL2DZ',
      // The input ends with a blank line.
      '',
      '',
    ]);
  });

  it('says a broken-symmetry guess from ions as fragments', () => {
    const lines = deckLines(request({ program: 'Gaussian' }, flippedPair));
    // Guess=Fragment=3: two ions and the rest. NoSymm: no symmetry that would tie alpha to beta.
    expect(lines[3]).toBe('#p UB3LYP/Def2SVP Guess=Fragment=3 NoSymm Int=(Grid=UltraFine)');
    // Total charge and multiplicity, then each fragment's; −2 is a doublet with its electron in beta.
    expect(lines).toContain('2 1 2 2 2 -2 -2 1');
    expect(lines.find((line) => line.startsWith('Cu(Fragment=2)'))).toMatch(/1\.90000000$/);
    expect(lines.find((line) => line.startsWith('O(Fragment=3)'))).toBeDefined();
  });

  it('says a stability analysis that follows a lower determinant', () => {
    expect(deckLines(request({ program: 'Gaussian' }, { task: 'stability' })).join('\n')).toContain(
      'Stable=Opt NoSymm',
    );
  });

  it('keeps every route line within 72 columns', () => {
    const lines = deckLines(
      request({
        program: 'Gaussian',
        extra: { keywords: ['IOp(3/33=1)', 'Density=Current', 'Polar', 'Test'] },
      }),
    );
    for (const line of lines.slice(3, lines.indexOf(''))) expect(line.length).toBeLessThanOrEqual(72);
  });

  it('refuses what Gaussian does not have', () => {
    expect(refusalCode(request({ program: 'Gaussian', functional: 'r2SCAN' }))).toBe(
      'functional not available',
    );
    expect(refusalCode(request({ program: 'Gaussian', dispersion: 'D4' }))).toBe('dispersion not available');
    expect(refusalCode(request({ program: 'Gaussian', relativity: 'ZORA' }))).toBe(
      'relativity not available',
    );
  });
});
