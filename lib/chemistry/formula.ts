/**
 * Molecular formula in Hill order: carbon first, hydrogen second, the others by alphabet;
 * without carbon all by alphabet. Source: E. A. Hill, J. Am. Chem. Soc. 1900, 22, 478.
 * @param elements - element symbols, one per atom
 * @returns for example "C10H10Fe"; "" for no atoms
 */
export function hillFormula(elements: readonly string[]): string {
  const counts = new Map<string, number>();
  for (const element of elements) counts.set(element, (counts.get(element) ?? 0) + 1);
  const rank = (element: string) =>
    counts.has('C') ? (element === 'C' ? '0' : element === 'H' ? '1' : `2${element}`) : element;
  return [...counts]
    .sort(([a], [b]) => (rank(a) < rank(b) ? -1 : 1))
    .map(([element, count]) => (count === 1 ? element : `${element}${count}`))
    .join('');
}
