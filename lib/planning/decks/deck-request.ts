import type { Structure } from '../../chemistry/structure';
import type { DeckTask, PlannedMethod } from '../method';

/** A magnetic centre for a broken-symmetry deck: a single atom with its ion's charge and unpaired electrons. */
export interface MagneticSite {
  /** 0-based index into the structure. */
  atomIndex: number;
  oxidationState: number;
  unpaired: number;
  spinUp: boolean;
}

/** Everything that one deck says. */
export interface DeckRequest {
  method: PlannedMethod;
  task: DeckTask;
  structure: Structure;
  charge: number;
  /** 2 M_S + 1 of the wanted determinant; for broken symmetry the net one, 1 or more. */
  multiplicity: number;
  jobKey: string;
  /** Free words for the title line; characters that some program forbids are left out. */
  label: string;
  cores: number;
  /** Memory for the whole job, MB. */
  memoryMb: number;
  /** Broken symmetry only. */
  sites?: readonly MagneticSite[];
}

export interface Deck {
  /** ASCII, lines end in "\n". */
  text: string;
  /** File name ending that the program's users expect, without the dot. */
  extension: 'inp' | 'gjf' | 'nw' | 'in';
  /** Things that a reader of the deck should know. */
  notes: readonly string[];
}

export interface DeckRefusal {
  code:
    | 'functional not available'
    | 'basis not available'
    | 'basis missing for element'
    | 'dispersion not available'
    | 'solvation not available'
    | 'relativity not available'
    | 'task not available'
    | 'impossible multiplicity'
    | 'unknown element'
    | 'too many atoms'
    | 'bad structure'
    | 'bad sites'
    | 'bad extra line'
    | 'bad job key';
  message: string;
}
