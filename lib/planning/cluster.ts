import { z } from 'zod';
import { programSchema } from '../outputs/record';

// A word that goes into a scheduler line or a shell word: no blank, quote or expansion can hide in it.
const plainWord = z.string().regex(/^[A-Za-z0-9_.:@/+=-]{1,80}$/, 'letters, digits and _ . : @ / + = - only');
/** One shell line of the group's own; it runs under the member's account on their own cluster. */
const shellLine = z
  .string()
  .max(500)
  .regex(/^[\x20-\x7e]*$/, 'one line of printable ASCII');

export const schedulerSchema = z.enum(['Slurm', 'PBS', 'Torque', 'Grid Engine', 'shell']);
export type Scheduler = z.infer<typeof schedulerSchema>;

/** A scheduler profile: how jobs are started on one cluster, and its limits. */
export const clusterSchema = z.object({
  name: z.string().min(1).max(120),
  version: z.number().int().min(1).default(1),
  scheduler: schedulerSchema,
  /** Partition (Slurm) or queue. */
  queue: plainWord.nullable().default(null),
  account: plainWord.nullable().default(null),
  /** Grid Engine's parallel environment. */
  parallelEnvironment: plainWord.default('smp'),
  cores: z.number().int().min(1).max(1024).default(8),
  memoryMb: z.number().int().min(200).max(4_000_000).default(16_000),
  wallMinutes: z.number().int().min(1).max(60_000).default(1440),
  modules: z.array(plainWord).max(20).default([]),
  /** Lines before the program starts: environment, licences. */
  prologue: z.array(shellLine).max(50).default([]),
  /** Start commands; {deck}, {output} and {cores} are filled in. */
  commands: z.partialRecord(programSchema, shellLine).default({}),
  scratch: shellLine.default('${TMPDIR:-/tmp}'),
  limits: z
    .object({
      cores: z.number().int().min(1).nullable().default(null),
      memoryMb: z.number().int().min(1).nullable().default(null),
      wallMinutes: z.number().int().min(1).nullable().default(null),
    })
    .default({ cores: null, memoryMb: null, wallMinutes: null }),
  /** Where a finished output is sent; {jobKey} is filled in. The token is read from the environment. */
  handBack: z
    .object({
      url: z.string().regex(/^https?:\/\/[A-Za-z0-9.:_/~?=&%{}[\]-]{1,300}$/, 'an http or https address'),
      tokenVariable: z.string().regex(/^[A-Z_][A-Z0-9_]{0,60}$/, 'an environment variable name'),
    })
    .nullable()
    .default(null),
});
export type ClusterInput = z.input<typeof clusterSchema>;
export type Cluster = z.infer<typeof clusterSchema>;

/** Profiles to start from, one per scheduler. */
export const startingClusters: readonly ClusterInput[] = [
  { name: 'Slurm cluster', scheduler: 'Slurm' },
  { name: 'PBS cluster', scheduler: 'PBS' },
  { name: 'Torque cluster', scheduler: 'Torque' },
  { name: 'Grid Engine cluster', scheduler: 'Grid Engine' },
  { name: 'This workstation', scheduler: 'shell', cores: 2, memoryMb: 4000 },
];
