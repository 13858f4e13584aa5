import { randomBytes } from 'node:crypto';
import { chmod, mkdir, readdir, readFile, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { z } from 'zod';
import type { Structure } from '@/lib/chemistry/structure';
import { clusterSchema } from '@/lib/planning/cluster';
import { jobKey } from '@/lib/planning/job-key';
import { buildPackage } from '@/lib/planning/packages/build-package';
import { parseStartStructure } from '@/lib/planning/parse-start-structure';
import { planFileSchema, type PlanFile, type PlanStructure } from '@/lib/planning/plan-file';
import { planJobs } from '@/lib/planning/plan-jobs';
import { ok, type Result } from '@/lib/result';

const schema = JSON.stringify(z.toJSONSchema(planFileSchema, { io: 'input' }), null, 2);

export const usage = `Usage: npm run -s cli -- plan FILE.json --out DIR
Writes a folder per job (deck, start.xyz, job.sh), submit-all.sh, manifest.json and manifest.csv into DIR.
Structure files are looked up beside FILE.json. FILE.json follows this JSON schema:
${schema}`;

export async function run(args: string[]): Promise<number> {
  const outAt = args.indexOf('--out');
  const out = outAt === -1 ? undefined : args[outAt + 1];
  const files = args.filter((_, index) => outAt === -1 || (index !== outAt && index !== outAt + 1));
  const [file] = files;
  if (file === undefined || files.length !== 1 || out === undefined)
    return refuse('plan takes one FILE.json and --out DIR');

  const plan = await readPlan(file);
  if (!plan.ok) return refuse(plan.error);
  const structures = await readStructures(plan.value, path.dirname(file));
  if (!structures.ok) return refuse(structures.error);
  const read = structures.value;
  const planned = planJobs(
    plan.value,
    (entry) => read.get(entry) ?? { ok: false, error: 'no structure' },
    () => jobKey(randomBytes(7)),
  );
  if (!planned.ok) return refuse(planned.error);
  const built = buildPackage(planned.value.jobs, clusterSchema.parse(plan.value.cluster));
  if (!built.ok) {
    const job = built.error.jobIndex === null ? null : planned.value.jobs[built.error.jobIndex];
    return refuse(`${job ? `job "${job.label}": ` : ''}${built.error.message}`);
  }

  await mkdir(out, { recursive: true });
  if ((await readdir(out)).length > 0) return refuse(`${out} is not empty`);
  for (const item of built.value.files) {
    const target = path.join(out, item.path);
    await mkdir(path.dirname(target), { recursive: true });
    await writeFile(target, item.text);
    if (item.executable) await chmod(target, 0o755);
  }
  const { manifest } = built.value;
  process.stdout.write(`${JSON.stringify({ out, jobs: manifest, skipped: planned.value.skipped })}\n`);
  return 0;
}

function refuse(message: string): number {
  process.stderr.write(`spinstead plan: ${message.replace(/\s+/g, ' ')}\n`);
  return 1;
}

async function readPlan(file: string): Promise<Result<PlanFile, string>> {
  let text: string;
  try {
    text = await readFile(file, 'utf8');
  } catch (error) {
    return { ok: false, error: `${file}: ${error instanceof Error ? error.message : String(error)}` };
  }
  let json: unknown;
  try {
    json = JSON.parse(text);
  } catch (error) {
    return {
      ok: false,
      error: `${file} is no JSON: ${error instanceof Error ? error.message : String(error)}`,
    };
  }
  const parsed = planFileSchema.safeParse(json);
  if (parsed.success) return ok(parsed.data);
  const issue = parsed.error.issues[0];
  return {
    ok: false,
    error: `${file}: ${issue?.path.join('.') || 'top level'}: ${issue?.message ?? 'not a plan'}`,
  };
}

/** All structures of a plan, by their entry. A structure that cannot be read stays an error until it is needed. */
async function readStructures(
  plan: PlanFile,
  folder: string,
): Promise<Result<Map<PlanStructure, Result<Structure, string>>, string>> {
  const entries = [
    ...plan.jobs.map((job) => job.structure),
    ...plan.complexes.flatMap((complex) => Object.values(complex.structures)),
  ];
  const structures = new Map<PlanStructure, Result<Structure, string>>();
  for (const entry of entries) {
    if ('elements' in entry) {
      structures.set(entry, ok(entry));
    } else if ('xyz' in entry) {
      structures.set(entry, parseStartStructure(entry.xyz));
    } else {
      try {
        structures.set(entry, parseStartStructure(await readFile(path.resolve(folder, entry.file), 'utf8')));
      } catch (error) {
        return {
          ok: false,
          error: `${entry.file}: ${error instanceof Error ? error.message : String(error)}`,
        };
      }
    }
  }
  return ok(structures);
}
