import { describe, expect, it } from 'vitest';
import { readOutput } from '@/lib/outputs/reader';

/** Short texts written in the manner of Psi4; numbers are made up except where a comment says otherwise. */
const banner = `
    -----------------------------------------------------------------------
          Psi4: An Open-Source Ab Initio Electronic Structure Package
                               Psi4 1.7 release

    Threads:    2

  ==> Input File <==

--------------------------------------------------------------------------
# SP4F7KQ2MX first line
energy('b3lyp')--------------------------------------------------------------------------
`;

const scf = (
  options: { x?: string; energy?: string; unit?: string; converged?: boolean; kind?: string } = {},
) => {
  const {
    x = '0.000000000000',
    energy = '-1.5',
    unit = 'Angstrom',
    converged = true,
    kind = 'DF-UKS',
  } = options;
  return `
         ---------------------------------------------------------
                                   SCF
               by Justin Turney, Rob Parrish, Andy Simmonett
         ---------------------------------------------------------

  ==> Geometry <==

    Geometry (in ${unit}), charge = 1, multiplicity = 2:

       Center              X                  Y                   Z               Mass       
    ------------   -----------------  -----------------  -----------------  -----------------
         ZN           ${x}     0.000000000000     0.000000000000    63.929142010000
         H            0.000000000000     0.000000000000     1.600000000000     1.007825032230

  Charge       = 0
  Multiplicity = 2
  Electrons    = 31

  ==> Primary Basis <==

  Basis Set: STO-3G
    Blend: STO-3G

   => Composite Functional: B3LYP <= 

  ==> Iterations <==

   @${kind} iter   1:  -1.4   -3.77611e+02   0.00000e+00 
   @${kind} iter   2:  ${energy}   -4.44107e+00   5.64058e-03 DIIS
${
  converged
    ? `  Energy and wave function converged.

   @S^2 Expected:                7.500000000E-01
   @S^2 Observed:                7.512000000E-01

    Orbital Energies [Eh]
    ---------------------

    Alpha Occupied:                                                       

       1A     -0.500000     2A     -0.300000

    Alpha Virtual:                                                        

       3A      0.100000

    Beta Occupied:                                                        

       1A     -0.450000

    Beta Virtual:                                                         

       2A     -0.050000

    Final Occupation by Irrep:

  @${kind} Final Energy:  ${energy}
`
    : ''
}`;
};
const end = `
    Psi4 wall time for execution: 1:02:03.50

*** Psi4 exiting successfully. Buy a developer a beer!
`;

const read = (text: string) => readOutput(new TextEncoder().encode(text));

describe('reading Psi4', () => {
  it('reads a single point with its spin, orbitals and settings', () => {
    const record = read(banner + scf() + end);
    expect(record).toMatchObject({
      program: 'Psi4',
      version: '1.7',
      outcome: 'finished',
      tasks: ['single point'],
      jobKey: 'SP4F7KQ2MX',
      formula: 'HZn',
      charge: 0,
      multiplicity: 2,
      electronCount: 31,
      energyHartree: -1.5,
      method: { functional: 'B3LYP', basis: 'STO-3G', reference: 'unrestricted' },
      scf: { converged: true, iterations: 2 },
      spin: { s2: 0.7512, s2Ideal: 0.75 },
      resources: { wallSeconds: 3723.5, cores: 2 },
    });
    // −0.3 hartree = −8.163416 eV (CODATA 2022).
    expect(record.orbitals?.alpha.homoEv).toBeCloseTo(-8.163416, 5);
    expect(record.orbitals?.beta?.lumoEv).toBeCloseTo(-1.360569, 5);
    expect(record.evidence.energyHartree?.text).toContain('Final Energy');
  });

  it('converts a geometry in bohr', () => {
    const record = read(banner + scf({ unit: 'Bohr' }) + end);
    // 1.6 bohr = 0.846684 Å (CODATA 2022).
    expect(record.geometry?.positionsAngstrom[1]?.[2]).toBeCloseTo(0.846684, 6);
  });

  it('says nothing of a result when the file stops in the iterations', () => {
    const record = read(banner + scf({ converged: false }));
    expect(record).toMatchObject({ outcome: 'cut off', energyHartree: null, scf: { converged: false } });
    expect(record.spin.s2).toBeNull();
    expect(record.orbitals).toBeNull();
  });

  it('keeps two calculations of one file apart', () => {
    const record = read(
      banner + scf({ energy: '-1.5' }) + scf({ energy: '-1.7', x: '0.300000000000' }) + end,
    );
    expect(record.steps.map(({ energyHartree }) => energyHartree)).toEqual([-1.5, -1.7]);
    expect(record.energyHartree).toBe(-1.7);
  });

  it('names why an SCF failed', () => {
    const record = read(
      `${banner}${scf({ converged: false })}
PsiException: Could not converge SCF iterations in 300 iterations.

*** Psi4 encountered an error. Buy a developer more coffee!
`,
    );
    expect(record).toMatchObject({
      outcome: 'failed',
      failure: { kind: 'scf not converged' },
      energyHartree: null,
    });
  });

  it('takes the undisplaced energy of a derivative by finite differences', () => {
    const displaced = Array.from(
      { length: 3 },
      (_each, n) => banner + scf({ energy: `-1.4${n}`, x: `0.0${n + 1}` }),
    );
    const record = read(
      `${banner}
  Using finite-differences of gradients to determine vibrational frequencies and 
${banner}${scf({ energy: '-1.512345678' })}${displaced.join('')}
  Generating complete list of displacements from unique ones.
  Freq [cm^-1]                 889.1554i
  Total E0, Electronic energy at well bottom at 0 [K]                 -1.51234568 [Eh]
  Total G, Free enthalpy at  298.15 [K]                               -1.49000000 [Eh]
${end}`,
    );
    expect(record).toMatchObject({
      outcome: 'finished',
      tasks: ['frequencies'],
      energyHartree: -1.512345678,
      frequencies: { count: 1, imaginaryCount: 1, lowestCm1: -889.1554 },
      thermochemistry: { temperatureK: 298.15, gibbsHartree: -1.49 },
    });
  });
});
