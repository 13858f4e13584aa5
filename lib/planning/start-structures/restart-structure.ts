import { hillFormula } from '../../chemistry/formula';
import type { Structure } from '../../chemistry/structure';
import type { Step } from '../../outputs/record';
import { err, ok, type Result } from '../../result';

/**
 * Last geometry of an earlier run as a starting structure.
 * @param wantedFormula - Hill formula the new job must have
 * Errors: a sentence when the run printed no geometry or one of another composition.
 */
export function restartStructure(run: Step, wantedFormula: string): Result<Structure, string> {
  if (!run.geometry) return err('the run printed no geometry to start from');
  const { elements, positionsAngstrom } = run.geometry;
  const formula = hillFormula(elements);
  return formula === wantedFormula
    ? ok({ elements, positionsAngstrom })
    : err(`the run’s geometry is ${formula}, the job needs ${wantedFormula}`);
}
