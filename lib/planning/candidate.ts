import type { GroundTerm } from '../chemistry/ground-term';
import type { JahnTellerExpectation } from '../chemistry/jahn-teller';
import type { LocalSpinState } from './local-spin-states';
import type { Likelihood } from './spin-state-rules';

/** One magnetic or non-magnetic centre of a candidate. Sites are the metals in order, then radical ligands. */
export interface CandidateSite {
  kind: 'metal' | 'ligand';
  /** Element symbol or ligand name. */
  name: string;
  unpaired: number;
  spinUp: boolean;
  /** Metals only. */
  geometry: string | null;
  state: LocalSpinState | null;
  groundTerm: GroundTerm | null;
  jahnTeller: JahnTellerExpectation | null;
}

/** Broken-symmetry determinant: start from the high-spin one and turn the spins of `flippedSites` round. */
export interface BrokenSymmetry {
  flippedSites: readonly number[];
  highSpinMultiplicity: number;
  /** M_S(M_S + 1) + number of flipped unpaired electrons: what ⟨S²⟩ of the determinant should come to. */
  idealS2: number;
}

export interface Candidate {
  /** Stable text key, unique within a complex: geometries, unpaired electrons and flips. */
  key: string;
  geometries: readonly string[];
  sites: readonly CandidateSite[];
  /** 2 M_S + 1 of the determinant to be calculated. */
  multiplicity: number;
  coupling: 'single site' | 'ferromagnetic' | 'antiferromagnetic' | 'no coupling';
  brokenSymmetry: BrokenSymmetry | null;
  likelihood: Likelihood;
  /** Extra starting structures worth trying, from the Jahn–Teller expectation. */
  distortedStarts: readonly ('elongated' | 'compressed' | 'flattened')[];
  /** √(n(n+2)) for the net unpaired electrons of a single site, μB; null for coupled sites. */
  spinOnlyMomentBohrMagneton: number | null;
  notes: readonly string[];
}

export interface LeftOutCandidate {
  metal: string;
  geometry: string;
  /** null when the whole geometry is left out. */
  unpaired: number | null;
  reason: string;
}

export interface CandidateList {
  formula: string;
  electrons: number;
  candidates: readonly Candidate[];
  leftOut: readonly LeftOutCandidate[];
}
