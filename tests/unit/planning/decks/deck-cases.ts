import type { DeckRequest } from '@/lib/planning/decks/deck-request';
import { writeDeck } from '@/lib/planning/decks/write-deck';
import { methodSchema, type MethodInput } from '@/lib/planning/method';

/** Tetrachloridoferrate(2−), quintet. */
export const ferrate = {
  elements: ['Fe', 'Cl', 'Cl', 'Cl', 'Cl'],
  positionsAngstrom: [
    [0, 0, 0],
    [1.9, 0, 1.25],
    [-1.9, 0, 1.25],
    [0, 1.9, -1.25],
    [0, -1.9, -1.25],
  ] as [number, number, number][],
};
/** Two copper(II) ions with one oxide between them: the smallest superexchange pair. */
export const copperPair = {
  elements: ['Cu', 'O', 'Cu'],
  positionsAngstrom: [
    [0, 0, -1.9],
    [0, 0, 0],
    [0, 0, 1.9],
  ] as [number, number, number][],
};

export const method = (input: Partial<MethodInput> & Pick<MethodInput, 'program'>) =>
  methodSchema.parse({ name: 'test', functional: 'B3LYP', basis: 'def2-SVP', ...input });

export const request = (
  input: Partial<MethodInput> & Pick<MethodInput, 'program'>,
  more: Partial<DeckRequest> = {},
): DeckRequest => ({
  method: method(input),
  task: 'single point',
  structure: ferrate,
  charge: -2,
  multiplicity: 5,
  jobKey: 'SP1234567W',
  label: 'FeCl4',
  cores: 4,
  memoryMb: 8000,
  ...more,
});

export const flippedPair: Partial<DeckRequest> = {
  task: 'broken symmetry',
  structure: copperPair,
  charge: 2,
  multiplicity: 1,
  label: 'Cu2O',
  sites: [
    { atomIndex: 0, oxidationState: 2, unpaired: 1, spinUp: true },
    { atomIndex: 2, oxidationState: 2, unpaired: 1, spinUp: false },
  ],
};

/** Lines of a deck; a refusal fails the test with its reason. */
export function deckLines(wanted: DeckRequest): string[] {
  const deck = writeDeck(wanted);
  if (!deck.ok) throw new Error(deck.error.message);
  return deck.value.text.split('\n');
}

export const refusalCode = (wanted: DeckRequest): string | null => {
  const deck = writeDeck(wanted);
  return deck.ok ? null : deck.error.code;
};
