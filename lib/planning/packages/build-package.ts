import { hillFormula } from '../../chemistry/formula';
import { err, ok, type Result } from '../../result';
import type { Cluster } from '../cluster';
import type { DeckRefusal, DeckRequest } from '../decks/deck-request';
import { writeDeck } from '../decks/write-deck';
import { jobFolderName } from './file-name';
import { jobScript } from './job-script';
import { manifestCsv, manifestJson, type ManifestJob } from './manifest';
import { startXyz } from './start-xyz';
import { submitAllScript } from './submit-all';

/** A job of a package: the deck without what the cluster decides, and where its structure is from. */
export type PackageJob = Omit<DeckRequest, 'cores' | 'memoryMb'> & { origin: string };

export interface PackageFile {
  /** Relative, "/" between folder and file. */
  path: string;
  text: string;
  executable: boolean;
}

export interface PackageRefusal {
  code: 'no jobs' | 'key used twice' | 'above cluster limit' | DeckRefusal['code'];
  message: string;
  /** Position of the job in the list; null when the whole package is meant. */
  jobIndex: number | null;
}

/**
 * Files of a package: one folder per job (deck, start.xyz, job.sh), submit-all.sh, manifest.json and
 * manifest.csv. All or nothing: the first job that cannot be written is the answer.
 */
export function buildPackage(
  jobs: readonly PackageJob[],
  cluster: Cluster,
): Result<{ files: PackageFile[]; manifest: ManifestJob[] }, PackageRefusal> {
  if (jobs.length === 0) return err({ code: 'no jobs', message: 'the package has no jobs', jobIndex: null });
  const limit = aboveLimit(cluster);
  if (limit !== null) return err({ code: 'above cluster limit', message: limit, jobIndex: null });
  const files: PackageFile[] = [];
  const manifest: ManifestJob[] = [];
  const keys = new Set<string>();
  for (const [jobIndex, job] of jobs.entries()) {
    if (keys.has(job.jobKey))
      return err({ code: 'key used twice', message: `job key ${job.jobKey} is used twice`, jobIndex });
    keys.add(job.jobKey);
    const deck = writeDeck({ ...job, cores: cluster.cores, memoryMb: cluster.memoryMb });
    if (!deck.ok) return err({ ...deck.error, jobIndex });
    const folder = jobFolderName(job.jobKey, `${job.label} m${job.multiplicity} ${job.task}`);
    const deckFile = `${job.jobKey}.${deck.value.extension}`;
    const outputFile = `${job.jobKey}.out`;
    const add = (name: string, text: string, executable = false) =>
      files.push({ path: `${folder}/${name}`, text, executable });
    add(deckFile, deck.value.text);
    add('start.xyz', startXyz(job.structure, job.jobKey, job.origin));
    add(
      'job.sh',
      jobScript({ cluster, program: job.method.program, jobKey: job.jobKey, deckFile, outputFile }),
      true,
    );
    manifest.push({
      jobKey: job.jobKey,
      folder,
      deck: deckFile,
      output: outputFile,
      label: job.label,
      program: job.method.program,
      method: job.method.name,
      methodVersion: job.method.version,
      cluster: cluster.name,
      clusterVersion: cluster.version,
      task: job.task,
      formula: hillFormula(job.structure.elements),
      charge: job.charge,
      multiplicity: job.multiplicity,
      notes: deck.value.notes,
    });
  }
  const folders = manifest.map((job) => job.folder);
  files.push(
    { path: 'submit-all.sh', text: submitAllScript(cluster.scheduler, folders), executable: true },
    { path: 'manifest.json', text: manifestJson(manifest), executable: false },
    { path: 'manifest.csv', text: manifestCsv(manifest), executable: false },
  );
  return ok({ files, manifest });
}

function aboveLimit({ cores, memoryMb, wallMinutes, limits }: Cluster): string | null {
  if (limits.cores !== null && cores > limits.cores)
    return `${cores} cores, the cluster allows ${limits.cores}`;
  if (limits.memoryMb !== null && memoryMb > limits.memoryMb)
    return `${memoryMb} MB, the cluster allows ${limits.memoryMb} MB`;
  if (limits.wallMinutes !== null && wallMinutes > limits.wallMinutes)
    return `${wallMinutes} minutes, the cluster allows ${limits.wallMinutes}`;
  return null;
}
