import type { ComplexDetail } from '@/app/_server/read-complex';
import { CandidateTable, type CandidateTableRow } from '@/components/ledger/candidate-table';
import { Leaf } from '@/components/ledger/leaf';
import { LeafHead } from '@/components/ledger/leaf-head';
import { RunningHead } from '@/components/ledger/running-head';
import { EnergyLadder } from '@/components/marks/energy-ladder';
import { LinkMark } from '@/components/marks/link-mark';
import { ShapeStrip } from '@/components/marks/shape-strip';
import { Quantity } from '@/components/numbers/quantity';
import { candidateWords } from '@/components/study/spin-and-shape';
import { StatePanel } from '@/components/ui/state-panel';
import { StructureViewer } from '@/components/viewer/structure-viewer';
import type { Run } from '@/db/repositories/runs';
import type { StoredStructure } from '@/db/repositories/structures';
import type { CandidateComparison } from '@/lib/comparison/complex-comparison';
import { levelWords } from '@/lib/comparison/level-of-theory';
import { UncomparedRuns } from './uncompared-runs';

/** The left page: candidates by energy, their numbers with their sources, and the centre in 3D. */
export function CalculatedLeaf({ studyId, detail }: { studyId: string; detail: ComplexDetail }) {
  const { comparison, structures, runs } = detail;
  const calculated = comparison.candidates.filter((row) => row.run !== null);
  const structureOf = new Map(structures.map((structure) => [structure.runId, structure]));
  const shown = structureOf.get(comparison.favoured?.run?.id ?? null) ?? structures[0];
  const centre = shown?.centres[0];
  return (
    <Leaf labelledBy="calculated">
      <RunningHead side="calculated" id="calculated">
        {comparison.level ? levelWords(comparison.level) : 'no usable run'} · {runs.length}{' '}
        {runs.length === 1 ? 'run' : 'runs'}
      </RunningHead>
      <LeafHead id="candidates">Candidates</LeafHead>
      {calculated.length === 0 ? (
        <StatePanel
          picture={<LinkMark kind="one-ended measured" decorative />}
          title="No calculation yet"
          level={3}
        >
          Drop the outputs of this complex under <a href={`/studies/${studyId}/runs`}>Runs</a>; they find it
          by composition and charge.
        </StatePanel>
      ) : (
        <>
          <EnergyLadder
            dCount={comparison.dCount}
            rungs={calculated.map((row) => ({
              label: candidateWords(row.candidate),
              kJ: row.gapKJPerMol ?? 0,
              favoured: row === comparison.favoured,
              multiplicity: row.candidate.multiplicity,
              geometry: row.candidate.geometry,
              note: row.contaminated
                ? '⟨S²⟩ is contaminated: not trusted'
                : row === comparison.favoured
                  ? `lowest of ${calculated.length}`
                  : undefined,
            }))}
          />
          <CandidateTable
            caption="Calculated properties of the candidates"
            columns={calculated.map((row) => ({
              key: row.candidate.id,
              head: candidateWords(row.candidate),
            }))}
            rows={propertyRows(studyId, calculated, structureOf)}
          />
        </>
      )}
      <UncomparedRuns studyId={studyId} detail={detail} />
      {shown ? (
        <>
          <LeafHead note={`last geometry of ${shown.title}`}>Centre</LeafHead>
          <StructureViewer structure={viewed(shown)} />
        </>
      ) : null}
      {centre?.description.tau4 != null ? (
        <>
          <LeafHead note="τ₄ from T-4 to SP-4">Shape</LeafHead>
          <ShapeStrip
            from="T-4"
            to="SP-4"
            indexName="τ₄"
            markers={calculated.flatMap((row) => {
              const tau4 = structureOf.get(row.run?.id ?? null)?.centres[0]?.description.tau4;
              return tau4 == null ? [] : [{ value: Math.min(tau4, 1), label: tau4.toFixed(3) }];
            })}
          />
        </>
      ) : null}
    </Leaf>
  );
}

function viewed(structure: StoredStructure) {
  return {
    title: structure.title,
    elements: structure.elements,
    positionsAngstrom: structure.positionsAngstrom,
    centres: structure.centres.map(({ atomIndex, description }) => ({
      index: atomIndex,
      donors: description.donors,
    })),
  };
}

function propertyRows(
  studyId: string,
  rows: readonly CandidateComparison<Run>[],
  structureOf: ReadonlyMap<string | null, StoredStructure>,
): CandidateTableRow[] {
  const runHref = (row: CandidateComparison<Run>, path?: string) => {
    const line = path === undefined ? undefined : row.run?.record.evidence[path]?.line;
    return `/studies/${studyId}/runs/${row.run?.id}${line === undefined ? '' : `?line=${line}#excerpt`}`;
  };
  const row = (
    key: string,
    head: string,
    read: (run: Run, structure: StoredStructure | undefined) => number | null | undefined,
    digits: number,
    evidence?: string,
  ): CandidateTableRow => ({
    key,
    head,
    values: rows.map((each) => {
      const value = each.run ? (read(each.run, structureOf.get(each.run.id)) ?? null) : null;
      if (value === null) return { text: null };
      return {
        text: <Quantity value={value} digits={digits} />,
        href: runHref(each, evidence),
        label: `${head} ${value.toFixed(digits)}, show source`,
      };
    }),
  });
  return [
    row('multiplicity', 'Multiplicity', (run) => run.multiplicity, 0, 'multiplicity'),
    row('energy', 'Energy, Eh', (run) => run.energyHartree, 6, 'energyHartree'),
    row('s2', '⟨S²⟩', (run) => run.s2, 4, 'spin.s2'),
    row(
      'spin',
      'Spin population of the metal, Mulliken',
      (_run, of) => of?.centres[0]?.spinPopulation,
      2,
      'populations.Mulliken',
    ),
    row(
      'mean',
      'Mean M–L distance, Å',
      (_run, of) => of?.centres[0]?.description.meanDistanceAngstrom,
      3,
      'geometry',
    ),
    row('baur', 'Baur distortion D', (_run, of) => of?.centres[0]?.description.baurDistortion, 4, 'geometry'),
    row('tau4', 'τ₄', (_run, of) => of?.centres[0]?.description.tau4, 3, 'geometry'),
    row(
      'shape',
      'Shape measure of its nearest polyhedron',
      (_run, of) => of?.centres[0]?.description.shapes?.[0]?.measure,
      2,
      'geometry',
    ),
    row('frequency', 'Lowest frequency, cm⁻¹', (run) => run.record.frequencies?.lowestCm1, 1, 'frequencies'),
  ];
}
