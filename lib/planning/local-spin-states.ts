import { dOccupation, strongFieldUnpaired } from '../chemistry/d-occupation';
import type { LigandFieldLevel } from '../chemistry/ligand-field-levels';
import { ligandFieldLevels } from '../chemistry/ligand-field-levels';
import { spinStateRules, type Judgement, type Likelihood } from './spin-state-rules';

export type SpinLabel = 'only one' | 'high' | 'intermediate' | 'low';

/** One way to place the d electrons of a single centre. */
export interface LocalSpinState {
  label: SpinLabel;
  unpaired: number;
  /** "t2g3 eg2"; null when no splitting pattern is known for the geometry. */
  occupation: string | null;
  stabilisationDq: number | null;
  likelihood: Likelihood;
  note: string | null;
}

export interface LeftOutSpinState {
  unpaired: number;
  reason: string;
}

export interface LocalSpinStates {
  kept: readonly LocalSpinState[];
  leftOut: readonly LeftOutSpinState[];
}

/**
 * Spin states of one dⁿ centre in a coordination polyhedron: every number of unpaired electrons of the
 * right parity is either kept, with how likely it is, or left out with the reason.
 * Rules are those of the trade (Cotton and Wilkinson, Advanced Inorganic Chemistry; Figgis and Hitchman,
 * Ligand Field Theory; the d4–d7 octahedral pairs are the crossings of the Tanabe–Sugano diagrams); they
 * are heuristics, not laws. Checked against: tests/published/electronic.test.ts.
 * @param series - 3, 4 or 5: which row of the d block
 */
export function localSpinStates(geometry: string, dElectrons: number, series: 3 | 4 | 5): LocalSpinStates {
  const levels = ligandFieldLevels(geometry);
  const high = Math.min(dElectrons, 10 - dElectrons);
  const kept: LocalSpinState[] = [];
  const leftOut: LeftOutSpinState[] = [];
  for (let unpaired = high; unpaired >= 0; unpaired -= 2) {
    const judgement = judge(geometry, dElectrons, unpaired, series, levels);
    if ('leaveOut' in judgement) {
      leftOut.push({ unpaired, reason: judgement.leaveOut });
      continue;
    }
    const occupation = levels ? dOccupation(levels, dElectrons, unpaired) : null;
    kept.push({
      label: 'high',
      unpaired,
      occupation: occupation?.text ?? null,
      stabilisationDq: occupation?.stabilisationDq ?? null,
      likelihood: judgement.keep,
      note: judgement.note ?? null,
    });
  }
  const lowest = levels ? strongFieldUnpaired(levels, dElectrons) : high;
  for (const state of kept) state.label = labelOf(state.unpaired, high, lowest, geometry, dElectrons);
  return { kept, leftOut };
}

function labelOf(unpaired: number, high: number, lowest: number, geometry: string, n: number): SpinLabel {
  if (n <= 3 || n >= 9 || (n === 8 && lowest === high && geometry !== 'T-4')) return 'only one';
  if (unpaired === high) return 'high';
  return unpaired <= lowest ? 'low' : 'intermediate';
}

function judge(
  geometry: string,
  n: number,
  unpaired: number,
  series: 3 | 4 | 5,
  levels: readonly LigandFieldLevel[] | null,
): Judgement {
  const high = Math.min(n, 10 - n);
  if (high < 2) return { keep: 'usual' };
  const rule = spinStateRules[geometry];
  const judged = rule?.(n, unpaired, series);
  if (judged) return judged;
  if (unpaired === high) return { keep: 'usual' };
  if (levels && unpaired < strongFieldUnpaired(levels, n))
    return {
      leaveOut: `fewer unpaired electrons than even the strongest field leaves in ${geometry} (degenerate orbitals fill singly first)`,
    };
  return { leaveOut: `no practical form with ${unpaired} unpaired electrons is known in ${geometry}` };
}
