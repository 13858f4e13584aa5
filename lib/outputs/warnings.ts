import type { Warning, WarningCode } from './record';

/** The table of codes: what each warning says when the reader has nothing more precise to say. */
export const warningMessages: Record<WarningCode, string> = {
  'cut-off':
    'The file ends without the closing line of the program: the run was killed or the file is incomplete.',
  failed: 'The program ended with an error.',
  'later-step-unfinished':
    'A later step of this file did not finish; the values are of the last one that did.',
  'scf-not-converged': 'The SCF did not converge: the energy and all that follows from it are no results.',
  'scf-skipped': 'The energy is that of an initial guess; no SCF was done.',
  'optimisation-not-converged': 'The optimisation did not converge: the geometry is no stationary point.',
  'geometry-without-energy':
    'A later geometry is printed without an energy; the values are of the last geometry that has one.',
  'energy-without-geometry': 'The geometry that the energy belongs to is not printed.',
  'spin-multiplicity-parity': 'The number of electrons and the multiplicity do not go together.',
  'electron-count': 'The number of electrons printed differs from the one counted from atoms and charge.',
  'spin-sum': 'The spin populations do not add up to the number of unpaired electrons.',
  'atom-count': 'The number of atoms printed differs from the number in the geometry.',
  'imaginary-modes': 'The geometry has imaginary modes: it is no minimum.',
  'table-damaged': 'A table is damaged and was left out.',
  'not-dft': 'The wavefunction is Hartree–Fock, not DFT.',
  'energy-is-reference':
    'A correlated or excited-state energy is printed too; the energy is that of the SCF.',
  'beta-excess': 'The multiplicity is printed negative: beta electrons are in excess.',
  'unknown-program': 'No output of ORCA, Gaussian, NWChem or Psi4 was recognised.',
  'steps-abridged': 'The file has very many steps; tables of the earlier ones were left out.',
};

/** Adds a warning once per code; `message` replaces the table's text. */
export function warn(
  holder: { warnings: Warning[] },
  code: WarningCode,
  line: number | null = null,
  message: string = warningMessages[code],
): void {
  if (holder.warnings.some((warning) => warning.code === code)) return;
  holder.warnings.push({ code, message, line });
}
