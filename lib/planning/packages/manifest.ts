import type { Program } from '../../outputs/record';
import type { DeckTask } from '../method';

/** One row of a package's manifest. */
export interface ManifestJob {
  jobKey: string;
  folder: string;
  deck: string;
  output: string;
  label: string;
  program: Program;
  method: string;
  methodVersion: number;
  cluster: string;
  clusterVersion: number;
  task: DeckTask;
  formula: string;
  charge: number;
  multiplicity: number;
  notes: readonly string[];
}

const columns = [
  'jobKey',
  'folder',
  'deck',
  'output',
  'label',
  'program',
  'method',
  'methodVersion',
  'cluster',
  'clusterVersion',
  'task',
  'formula',
  'charge',
  'multiplicity',
] as const;

export const manifestJson = (jobs: readonly ManifestJob[]): string =>
  `${JSON.stringify({ manifestVersion: 1, jobs }, null, 2)}\n`;

/** CSV after RFC 4180 (CRLF, quotes doubled). Text that a spreadsheet would take for a formula gets a blank in front. */
export function manifestCsv(jobs: readonly ManifestJob[]): string {
  const cell = (value: string | number) => {
    const text = typeof value === 'string' && /^[=+\-@\t]/.test(value) ? ` ${value}` : String(value);
    return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
  };
  return [columns.join(','), ...jobs.map((job) => columns.map((column) => cell(job[column])).join(','))]
    .map((line) => `${line}\r\n`)
    .join('');
}
