import { HARTREE_KJ_PER_MOL } from '../chemistry/constants';
import { dElectronCount } from '../chemistry/electron-configuration';
import { expectedMoments, type ExpectedMoments } from '../magnetism/expected-moments';
import { levelKey, type LevelOfTheory } from './level-of-theory';
import { COVERAGE_FACTOR, type MeasuredMoment } from './measured-moment';
import { momentVerdict, type Verdict } from './verdict';

/** ⟨S²⟩ more than a tenth above S(S + 1) (at least 0.1 for singlets) is called contaminated. Common practice. */
const CONTAMINATION_SHARE = 0.1;

/** A candidate this far above the ground state is no rival: several times the usual error of a functional. Common practice. */
const RIVAL_KJ_PER_MOL = 50;

export interface ComparedRun extends LevelOfTheory {
  id: string;
  candidateId: string | null;
  formula: string | null;
  charge: number | null;
  outcome: 'finished' | 'failed' | 'cut off';
  energyHartree: number | null;
  s2: number | null;
  s2Ideal: number | null;
  scfConverged: boolean | null;
  optimisationConverged: boolean | null;
}

export interface ComparedCandidate {
  id: string;
  geometry: string;
  multiplicity: number;
}

/** One candidate beside the measurement. `run` is the lowest usable one at the compared level of theory. */
export interface CandidateComparison<R extends ComparedRun> {
  candidate: ComparedCandidate;
  run: R | null;
  /** Above the favoured candidate, kJ mol⁻¹. */
  gapKJPerMol: number | null;
  contaminated: boolean;
  band: ExpectedMoments | null;
  verdict: Verdict | null;
}

export type Agreement =
  | 'joined'
  | 'broken'
  | 'dotted'
  | 'one-ended calculated'
  | 'one-ended measured'
  | 'nothing';

export interface ComplexComparison<R extends ComparedRun> {
  dCount: number | null;
  level: LevelOfTheory | null;
  /** By energy, candidates without a usable run last. */
  candidates: CandidateComparison<R>[];
  favoured: CandidateComparison<R> | null;
  agreement: Agreement;
  sentence: string;
}

/** Whether a run's energy may stand in a ladder: it ended well, its SCF and its optimisation converged. */
export function isUsable(run: ComparedRun): boolean {
  return (
    run.outcome === 'finished' &&
    run.energyHartree !== null &&
    run.scfConverged !== false &&
    run.optimisationConverged !== false
  );
}

/**
 * Sets a complex's candidates beside its measurement. Energies are compared at one level of theory only: the one
 * that covers most candidates (then most runs, then by name); runs of another composition or charge are left out.
 */
export function compareComplex<R extends ComparedRun>(
  complex: { metal: string; oxidationState: number; composition: string; charge: number },
  candidates: readonly ComparedCandidate[],
  runs: readonly R[],
  measured: MeasuredMoment | null,
): ComplexComparison<R> {
  const dCount = dElectronCount(complex.metal, complex.oxidationState);
  const comparable = runs.filter(
    (run) => isUsable(run) && run.formula === complex.composition && run.charge === complex.charge,
  );
  const levelRuns = bestCoveredLevel(comparable);
  const rows = candidates.map((candidate): CandidateComparison<R> => {
    const run = lowest(levelRuns.filter(({ candidateId }) => candidateId === candidate.id));
    const ion = { element: complex.metal, oxidationState: complex.oxidationState, dCount: dCount ?? -1 };
    const band = dCount === null ? null : expectedMoments(ion, candidate.multiplicity, candidate.geometry);
    return {
      candidate,
      run,
      gapKJPerMol: null,
      contaminated: run !== null && isContaminated(run),
      band,
      verdict:
        measured && band ? momentVerdict(measured.muBohr, COVERAGE_FACTOR * measured.uMuBohr, band) : null,
    };
  });
  rows.sort((a, b) => (a.run?.energyHartree ?? Infinity) - (b.run?.energyHartree ?? Infinity) || 0);
  const favoured = rows[0]?.run ? rows[0] : null;
  const ground = favoured?.run?.energyHartree ?? null;
  for (const row of rows) {
    const energy = row.run?.energyHartree ?? null;
    if (energy !== null && ground !== null) row.gapKJPerMol = (energy - ground) * HARTREE_KJ_PER_MOL;
  }
  const level = favoured?.run ?? null;
  return { dCount, level, candidates: rows, favoured, ...agreementOf(rows, favoured, measured) };
}

export function isContaminated({ s2, s2Ideal }: Pick<ComparedRun, 's2' | 's2Ideal'>): boolean {
  if (s2 === null || s2Ideal === null) return false;
  return s2 - s2Ideal > Math.max(CONTAMINATION_SHARE, CONTAMINATION_SHARE * s2Ideal);
}

function lowest<R extends ComparedRun>(runs: readonly R[]): R | null {
  return runs.reduce<R | null>(
    (best, run) => (best === null || (run.energyHartree ?? 0) < (best.energyHartree ?? 0) ? run : best),
    null,
  );
}

function bestCoveredLevel<R extends ComparedRun>(runs: readonly R[]): R[] {
  const levels = new Map<string, R[]>();
  for (const run of runs) {
    const key = levelKey(run);
    if (key !== null && run.candidateId !== null) levels.set(key, [...(levels.get(key) ?? []), run]);
  }
  const covered = (of: readonly R[]) => new Set(of.map(({ candidateId }) => candidateId)).size;
  const ranked = [...levels].sort(
    ([keyA, a], [keyB, b]) => covered(b) - covered(a) || b.length - a.length || (keyA < keyB ? -1 : 1),
  );
  return ranked[0]?.[1] ?? [];
}

function agreementOf<R extends ComparedRun>(
  rows: readonly CandidateComparison<R>[],
  favoured: CandidateComparison<R> | null,
  measured: MeasuredMoment | null,
): { agreement: Agreement; sentence: string } {
  if (!favoured && !measured)
    return { agreement: 'nothing', sentence: 'Neither calculated nor measured yet.' };
  if (!favoured)
    return { agreement: 'one-ended measured', sentence: 'Measured; no usable calculation to set beside it.' };
  if (!measured) return { agreement: 'one-ended calculated', sentence: 'Calculated; not measured yet.' };
  if (favoured.verdict === null)
    return { agreement: 'dotted', sentence: 'No expected band is known for the favoured candidate.' };
  if (favoured.verdict === 'excluded') {
    return {
      agreement: 'broken',
      sentence: 'The measured interval lies outside the favoured candidate’s expected band.',
    };
  }
  if (favoured.verdict === 'cannot tell') {
    return {
      agreement: 'dotted',
      sentence: 'The measured interval only partly reaches the favoured candidate’s expected band.',
    };
  }
  const rivals = rows.filter(
    (row) =>
      row !== favoured &&
      row.verdict === 'consistent' &&
      row.gapKJPerMol !== null &&
      row.gapKJPerMol <= RIVAL_KJ_PER_MOL,
  );
  if (rivals.length > 0) {
    return {
      agreement: 'dotted',
      sentence:
        'The moment lies in the bands of more than one calculated candidate and does not decide between them.',
    };
  }
  return {
    agreement: 'joined',
    sentence: 'The measured moment lies in the favoured candidate’s expected band.',
  };
}
