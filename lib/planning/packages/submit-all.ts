import type { Cluster } from '../cluster';
import { submitCommand } from './scheduler-header';

/**
 * Script that submits every job of a package once: a folder with a file "submitted" is left alone, so the
 * script may be run again after an interruption. Exit 1 when a job could not be submitted.
 */
export function submitAllScript(scheduler: Cluster['scheduler'], folders: readonly string[]): string {
  return `${[
    '#!/bin/bash',
    '# Submits every job of this package that has not been submitted yet.',
    'cd "$(dirname "$0")" || exit 1',
    'failed=0',
    'jobs=(',
    ...folders.map((folder) => `  ${folder}`),
    ')',
    'for job in "${jobs[@]}"; do',
    '  if [ -e "$job/submitted" ]; then',
    '    echo "$job: submitted before"',
    `  elif (cd "$job" && ${submitCommand[scheduler]} > submitted.part && mv submitted.part submitted); then`,
    '    echo "$job: submitted"',
    '  else',
    '    echo "$job: not submitted" >&2',
    '    failed=1',
    '  fi',
    'done',
    'exit "$failed"',
  ].join('\n')}\n`;
}
