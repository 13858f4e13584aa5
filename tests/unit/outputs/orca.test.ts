import { describe, expect, it } from 'vitest';
import { readOutput } from '@/lib/outputs/reader';

// Small outputs written for these tests after the layout that the program prints.
const read = (...parts: string[]) => readOutput(new TextEncoder().encode(parts.join('\n') + '\n'));

const banner = `
                                 *****************
                                 * O   R   C   A *
                                 *****************
                         Program Version 5.0.3-f.1 -  RELEASE  -
`;

const deck = (...lines: string[]) =>
  [
    '                                       INPUT FILE',
    ...lines.map((line, i) => `|${String(i + 1).padStart(3)}> ${line}`),
    '                          ****END OF INPUT****',
  ].join('\n');

const basis = 'Your calculation utilizes the basis: def2-SVP';
const input = deck('# damp salt SP4F7KQ2MX', '! UKS B3LYP D3BJ def2-SVP CPCM(water) # not PBE0', '* xyz 1 2');

const geometry = (x: string) => `
---------------------------------
CARTESIAN COORDINATES (ANGSTROEM)
---------------------------------
  Cu     0.000000    0.000000    0.000000
  F      ${x}    0.000000    0.000000

----------------------------
CARTESIAN COORDINATES (A.U.)
----------------------------
  NO LB      ZA    FRAG     MASS         X           Y           Z
   0 Cu   29.0000    0    63.546    0.000000    0.000000    0.000000
`;

const settings = (hf = 'UHF', multiplicity = 2) => `
 Density Functional     Method          .... DFT(GTOs)
 Exchange Functional    Exchange        .... B88
 Correlation Functional Correlation     .... LYP
 Hartree-Fock type      HFTyp           .... ${hf}
 Total Charge           Charge          ....    1
 Multiplicity           Mult            ....    ${multiplicity}
 Number of Electrons    NEL             ....   37
`;

const scf = (total: string, s2 = '0.752100') => `
               *           SCF CONVERGED AFTER  11 CYCLES          *
----------------
TOTAL SCF ENERGY
----------------

Total Energy       :        ${total} Eh          -45000.00000 eV
Expectation value of <S**2>     :     ${s2}
Ideal value S*(S+1) for S=0.5   :     0.750000
`;

const populations = (charge = '0.700000', spin = '0.800000') => `
--------------------------------------------
MULLIKEN ATOMIC CHARGES AND SPIN POPULATIONS
--------------------------------------------
   0 Cu:    ${charge}    ${spin}
   1 F :    0.300000    0.200000
Sum of atomic charges         :    1.0000000
Sum of atomic spin populations:    1.0000000
`;

const orbitals = `
----------------
ORBITAL ENERGIES
----------------
                 SPIN UP ORBITALS
  NO   OCC          E(Eh)            E(eV)
   0   1.0000      -0.500000       -13.6057
   1   0.0000       0.100000         2.7211

                 SPIN DOWN ORBITALS
  NO   OCC          E(Eh)            E(eV)
   0   1.0000      -0.400000       -10.8846
   1   0.0000       0.200000         5.4423
*Only the first 10 virtual orbitals were printed.

                      0         1
                  -0.50000   0.10000
`;

const final = (energy: string) => `
-------------------------   --------------------
FINAL SINGLE POINT ENERGY     ${energy}
-------------------------   --------------------
`;

const end = `
                             ****ORCA TERMINATED NORMALLY****
TOTAL RUN TIME: 0 days 1 hours 2 minutes 3 seconds 45 msec`;

const start = [banner, basis, input, geometry('1.900000'), settings()];
const cycle = (n: number) => `         *                GEOMETRY OPTIMIZATION CYCLE   ${n}            *`;
const codes = (record: ReturnType<typeof read>) => record.warnings.map(({ code }) => code);

