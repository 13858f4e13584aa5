import type { Landmark, Line } from './landmark';
import type { Failure, FailureKind } from './record';

/**
 * What schedulers, the system and message passing write into an output when they end a run. The texts are
 * those of Slurm, PBS/Torque, the Linux kernel, Open MPI and the C library; common practice.
 */
const texts: [string, FailureKind | null][] = [
  // slurmstepd: error: *** JOB 71 ON n01 CANCELLED AT 2024-01-01T00:00:00 DUE TO TIME LIMIT ***
  ['slurmstepd: error:', null],
  ['slurmd[', null],
  ['srun: error:', null],
  ['srun: Job step aborted', 'killed'],
  // =>> PBS: job killed: walltime 3605 exceeded limit 3600
  ['=>> PBS: job killed:', null],
  ['mpirun noticed that process rank', 'killed'],
  ['forrtl: error (78)', 'killed'],
  ['oom-kill', 'out of memory'],
  ['Out of memory: Kill', 'out of memory'],
  ["terminate called after throwing an instance of 'std::bad_alloc'", 'out of memory'],
  ['Killed', 'killed'],
  ['No space left on device', 'out of disk'],
];

function kindOf(text: string): FailureKind {
  if (/time ?limit|walltime/i.test(text)) return 'out of time';
  if (/memory|oom/i.test(text)) return 'out of memory';
  if (/no space|disk quota/i.test(text)) return 'out of disk';
  return 'killed';
}

/** Landmarks that say from outside the program why it ended; the last one seen is `failure()`. */
export function watchInterruptions(): { landmarks: Landmark[]; failure: () => Failure | null } {
  let last: Failure | null = null;
  const note = (kind: FailureKind | null) => (line: Line) => {
    const text = line.text.trim();
    const named = kind ?? kindOf(text);
    // A general "killed" after a reason adds nothing.
    if (last && named === 'killed') return;
    last = { kind: named, message: text.slice(0, 200), line: line.number };
  };
  return {
    landmarks: texts.map(([text, kind]) => ({
      text,
      read: note(kind),
      onlyOutside: true,
      evenUnended: true,
    })),
    failure: () => last,
  };
}

/** The failure of a run that just stops: nothing is printed, so there is no line. */
export const stoppedWithoutWord: Failure = {
  kind: 'killed',
  message: 'The output stops without a closing line and without a reason.',
  line: null,
};
