import type { Program } from '../../outputs/record';
import type { Cluster } from '../cluster';
import { schedulerHeader, submitFolder } from './scheduler-header';

/** Start commands where a profile names none. ORCA wants its full path for parallel runs. */
const startCommands: Record<Program, string> = {
  ORCA: '"$(command -v orca)" {deck} > {output}',
  Gaussian: 'g16 < {deck} > {output}',
  NWChem: 'mpirun -np {cores} nwchem {deck} > {output}',
  Psi4: 'psi4 -n {cores} -i {deck} -o {output}',
};

export interface JobScriptInput {
  cluster: Cluster;
  program: Program;
  jobKey: string;
  /** File names inside the job's folder. */
  deckFile: string;
  outputFile: string;
}

/**
 * bash script that runs one deck: directives, modules, scratch folder (removed at the end), the program,
 * hand-back. It always ends with the program's own exit code.
 */
export function jobScript({ cluster, program, jobKey, deckFile, outputFile }: JobScriptInput): string {
  const command = (cluster.commands[program] ?? startCommands[program])
    .replaceAll('{deck}', deckFile)
    .replaceAll('{output}', outputFile)
    .replaceAll('{cores}', String(cluster.cores));
  const lines = [
    '#!/bin/bash',
    ...schedulerHeader(cluster, jobKey),
    '',
    `cd "${submitFolder[cluster.scheduler]}" || exit 1`,
    ...cluster.modules.map((module) => `module load ${module}`),
    ...cluster.prologue,
    `scratch="${cluster.scratch}/${jobKey}.$$"`,
    'mkdir -p "$scratch" || exit 1',
    // An EXIT trap does not change the exit code.
    `trap 'rm -rf "$scratch"' EXIT`,
    ...(program === 'Gaussian' ? ['export GAUSS_SCRDIR="$scratch"'] : []),
    ...(program === 'Psi4' ? ['export PSI_SCRATCH="$scratch"'] : []),
    ...(program === 'NWChem' || program === 'Psi4' ? ['export OMP_NUM_THREADS=1'] : []),
    '',
    command,
    'status=$?',
    ...handBackLines(cluster, jobKey, outputFile),
    'exit "$status"',
  ];
  return `${lines.join('\n')}\n`;
}

function handBackLines(cluster: Cluster, jobKey: string, outputFile: string): string[] {
  if (!cluster.handBack) return [];
  const { url, tokenVariable } = cluster.handBack;
  return [
    '',
    '# Hand the output back. The token reaches curl through a pipe, so that no process list shows it.',
    `if [ -n "\${${tokenVariable}:-}" ]; then`,
    `  printf 'Authorization: Bearer %s\\n' "$${tokenVariable}" |`,
    '    curl --silent --show-error --fail --retry 5 --retry-delay 20 --retry-connrefused \\',
    "      --header @- --header 'Content-Type: text/plain' --request POST \\",
    `      --upload-file '${outputFile}' '${url.replaceAll('{jobKey}', jobKey)}' ||`,
    `    echo 'Hand-back failed; the output stays in this folder.' >&2`,
    'else',
    `  echo '${tokenVariable} is not set; the output stays in this folder.' >&2`,
    'fi',
    '',
  ];
}