describe('ORCA', () => {
  it('reads a single point whole', () => {
    const record = read(
      ...start,
      scf('-1715.10000000'),
      orbitals,
      populations(),
      final('-1715.123456789012'),
      end,
    );
    expect(record).toMatchObject({
      program: 'ORCA',
      version: '5.0.3-f.1',
      outcome: 'finished',
      failure: null,
      title: 'damp salt SP4F7KQ2MX',
      jobKey: 'SP4F7KQ2MX',
      formula: 'CuF',
      charge: 1,
      multiplicity: 2,
      electronCount: 37,
      energyHartree: -1715.123456789012,
      scf: { converged: true, iterations: 11 },
      spin: { s2: 0.7521, s2Ideal: 0.75 },
      resources: { wallSeconds: 3723.045 },
      orbitals: { alpha: { homoEv: -13.6057, lumoEv: 2.7211 }, beta: { homoEv: -10.8846, lumoEv: 5.4423 } },
      warnings: [],
    });
    expect(record.method).toEqual({
      functional: 'B3LYP',
      basis: 'def2-SVP',
      reference: 'unrestricted',
      dispersion: 'D3BJ',
      solvation: 'CPCM(water)',
      relativity: null,
    });
    expect(record.populations[0]?.atoms[0]).toEqual({ element: 'Cu', charge: 0.7, spin: 0.8 });
  });

  it('takes charge and multiplicity from the echoed input where the settings are not printed', () => {
    const record = read(banner, input, geometry('1.900000'), scf('-1715.1'), final('-1715.123'), end);
    expect(record).toMatchObject({ charge: 1, multiplicity: 2 });
    expect(record.method).toMatchObject({ functional: 'B3LYP', basis: 'def2-SVP' });
  });

  it('leaves out a table of populations that does not add up to its own sum', () => {
    const record = read(...start, scf('-1715.1'), populations('0.900000'), final('-1715.123'), end);
    expect(record.populations).toEqual([]);
    expect(codes(record)).toEqual(['table-damaged']);
  });

  it('does not set the populations of the first geometry beside the energy of the last', () => {
    const record = read(
      banner,
      basis,
      input,
      cycle(1),
      geometry('1.900000'),
      settings(),
      scf('-1715.1'),
      orbitals,
      populations(),
      final('-1715.100'),
      'MAX gradient                       ...    0.0012287748',
      cycle(2),
      geometry('1.950000'),
      scf('-1715.2'),
      final('-1715.200'),
      'The optimization did not converge but reached the maximum number of optimization cycles.',
      end,
    );
    expect(record.outcome).toBe('finished');
    expect(record.energyHartree).toBe(-1715.2);
    expect(record.geometry?.positionsAngstrom[1]).toEqual([1.95, 0, 0]);
    expect(record.populations).toEqual([]);
    expect(record.orbitals).toBeNull();
    expect(record.optimisation).toMatchObject({
      converged: false,
      steps: 2,
      energiesHartree: [-1715.1, -1715.2],
    });
    expect(record.optimisation?.history[0]?.largestGradientHartreePerBohr).toBe(0.0012287748);
    expect(codes(record)).toEqual(['optimisation-not-converged']);
  });

  it('goes back to the last geometry that has an energy', () => {
    const record = read(
      ...start,
      scf('-1715.1'),
      final('-1715.100'),
      cycle(2),
      geometry('1.950000'),
      'SCF ITERATIONS',
    );
    expect(record.outcome).toBe('cut off');
    expect(record.energyHartree).toBe(-1715.1);
    expect(record.geometry?.positionsAngstrom[1]).toEqual([1.9, 0, 0]);
    expect(codes(record)).toContain('geometry-without-energy');
  });

  it('holds the broken-symmetry state apart from the high-spin one', () => {
    const record = read(
      banner,
      basis,
      input,
      geometry('1.900000'),
      settings('UHF', 3),
      scf('-1715.1', '2.003000'),
      populations(),
      '                          FLIP-SPIN BROKEN SYMMETRY',
      'Old multiplicity                           ...   3',
      'New multiplicity                           ...   1',
      scf('-1715.2', '1.002000'),
      'BROKEN SYMMETRY MAGNETIC COUPLING ANALYSIS',
      'S(High-Spin)      =   1.0',
      '<S**2>(High-Spin) =   2.0030',
      '<S**2>(BrokenSym) =   1.0020',
      'E(High-Spin)      = -1715.100000 Eh',
      'E(BrokenSym)      = -1715.200000 Eh',
      'E(High-Spin)-E(BrokenSym)=   2.7211 eV  21947.463 cm**-1 (ANTIFERROMAGNETIC coupling)',
      final('-1715.200'),
      end,
    );
    expect(record.multiplicity).toBe(1);
    expect(record.spin.s2).toBe(1.002);
    expect(record.populations).toEqual([]);
    expect(record.brokenSymmetry).toEqual({
      highSpinEnergyHartree: -1715.1,
      brokenSymmetryEnergyHartree: -1715.2,
      highSpinS2: 2.003,
      brokenSymmetryS2: 1.002,
    });
    expect(record.tasks).toContain('broken symmetry');
  });

  it('keeps the ground state when the final energy is that of an excited one', () => {
    const record = read(
      ...start,
      scf('-1715.10000000'),
      'E(SCF)  =  -1715.100000000 Eh',
      'DE(CIS) =      0.100000000 Eh (Root  1)',
      final('-1715.000000000000'),
      end,
    );
    expect(record.energyHartree).toBe(-1715.1);
    expect(codes(record)).toEqual(['energy-is-reference']);
  });

  it('drops translations and rotations and marks imaginary modes', () => {
    const modes = ['0.00', '0.00', '0.00', '0.00', '0.00', '-123.45'].map(
      (value, i) =>
        `${String(i).padStart(6)}:    ${value} cm**-1${value.startsWith('-') ? ' ***imaginary mode***' : ''}`,
    );
    const frequencies = ['-----------------------', 'VIBRATIONAL FREQUENCIES', '-----------------------', ''];
    const record = read(...start, scf('-1715.1'), final('-1715.1'), ...frequencies, ...modes, '', end);
    expect(record.frequencies).toEqual({
      count: 1,
      lowestCm1: -123.45,
      imaginaryCount: 1,
      valuesCm1: [-123.45],
    });
    expect(codes(record)).toEqual(['imaginary-modes']);
    const short = read(
      ...start,
      scf('-1715.1'),
      final('-1715.1'),
      ...frequencies,
      ...modes.slice(0, 5),
      '',
      end,
    );
    expect(short.frequencies).toBeNull();
  });

  it('counts neither embedding charges nor ghost atoms among the atoms', () => {
    const embedded = geometry('1.900000').replace(
      '\n\n---',
      '\n  Ca>    5.000000    0.000000    0.000000\n\n---',
    );
    expect(read(banner, input, embedded, settings(), scf('-1.5'), final('-1.5'), end).formula).toBe('CuF');
  });

  it('says of an unconverged SCF that its energy is no result', () => {
    const record = read(
      ...start,
      '               *     SCF NOT CONVERGED AFTER 125 CYCLES    *',
      'FINAL SINGLE POINT ENERGY     -1715.903615435997   (SCF not fully converged!)',
      '                                      ERROR',
      '     This SCF-wavefunction IS NOT FULLY CONVERGED!',
      '     Aborting the run ...',
    );
    expect(record.outcome).toBe('failed');
    expect(record.scf).toEqual({ converged: false, iterations: 125 });
    expect(record.failure?.kind).toBe('scf not converged');
    expect(codes(record)).toEqual(['scf-not-converged', 'failed']);
  });

  it.each([
    ['ERROR : multiplicity (2) is even and number of electrons (36) is even -> impossible', 'input error'],
    ['UNRECOGNIZED OR DUPLICATED KEYWORD(S) IN SIMPLE INPUT LINE', 'input error'],
    ['Error (ORCA_SCF): Not enough memory to run the job', 'out of memory'],
    ['ORCA finished by error termination in SCF gradient', 'other'],
  ])('names the failure of "%s"', (text, kind) => {
    const record = read(banner, input, text);
    expect(record.outcome).toBe('failed');
    expect(record.failure).toMatchObject({ kind, message: text });
  });

  it('keeps jobs of one input apart and lends an optimisation to the frequencies after it', () => {
    const job = (n: number) => `                 $$$$$$$$$$$$$$$$  JOB NUMBER  ${n} $$$$$$$$$$$$$$`;
    const record = read(
      banner,
      basis,
      deck('! UKS B3LYP def2-SVP Opt', '* xyz 1 2', '*', '$new_job', '! UKS B3LYP def2-SVP Freq'),
      job(1),
      cycle(1),
      geometry('1.900000'),
      settings(),
      scf('-1715.1'),
      final('-1715.100000'),
      '                    ***        THE OPTIMIZATION HAS CONVERGED     ***',
      geometry('1.910000'),
      scf('-1715.1'),
      populations(),
      final('-1715.100100'),
      job(2),
      geometry('1.910000'),
      settings(),
      scf('-1715.1'),
      final('-1715.100101'),
      end,
    );
    expect(record.steps.map(({ outcome }) => outcome)).toEqual(['finished', 'finished']);
    expect(record.energyHartree).toBe(-1715.100101);
    expect(record.optimisation).toMatchObject({ converged: true, steps: 2 });
    expect(record.populations).toHaveLength(1);
    expect(record.tasks).toEqual(['optimisation', 'single point']);
  });
});
