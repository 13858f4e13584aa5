import { cite } from '../cite';
import type { Line } from '../landmark';
import { after, soleIntegerAfter, readInteger, words } from '../numbers';
import type { LandmarkMap } from '../program';
import type { Method } from '../record';
import { warn } from '../warnings';
import { emptyDeck, readDeckLine, type Deck } from './deck';
import { openStep, type OrcaState } from './state';

// |  1> ! UKS B3LYP def2-SVP
function readEcho(line: Line, state: OrcaState): void {
  const match = /^\|\s{0,6}\d{1,6}>/.exec(line.text.trimStart().slice(0, 20));
  if (!match) return;
  const input = line.text.trimStart().slice(match[0].length);
  if (/^\s*\$new_?job/i.test(input)) {
    state.decks.push(emptyDeck());
    return;
  }
  const deck = state.decks.at(-1);
  if (deck) readDeckLine(deck, input, line);
}

/** The deck of the job at hand, completed by what a compound job's main input passes on. */
export function deckAtHand(state: OrcaState): Deck {
  const deck = state.decks[state.job] ?? state.decks.at(-1) ?? emptyDeck();
  const { inherited } = state;
  if (!inherited) return deck;
  return {
    ...deck,
    charge: deck.charge ?? inherited.charge,
    multiplicity: deck.multiplicity ?? inherited.multiplicity,
    cores: deck.cores ?? inherited.cores,
    title: deck.title ?? inherited.title,
    jobKey: deck.jobKey ?? inherited.jobKey,
  };
}

/** The basis of the job at hand: the printed names that belong to it, else the keyword. */
export function basisAtHand(state: OrcaState, deck: Deck): Deck['basis'] {
  const { bases, decks, job } = state;
  const names = (list: typeof bases) => {
    const first = list[0];
    if (!first) return null;
    return { value: [...new Set(list.map(({ value }) => value))].join(' + '), line: first.line };
  };
  if (decks.length === 1 || new Set(bases.map(({ value }) => value)).size === 1)
    return names(bases) ?? deck.basis;
  // Several jobs announce their bases together, above the echoed inputs.
  const one = bases.length === decks.length ? bases[job] : undefined;
  return (
    names(one ? [one] : bases.filter(({ value }) => deck.keywords.has(value.toUpperCase()))) ?? deck.basis
  );
}

const references: Record<string, Method['reference']> = {
  RHF: 'restricted',
  RKS: 'restricted',
  UHF: 'unrestricted',
  UKS: 'unrestricted',
  ROHF: 'restricted open-shell',
  ROKS: 'restricted open-shell',
};

/** "… Charge          ....    4": the value stands behind four dots. */
function readSettingValue(path: 'charge' | 'multiplicity' | 'electronCount') {
  return (line: Line, state: OrcaState) => {
    const value = soleIntegerAfter(line.text, '....');
    const { step } = openStep(state);
    if (value === null || (path === 'multiplicity' && value < 1)) return;
    step[path] = value;
    cite(step, path, line);
  };
}

export const settingsLandmarks: LandmarkMap<OrcaState> = {
  '|': readEcho,
  // Your calculation utilizes the basis: def2-SVP
  'Your calculation utilizes the basis:': (line, state) => {
    const value = after(line.text, 'basis:')?.trim() ?? '';
    // After a compound job's last step the main job's basis is announced once more.
    if (value !== '' && !state.current) state.bases.push({ value, line });
  },
  'Total Charge Charge ....': readSettingValue('charge'),
  'Multiplicity Mult ....': readSettingValue('multiplicity'),
  'Number of Electrons NEL ....': readSettingValue('electronCount'),
  // Hartree-Fock type      HFTyp           .... UHF
  'Hartree-Fock type HFTyp ....': (line, state) => {
    const { step } = openStep(state);
    const reference = references[words(line.text).at(-1) ?? ''];
    if (!reference) return;
    step.method.reference = reference;
    cite(step, 'method.reference', line);
  },
  // Density Functional     Method          .... DFT(GTOs)
  'Density Functional Method ....': (line, state) => {
    state.method = { isDft: true, line };
  },
  // Ab initio Hamiltonian  Method          .... Hartree-Fock(GTOs)
  'Ab initio Hamiltonian Method ....': (line, state) => {
    const isDft = !line.text.includes('Hartree-Fock');
    state.method = { isDft, line };
    if (!isDft) warn(openStep(state).step, 'not-dft', line.number);
  },
  'Exchange Functional Exchange ....': (line, state) => {
    state.components.exchange = { value: words(line.text).at(-1) ?? '', line };
  },
  'Correlation Functional Correlation ....': (line, state) => {
    state.components.correlation = { value: words(line.text).at(-1) ?? '', line };
  },
  // Scalar relativistic method             .... ZORA
  'Scalar relativistic method ....': (line, state) => {
    const value = words(line.text).at(-1) ?? '';
    const { step } = openStep(state);
    if (/^none$|^\.+$/i.test(value)) return;
    step.method.relativity = value;
    cite(step, 'method.relativity', line);
  },
  'CPCM SOLVATION MODEL': (line, state) => {
    const { step } = openStep(state);
    if (step.method.solvation !== null) return;
    step.method.solvation = 'CPCM';
    cite(step, 'method.solvation', line);
  },
  // The heading's second line names the model: "DFTD4 V2.0", "DFTD3 V3.1  Rev 1".
  'DFT DISPERSION CORRECTION': (_, state) => ({
    take(line) {
      const text = line.text.trim();
      if (!/^DFTD/.test(text)) return text === '' || text.startsWith('--');
      const { step } = openStep(state);
      step.method.dispersion ??= words(text).join(' ');
      step.evidence['method.dispersion'] ??= { line: line.number, text };
      return false;
    },
  }),
  // *        Program running with 8 parallel MPI-processes     *
  '* Program running with': (line, state) => {
    const value = readInteger(words(line.text)[4]);
    if (value !== null) state.cores = { value, line };
  },
};
