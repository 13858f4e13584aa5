import { hillFormula } from '../chemistry/formula';
import type { Structure } from '../chemistry/structure';
import { err, ok, type Result } from '../result';
import type { Candidate } from './candidate';
import type { MagneticSite } from './decks/deck-request';
import type { PackageJob } from './packages/build-package';
import type { PlanFile, PlanStructure } from './plan-file';
import { proposeCandidates } from './propose-candidates';

export interface PlannedJobs {
  jobs: PackageJob[];
  /** Candidates that got no job, with the reason. */
  skipped: { label: string; candidate: string; reason: string }[];
}

/**
 * Jobs of a plan file: those spelled out, then one for each candidate of each complex.
 * @param readStructure - turns a structure entry into atoms; the caller reads files
 * @param nextKey - gives a fresh job key
 * Errors: one sentence that names the job or complex.
 */
export function planJobs(
  plan: PlanFile,
  readStructure: (entry: PlanStructure) => Result<Structure, string>,
  nextKey: () => string,
): Result<PlannedJobs, string> {
  const methods = new Map(plan.methods.map((method) => [method.name, method]));
  const jobs: PackageJob[] = [];
  const skipped: PlannedJobs['skipped'] = [];
  for (const entry of plan.jobs) {
    const method = methods.get(entry.method);
    if (!method) return err(`job "${entry.label}": no method "${entry.method}"`);
    const structure = readStructure(entry.structure);
    if (!structure.ok) return err(`job "${entry.label}": ${structure.error}`);
    const { label, charge, multiplicity, task, sites } = entry;
    const jobKey = entry.jobKey ?? nextKey();
    jobs.push({
      ...{ method, task, structure: structure.value, charge, multiplicity, jobKey, label, origin: label },
      ...(sites ? { sites } : {}),
    });
  }
  for (const entry of plan.complexes) {
    const method = methods.get(entry.method);
    if (!method) return err(`complex "${entry.label}": no method "${entry.method}"`);
    const list = proposeCandidates(entry.complex);
    if (!list.ok) return err(`complex "${entry.label}": ${list.error.message}`);
    for (const candidate of list.value.candidates) {
      const skip = (reason: string) => skipped.push({ label: entry.label, candidate: candidate.key, reason });
      const start = entry.structures[candidate.geometries.join('+')];
      if (!start) {
        skip('no starting structure for this geometry');
        continue;
      }
      const structure = readStructure(start);
      if (!structure.ok) return err(`complex "${entry.label}": ${structure.error}`);
      const formula = hillFormula(structure.value.elements);
      if (formula !== list.value.formula)
        return err(
          `complex "${entry.label}": the structure is ${formula}, the complex ${list.value.formula}`,
        );
      const sites = candidate.brokenSymmetry
        ? sitesOf(candidate, entry.complex.metals, structure.value)
        : null;
      if (candidate.brokenSymmetry && !sites) {
        skip('a radical ligand is no single atom: plan this broken-symmetry determinant by hand');
        continue;
      }
      jobs.push({
        method,
        task: sites ? 'broken symmetry' : entry.task,
        structure: structure.value,
        charge: entry.complex.charge,
        multiplicity: candidate.multiplicity,
        jobKey: nextKey(),
        label: `${entry.label} ${candidate.geometries.join(' ')}`,
        origin: `${entry.label} ${candidate.key}`,
        ...(sites ? { sites } : {}),
      });
    }
  }
  return jobs.length === 0 ? err('the plan has no jobs') : ok({ jobs, skipped });
}

/** Metals of the complex, in order, onto the atoms of that element, in order. */
function sitesOf(
  candidate: Candidate,
  metals: PlanFile['complexes'][number]['complex']['metals'],
  structure: Structure,
): MagneticSite[] | null {
  const taken = new Set<number>();
  const sites: MagneticSite[] = [];
  for (const [index, site] of candidate.sites.entries()) {
    if (site.kind === 'ligand') return null;
    const atomIndex = structure.elements.findIndex(
      (element, atom) => element === site.name && !taken.has(atom),
    );
    taken.add(atomIndex);
    if (site.unpaired > 0)
      sites.push({
        atomIndex,
        oxidationState: metals[index]?.oxidationState ?? 0,
        unpaired: site.unpaired,
        spinUp: site.spinUp,
      });
  }
  return sites;
}
