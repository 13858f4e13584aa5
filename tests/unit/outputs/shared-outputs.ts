import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';

/** Folders of outputs beside the repository; absent on most machines, and never copied from. */
export const outputsFolder = path.resolve(process.cwd(), '../shared/outputs');
export const demoFolder = path.resolve(process.cwd(), '../shared/demo');

export const hasOutputs = existsSync(path.join(outputsFolder, 'truth.json'));
export const hasDemo = existsSync(path.join(demoFolder, 'truth.json'));

/** What the text of one output states; see the README beside the table. Null where it states nothing. */
export interface Truth {
  file: string;
  program: string;
  version: string;
  terminated: 'normal' | 'error' | 'incomplete';
  charge: number | null;
  multiplicity: number | null;
  natoms: number | null;
  formula: string | null;
  method: string | null;
  basis: string | null;
  energy_hartree: number | null;
  scf_converged: boolean | null;
  opt_converged: boolean | null;
  opt_steps: number | null;
  s2: number | null;
  s2_ideal: number | null;
  mulliken_spin_first5: [string, number][] | null;
  mulliken_spin_sum: number | null;
  mulliken_charge_first5: [string, number][] | null;
  loewdin_spin_first5: [string, number][] | null;
  final_geometry_first3_angstrom: [string, number, number, number][] | null;
  n_frequencies: number | null;
  lowest_frequency_cm1: number | null;
  n_imaginary: number | null;
  zpe_hartree: number | null;
  gibbs_hartree: number | null;
  homo_ev_alpha: number | null;
  lumo_ev_alpha: number | null;
  wall_seconds: number | null;
  n_jobs: number | null;
  jobs: { energy_hartree: number | null; multiplicity?: number; s2?: number; natoms?: number }[] | null;
}

export function readTruth(): Truth[] {
  return hasOutputs
    ? (JSON.parse(readFileSync(path.join(outputsFolder, 'truth.json'), 'utf8')) as Truth[])
    : [];
}

export interface DemoTruth {
  file: string;
  charge: number;
  multiplicity: number;
  finished: boolean;
  optimisationConverged: boolean;
  lastEnergyHartree: number;
  s2: number | null;
  s2Ideal: number | null;
}

export function readDemoTruth(): DemoTruth[] {
  return hasDemo
    ? (JSON.parse(readFileSync(path.join(demoFolder, 'truth.json'), 'utf8')) as DemoTruth[])
    : [];
}
