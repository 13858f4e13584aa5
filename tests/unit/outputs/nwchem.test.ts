import { describe, expect, it } from 'vitest';
import { readOutput } from '@/lib/outputs/reader';

// Small outputs written for these tests after the layout that the program prints.
const read = (...parts: string[]) => readOutput(new TextEncoder().encode(parts.join('\n') + '\n'));

const banner = `
          Northwest Computational Chemistry Package (NWChem) 7.2.0
          --------------------------------------------------------
    nproc           =        8
                                NWChem Input Module
                                -------------------


                                 dry salt SP4F7KQ2MX
                                 -------------------
`;

const geometry = (z: string, repulsion: string) => `
                             Geometry "geometry" -> "geometry"
                             ---------------------------------

 Output coordinates in angstroms (scale by  1.889725989 to convert to a.u.)

  No.       Tag          Charge          X              Y              Z
 ---- ---------------- ---------- -------------- -------------- --------------
    1 fe1                 26.0000     0.00000000     0.00000000     0.00000000
    2 Cl                  17.0000     0.00000000     0.00000000     ${z}

      Atomic Mass
 Effective nuclear repulsion energy (a.u.)     ${repulsion}
`;

const settings = (multiplicity: string) => `
                                 NWChem DFT Module
                                 -----------------

                                dry salt SP4F7KQ2MX

 Summary of "ao basis" -> "ao basis" (spherical)
 ------------------------------------------------------------------------------
       Tag                 Description            Shells   Functions and Types
 ---------------- ------------------------------  ------  ---------------------
 fe1                        def2-tzvp               19       63   6s4p4d1f
 Cl                         def2-svp                 8       18   4s3p1d

            General Information
            -------------------
          SCF calculation type: DFT
          Wavefunction type:  spin polarized.
          No. of atoms     :     2
          No. of electrons :    42
          Charge           :     1
          Spin multiplicity:     ${multiplicity}
              XC Information
              --------------
                    Becke 1988 Exchange Functional  1.000
                Perdew 1986 Correlation Functional  1.000 non-local

             Grid Information
   convergence    iter        energy       DeltaE   RMS-Dens  Diis-err    time
 d= 0,ls=0.0,diis     1  -1722.1361784483 -3.76D+03  6.38D-02  6.53D+00     8.6
 d= 0,ls=0.0,diis    17  -1723.1361784483 -3.76D-07  6.38D-06  6.53D-06     9.6
`;

const energy = (total: string, repulsion: string) => `
         Total DFT energy =    ${total}
      One electron energy =    -1740.245667770495
 Nuclear repulsion energy =      ${repulsion}
`;

const populations = (charge: string, spin: string) => `
      Total Density - Mulliken Population Analysis
     ---------------------------------------------

    Atom       Charge   Shell Charges
 -----------   ------   -------------------------------------------------------
    1 fe1 26    ${charge}   2.00  2.00
    2 Cl  17    17.00   2.00  2.00

      Spin Density - Mulliken Population Analysis
     --------------------------------------------

    Atom       Charge   Shell Charges
 -----------   ------   -------------------------------------------------------
    1 fe1 26     ${spin}   0.00  0.00
    2 Cl  17     0.10   0.00  0.00

`;

const taskEnd = ' Task  times  cpu:        0.9s     wall:        2.2s\n';
const end = ' Total times  cpu:       13.3s     wall:       19.9s';
const step = (n: number, e: string) => `@ ${n}   ${e} -1.4D-02  0.00534  0.00319  0.23295  0.43022    219.8`;
const optimisation = '                           NWChem Geometry Optimization';
const errorBox = (message: string) => `
 ------------------------------------------------------------------------
 ${message}
 ------------------------------------------------------------------------
 ------------------------------------------------------------------------
  current input line :
    30: task dft optimize
 ------------------------------------------------------------------------
`;

const singlePoint = [
  banner,
  geometry('2.28000000', '102.5779012315'),
  settings('5'),
  energy('-1723.136178448301', '102.577901231500'),
];

