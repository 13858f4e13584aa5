import type { Structure } from '../../chemistry/structure';
import type { DeckTask, PlannedMethod } from '../method';

/** What the plan remembers of a job, for telling whether a returned output is its own. */
export interface PlannedJob {
  jobKey: string;
  method: PlannedMethod;
  task: DeckTask;
  /** Starting structure. */
  structure: Structure;
  charge: number;
  multiplicity: number;
  /** Broken symmetry: multiplicity of the high-spin determinant, which ORCA prints instead. */
  highSpinMultiplicity?: number;
}
