import { basisSets } from '../decks/basis-sets';
import type { PlannedMethod } from '../method';

const squeeze = (text: string): string =>
  text
    .toLowerCase()
    .replace(/\(d,p\)/g, '**')
    .replace(/\(d\)/g, '*')
    .replace(/[^a-z0-9*+]/g, '');

/**
 * Whether a printed basis is the planned one.
 * @returns null when it is not printed, or cannot be told because elements have different sets
 */
export function comparableBasis(method: PlannedMethod, printed: string | null): boolean | null {
  if (printed === null || Object.keys(method.basisPerElement).length > 0) return null;
  const spelling = basisSets[method.basis]?.names[method.program] ?? method.basis;
  return [method.basis, spelling].some((name) => squeeze(name) === squeeze(printed));
}
