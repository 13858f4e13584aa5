/**
 * Oxidation states met in complexes of the 3d metals, the common ones. A state outside the list is
 * unusual, not impossible: use it for a hint, never for a refusal.
 * Source: N. N. Greenwood and A. Earnshaw, Chemistry of the Elements, 2nd ed. (1997), from memory.
 */
const common: Record<string, readonly number[]> = {
  Sc: [3],
  Ti: [2, 3, 4],
  V: [2, 3, 4, 5],
  Cr: [0, 2, 3, 4, 5, 6],
  Mn: [1, 2, 3, 4, 5, 6, 7],
  Fe: [0, 1, 2, 3, 4],
  Co: [1, 2, 3, 4],
  Ni: [0, 1, 2, 3, 4],
  Cu: [1, 2, 3],
  Zn: [2],
};

/** Common oxidation states of a 3d metal, ascending; null for elements that the table does not cover. */
export function commonOxidationStates(element: string): readonly number[] | null {
  return common[element] ?? null;
}
