import type { Program } from '../../outputs/record';
import { err, type Result } from '../../result';
import { checkDeckRequest } from './check-deck-request';
import type { Deck, DeckRefusal, DeckRequest } from './deck-request';
import { gaussianDeck } from './gaussian-deck';
import { nwchemDeck } from './nwchem-deck';
import { orcaDeck } from './orca-deck';
import { psi4Deck } from './psi4-deck';

const writers: Record<Program, (request: DeckRequest) => Result<Deck, DeckRefusal>> = {
  ORCA: orcaDeck,
  Gaussian: gaussianDeck,
  NWChem: nwchemDeck,
  Psi4: psi4Deck,
};

/**
 * Input deck for one job, or the reason why the program cannot do what is asked. Two equal requests give
 * the same bytes, so that versions can be compared line by line.
 * Errors: see `DeckRefusal`.
 */
export function writeDeck(request: DeckRequest): Result<Deck, DeckRefusal> {
  const refusal = checkDeckRequest(request);
  return refusal ? err(refusal) : writers[request.method.program](request);
}