describe('NWChem', () => {
  it('reads a single point whole', () => {
    const record = read(...singlePoint, populations('25.00', '3.90'), taskEnd, end);
    expect(record).toMatchObject({
      program: 'NWChem',
      version: '7.2.0',
      outcome: 'finished',
      failure: null,
      tasks: ['single point'],
      title: 'dry salt SP4F7KQ2MX',
      jobKey: 'SP4F7KQ2MX',
      formula: 'ClFe',
      charge: 1,
      multiplicity: 5,
      energyHartree: -1723.136178448301,
      scf: { converged: true, iterations: 17 },
      resources: { wallSeconds: 19.9, cores: 8 },
      warnings: [],
    });
    expect(record.method).toMatchObject({
      functional: 'Becke 1988 Exchange + Perdew 1986 Correlation',
      basis: 'def2-tzvp + def2-svp',
      reference: 'unrestricted',
    });
    expect(record.populations).toEqual([
      {
        scheme: 'Mulliken',
        atoms: [
          { element: 'Fe', charge: 1, spin: 3.9 },
          { element: 'Cl', charge: 0, spin: 0.1 },
        ],
      },
    ]);
    expect(record.evidence.energyHartree?.text).toBe('Total DFT energy =    -1723.136178448301');
  });

  it('passes over the populations of the guess, printed before the energy', () => {
    const guess = [...singlePoint.slice(0, 3), populations('25.00', '3.90'), ...singlePoint.slice(3)];
    expect(read(...guess, taskEnd, end).populations).toEqual([]);
  });

  it('leaves a table out whose electrons do not add up to the charge (core potentials)', () => {
    const record = read(...singlePoint, populations('15.00', '3.90'), taskEnd, end);
    expect(record.populations).toEqual([]);
    expect(record.warnings.map(({ code }) => code)).toContain('table-damaged');
  });

  it('warns when spin populations, electrons and multiplicity contradict one another', () => {
    const record = read(...singlePoint, populations('25.00', '1.90'), taskEnd, end);
    expect(record.warnings.map(({ code }) => code)).toEqual(['spin-sum']);
    const even = [...singlePoint];
    even[2] = settings('4');
    expect(read(...even, taskEnd, end).warnings.map(({ code }) => code)).toContain(
      'spin-multiplicity-parity',
    );
  });

  it('reads a negative multiplicity as beta electrons in excess', () => {
    const beta = [...singlePoint];
    beta[2] = settings('-5');
    const record = read(...beta, '      <S2> =      6.0000 (Exact =     2.0000)', taskEnd, end);
    expect(record.multiplicity).toBe(5);
    expect(record.spin).toMatchObject({ s2: 6, s2Ideal: null });
    expect(record.warnings.map(({ code }) => code)).toEqual(['beta-excess']);
  });

  it('says that the SCF failed, with the line of the reason', () => {
    const record = read(
      ...singlePoint.slice(0, 3),
      '      Calculation failed to converge',
      energy('-1723.136178448301', '102.577901231500'),
      errorBox('dft optimize failed'),
    );
    expect(record.outcome).toBe('failed');
    expect(record.scf.converged).toBe(false);
    expect(record.failure).toMatchObject({ kind: 'scf not converged', message: 'dft optimize failed' });
    expect(record.warnings.map(({ code }) => code)).toContain('scf-not-converged');
  });

  it('keeps the last step of an optimisation that ended in a line search', () => {
    const record = read(
      banner,
      optimisation,
      geometry('2.28000000', '102.5779012315'),
      settings('5'),
      energy('-1723.136178448301', '102.577901231500'),
      populations('25.00', '3.90'),
      step(0, '-1723.13617845'),
      settings('5'),
      energy('-1723.200000000000', '101.000000000000'),
    );
    expect(record.outcome).toBe('cut off');
    expect(record.energyHartree).toBe(-1723.136178448301);
    expect(record.geometry?.positionsAngstrom[1]).toEqual([0, 0, 2.28]);
    expect(record.populations).toHaveLength(1);
    expect(record.failure).toMatchObject({ kind: 'killed', line: null });
  });

  it('gives the accepted geometry of a line search the energy printed before it', () => {
    const record = read(
      banner,
      optimisation,
      geometry('2.28000000', '102.5779012315'),
      settings('5'),
      energy('-1723.136178448301', '102.577901231500'),
      step(0, '-1723.13617845'),
      settings('5'),
      energy('-1723.200000000000', '101.000000000000'),
      populations('25.00', '3.90'),
      geometry('2.31000000', '101.0000000000'),
      settings('5'),
      '         Total DFT energy =  -1723.200000000000',
      step(1, '-1723.20000000'),
      '      Optimization converged',
      step(1, '-1723.20000000'),
      geometry('2.31000000', '101.0000000000'),
      taskEnd,
      end,
    );
    expect(record.energyHartree).toBe(-1723.2);
    expect(record.geometry?.positionsAngstrom[1]).toEqual([0, 0, 2.31]);
    expect(record.populations).toHaveLength(1);
    expect(record.optimisation).toMatchObject({ converged: true, steps: 2 });
    expect(record.optimisation?.history[1]).toMatchObject({
      largestGradientHartreePerBohr: 0.00534,
      rmsGradientHartreePerBohr: 0.00319,
    });
    expect(record.warnings).toEqual([]);
  });

  it('names an optimisation that ran out of steps', () => {
    const record = read(
      banner,
      optimisation,
      geometry('2.28000000', '102.5779012315'),
      settings('5'),
      energy('-1723.136178448301', '102.577901231500'),
      step(0, '-1723.13617845'),
      ' Failed to converge in maximum number of steps or available time',
      errorBox('driver: task_optimize failed'),
    );
    expect(record.failure?.kind).toBe('optimisation out of steps');
    expect(record.optimisation?.converged).toBe(false);
  });

  it('leaves out stars and keeps what is whole', () => {
    const stars = [...singlePoint];
    stars[3] = energy('********************', '102.577901231500');
    const record = read(...stars, '      <S2> =    ********* (Exact =     6.0000)', taskEnd, end);
    expect(record.energyHartree).toBeNull();
    expect(record.spin.s2).toBeNull();
    expect(record.charge).toBe(1);
  });

  it('counts no point charges among the atoms', () => {
    const charged = singlePoint[1]?.replace(
      '\n      Atomic Mass',
      '    3 bq                   0.8340     1.00000000     0.00000000     0.00000000\n\n      Atomic Mass',
    );
    const record = read(banner, charged ?? '', ...singlePoint.slice(2), taskEnd, end);
    expect(record.geometry?.elements).toEqual(['Fe', 'Cl']);
  });

  it('refuses a geometry with a row missing', () => {
    const damaged = singlePoint[1]?.replace(/ {4}1 fe1.*\n/, '');
    const record = read(banner, damaged ?? '', ...singlePoint.slice(2), taskEnd, end);
    expect(record.geometry).toBeNull();
    expect(record.warnings.map(({ code }) => code)).toContain('energy-without-geometry');
  });

  it('takes charge, shells and reference from the SCF module, and the highest occupied orbital of all', () => {
    const record = read(
      banner,
      geometry('2.28000000', '102.5779012315'),
      '                                 NWChem SCF Module',
      '  charge          =   1.00',
      '  open shells     =     4',
      '  wavefunction    = ROHF',
      '         Total SCF energy =  -1720.500000000000',
      '                       ROHF Final Molecular Orbital Analysis',
      ' Vector   19  Occ=2.000000D+00  E=-3.000000D-01',
      ' Vector   20  Occ=1.000000D+00  E=-5.000000D-01',
      ' Vector   21  Occ=0.000000D+00  E= 1.000000D-01',
      taskEnd,
      end,
    );
    expect(record).toMatchObject({ charge: 1, multiplicity: 5, energyHartree: -1720.5 });
    expect(record.method).toMatchObject({ functional: 'HF', reference: 'restricted open-shell' });
    expect(record.orbitals?.alpha.homoEv).toBeCloseTo(-0.3 * 27.211386, 5);
    expect(record.orbitals?.alpha.lumoEv).toBeCloseTo(0.1 * 27.211386, 5);
    expect(record.warnings.map(({ code }) => code)).toContain('not-dft');
  });

  it('repeats what the scheduler says of its end', () => {
    const text =
      'slurmstepd: error: *** JOB 71 ON n01 CANCELLED AT 2024-01-01T00:00:00 DUE TO TIME LIMIT ***';
    const record = read(...singlePoint, text);
    expect(record.outcome).toBe('cut off');
    expect(record.failure).toMatchObject({ kind: 'out of time', message: text });
  });

  it('does not take a run as finished because an earlier one in the same file was', () => {
    const record = read(
      ...singlePoint,
      taskEnd,
      end,
      banner,
      geometry('2.28000000', '102.5779012315'),
      settings('5'),
    );
    expect(record.outcome).toBe('cut off');
    expect(record.steps.map(({ outcome }) => outcome)).toEqual(['finished', 'cut off']);
    expect(record.energyHartree).toBe(-1723.136178448301);
    expect(record.warnings.map(({ code }) => code)).toContain('later-step-unfinished');
  });
});
