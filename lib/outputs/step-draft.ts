import { cite } from './cite';
import type { KeptLines } from './kept-lines';
import type { Line } from './landmark';
import { emptyStep, type Geometry, type Program, type Step } from './record';
import { warn } from './warnings';

/** The values that belong to one geometry and one wavefunction; they change together or not at all. */
export type Point = Pick<
  Step,
  | 'energyHartree'
  | 'scf'
  | 'spin'
  | 'populations'
  | 'orbitals'
  | 'dipoleDebye'
  | 'geometry'
  | 'frequencies'
  | 'thermochemistry'
  | 'stability'
  | 'evidence'
  | 'warnings'
>;

function emptyPoint(): Point {
  const empty = emptyStep(null);
  return {
    energyHartree: empty.energyHartree,
    scf: empty.scf,
    spin: empty.spin,
    populations: empty.populations,
    orbitals: empty.orbitals,
    dipoleDebye: empty.dipoleDebye,
    geometry: empty.geometry,
    frequencies: empty.frequencies,
    thermochemistry: empty.thermochemistry,
    stability: empty.stability,
    evidence: empty.evidence,
    warnings: empty.warnings,
  };
}

/** Whether two geometries are the same within a tolerance (Å), in the same frame and order of atoms. */
export function isSameGeometry(a: Geometry, b: Geometry, toleranceAngstrom = 1e-5): boolean {
  return (
    a.elements.length === b.elements.length &&
    a.elements.every((element, i) => element === b.elements[i]) &&
    a.positionsAngstrom.every((position, i) =>
      position.every(
        (value, axis) => Math.abs(value - (b.positionsAngstrom[i]?.[axis] ?? Infinity)) < toleranceAngstrom,
      ),
    )
  );
}

/** Whether a geometry was printed for a point, be it read yet or not. */
function hasGeometry(point: Point): boolean {
  return point.geometry !== null || point.evidence.geometry !== undefined;
}

/**
 * A step while it is being read. What belongs to the job as a whole (charge, method, optimisation history,
 * timings) goes into `step`; what belongs to one geometry (energy, spin, populations, orbitals, dipole,
 * frequencies, thermochemistry, stability) into `point`. A new geometry opens a new point, so that tables of an
 * earlier geometry never stand beside a later energy, and a last geometry that got no energy does not take the
 * place of the one that has.
 */
export class StepDraft {
  readonly step: Step;
  point: Point = emptyPoint();
  private settled: Point | null = null;
  private geometryTable: KeptLines | null = null;
  /** Tables of a point that are read only if the point is the one that counts. */
  private deferred = new Map<string, (point: Point) => void>();
  private settledDeferred = new Map<string, (point: Point) => void>();

  constructor(program: Program) {
    this.step = emptyStep(program);
  }

  /** The last point with an energy, before the present one. */
  get lastSettled(): Point | null {
    return this.settled;
  }

  /**
   * Opens a new point; the present one is kept as the result so far if it has an energy, and a geometry
   * (unless no point had one yet).
   */
  nextPoint(): void {
    const { point, settled } = this;
    if (point.energyHartree !== null && (hasGeometry(point) || !settled || !hasGeometry(settled))) {
      this.settled = point;
      this.settledDeferred = this.deferred;
    }
    this.point = emptyPoint();
    this.deferred = new Map();
  }

  /**
   * Puts the reading of a table off until it is known that the present point counts; a later one under the same
   * name takes its place.
   */
  defer(name: string, read: (point: Point) => void): void {
    this.deferred.set(name, read);
  }

  /**
   * Takes a printed geometry as the lines of its table, to be read later; like `setGeometry` otherwise.
   * @param read - gives the geometry, or null when the table is damaged
   */
  setGeometryLater(table: KeptLines, line: Line, read: (point: Point) => Geometry | null): void {
    if (this.geometryTable && hasGeometry(this.point) && this.geometryTable.isSame(table)) return;
    if (hasGeometry(this.point) || this.point.energyHartree !== null) this.nextPoint();
    this.geometryTable = table;
    cite(this.point, 'geometry', line);
    this.defer('geometry', (point) => {
      point.geometry = read(point);
      if (!point.geometry) delete point.evidence.geometry;
    });
  }

  /**
   * Takes a printed geometry. The same one printed again changes nothing; another one opens a new point,
   * unless the present point has neither geometry nor energy yet.
   */
  setGeometry(geometry: Geometry, line: Line): void {
    const { point } = this;
    if (point.geometry && isSameGeometry(point.geometry, geometry, 1e-9)) return;
    if (point.geometry || point.energyHartree !== null) this.nextPoint();
    this.point.geometry = geometry;
    cite(this.point, 'geometry', line);
  }

  /** A new wavefunction at the same geometry: the tables of the one before are not its own. */
  sameGeometryAgain(): void {
    const { geometry, evidence } = this.point;
    const later = this.deferred.get('geometry');
    this.nextPoint();
    this.point.geometry = geometry;
    if (later) this.defer('geometry', later);
    if (evidence.geometry) this.point.evidence.geometry = evidence.geometry;
  }

  /** The step with the values of its last point that has an energy (of the last one when none has). */
  finish(): Step {
    const { point, settled } = this;
    const useSettled =
      settled !== null && (point.energyHartree === null || (!hasGeometry(point) && hasGeometry(settled)));
    const chosen = useSettled ? settled : point;
    for (const read of (useSettled ? this.settledDeferred : this.deferred).values()) read(chosen);
    const { evidence, warnings, ...values } = chosen;
    const step: Step = {
      ...this.step,
      ...values,
      frequencies: values.frequencies ?? this.step.frequencies,
      thermochemistry: values.thermochemistry ?? this.step.thermochemistry,
      evidence: { ...this.step.evidence, ...evidence },
      warnings: [...this.step.warnings, ...warnings],
    };
    if (useSettled && hasGeometry(point))
      warn(step, 'geometry-without-energy', point.evidence.geometry?.line);
    return step;
  }
}
